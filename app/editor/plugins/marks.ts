import type { Node } from '@tiptap/pm/model'
import { Plugin, PluginKey, type EditorState, type Transaction } from '@tiptap/pm/state'
import { Decoration, DecorationSet } from '@tiptap/pm/view'
import { anchorRange } from '#shared/note/anchors'
import { blocksById } from '#shared/note/block-text'
import type { LooseView, RemarkView } from '#shared/schemas/issue-view'

/** What is marked in the text without being part of it: loose numbers and the places of remarks. */
export interface Marked { loose: readonly LooseView[], remarks: readonly RemarkView[] }

const key = new PluginKey<DecorationSet>('marks')

export const looseId = (loose: LooseView) => `${loose.blockId}:${loose.field}:${loose.text}:${loose.ordinal}`

export const looseKind = (loose: LooseView): 'kept' | 'disagrees' | 'loose' =>
  (loose.decision ? 'kept' : loose.verdict === 'disagreeing' ? 'disagrees' : 'loose')

const looseClass = { kept: 'loose kept', disagrees: 'loose dis', loose: 'loose' }

function decorate(doc: Node, marked: Marked): DecorationSet {
  const blocks = blocksById(doc)
  const decorations: Decoration[] = []
  for (const loose of marked.loose) {
    const block = blocks.get(loose.blockId)
    if (!block || loose.field !== 'text' || loose.to > block.node.content.size) continue
    decorations.push(Decoration.inline(block.pos + 1 + loose.from, block.pos + 1 + loose.to, { 'class': looseClass[looseKind(loose)], 'data-mark': looseId(loose) }))
  }
  for (const remark of marked.remarks) {
    if (remark.anchor.kind !== 'text' || remark.anchorState === 'orphaned' || remark.state === 'closed') continue
    const range = anchorRange(doc, remark.anchor)
    if (range) decorations.push(Decoration.inline(range.from, range.to, { 'class': 'rem', 'data-mark': remark.id }))
  }
  return DecorationSet.create(doc, decorations)
}

export const setMarks = (tr: Transaction, marked: Marked): Transaction => tr.setMeta(key, marked).setMeta('addToHistory', false)

/** Marks move with the text between two saves; each save brings them anew. */
export function marks(initial: Marked): Plugin<DecorationSet> {
  return new Plugin<DecorationSet>({
    key,
    state: {
      init: (_config, state: EditorState) => decorate(state.doc, initial),
      apply(tr, shown) {
        const marked = tr.getMeta(key) as Marked | undefined
        if (marked) return decorate(tr.doc, marked)
        return tr.docChanged ? shown.map(tr.mapping, tr.doc) : shown
      },
    },
    props: { decorations: state => key.getState(state) },
  })
}
