import type { Editor } from '@tiptap/core'
import { Fragment, type Node, type NodeType } from '@tiptap/pm/model'
import { closeHistory } from '@tiptap/pm/history'
import { Selection, TextSelection, type EditorState, type Transaction } from '@tiptap/pm/state'
import { templateSection } from '#shared/note/template'

/** Changes the blocks of the selection to a paragraph or a heading; each keeps its id, so that what points at it still does. */
export function setBlock(state: EditorState, type: NodeType, attrs: Record<string, unknown> = {}): Transaction | null {
  const tr = state.tr
  for (const { $from, $to } of state.selection.ranges) {
    state.doc.nodesBetween($from.pos, $to.pos, (node, pos) => {
      if (!node.isTextblock) return
      const next = { ...attrs, id: node.attrs.id as unknown }
      if (node.hasMarkup(type, next)) return
      const $pos = tr.doc.resolve(pos)
      if ($pos.parent.canReplaceWith($pos.index(), $pos.index() + 1, type)) tr.setNodeMarkup(pos, type, next)
    })
  }
  return tr.docChanged ? tr : null
}

/** Where a new block goes: under the block of the caret, in place of it when it is an empty paragraph; else at the end of a section. */
export function insertionPlace(state: EditorState, fallback = 'section-analysis'): { from: number, to: number } {
  const { $from } = state.selection
  const section = $from.depth >= 1 ? $from.node(1) : null
  if (section && $from.depth >= 2 && !templateSection(String(section.attrs.key))?.generated && section.attrs.notApplicable === null) {
    const block = $from.node(2)
    if (block.type.name === 'paragraph' && block.content.size === 0) return { from: $from.before(2), to: $from.after(2) }
    return { from: $from.after(2), to: $from.after(2) }
  }
  let place = state.doc.content.size
  state.doc.forEach((node, pos) => {
    if (node.attrs.key === fallback) place = pos + node.nodeSize - 1
  })
  return { from: place, to: place }
}

/** Puts a block in, with a paragraph after it when it would be the last of its section, so that one can write on. */
export function insertBlock(state: EditorState, node: Node, newId: () => string): Transaction {
  const { from, to } = insertionPlace(state)
  const tr = closeHistory(state.tr)
  const $to = state.doc.resolve(to)
  const last = $to.index(1) >= $to.node(1).childCount
  const paragraph = last ? state.schema.nodes.paragraph?.create({ id: newId() }) : undefined
  tr.replaceWith(from, to, Fragment.fromArray(paragraph ? [node, paragraph] : [node]))
  const after = tr.doc.resolve(Math.min(from + node.nodeSize, tr.doc.content.size))
  return tr.setSelection(Selection.findFrom(after, 1, true) ?? Selection.near(after)).scrollIntoView()
}

/** Puts an inline atom at the caret or over the given range. */
export function insertInline(state: EditorState, node: Node, range: { from: number, to: number }): Transaction {
  const marks = state.doc.resolve(range.from).marks()
  const tr = closeHistory(state.tr).replaceWith(range.from, range.to, node.mark(marks))
  return tr.setSelection(TextSelection.create(tr.doc, range.from + node.nodeSize)).scrollIntoView()
}

/** Moves the selected block one place up or down within its section. */
export function moveBlock(state: EditorState, by: -1 | 1): Transaction | null {
  const { $from } = state.selection
  if ($from.depth < 1) return null
  const section = $from.node(1)
  const index = $from.index(1)
  const other = index + by
  if (other < 0 || other >= section.childCount) return null
  const first = Math.min(index, other)
  const start = $from.posAtIndex(first, 1)
  const a = section.child(first)
  const b = section.child(first + 1)
  const tr = state.tr.replaceWith(start, start + a.nodeSize + b.nodeSize, Fragment.fromArray([b, a]))
  const movedTo = by === 1 ? start + b.nodeSize : start
  const inBlock = state.selection.from - $from.posAtIndex(index, 1)
  return tr.setSelection(Selection.near(tr.doc.resolve(Math.min(movedTo + inBlock, tr.doc.content.size)))).scrollIntoView()
}

/** Runs a transaction maker on the editor; false when it has nothing to do. */
export function run(editor: Editor, make: (state: EditorState) => Transaction | null): boolean {
  const tr = make(editor.state)
  if (tr) editor.view.dispatch(tr)
  return tr !== null
}
