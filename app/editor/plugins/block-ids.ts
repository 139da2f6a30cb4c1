import { Fragment, Slice, type Node } from '@tiptap/pm/model'
import { Plugin, type EditorState, type Transaction } from '@tiptap/pm/state'
import { ReplaceAroundStep, ReplaceStep, type Step } from '@tiptap/pm/transform'

/** Whether nodes of this type carry an id of their own. */
const carriesId = (node: Node) => node.type.spec.attrs !== undefined && 'id' in node.type.spec.attrs

/** A copy of pasted content in which every id is new, and tied values follow a calculation pasted with them. */
export function withNewIds(slice: Slice, newId: () => string): Slice {
  const renamed = new Map<string, string>()
  slice.content.descendants((node) => {
    if (carriesId(node) && typeof node.attrs.id === 'string') renamed.set(node.attrs.id, newId())
  })
  const copy = (fragment: Fragment): Fragment => {
    const nodes: Node[] = []
    fragment.forEach(node => nodes.push(copyNode(node)))
    return Fragment.fromArray(nodes)
  }
  const copyNode = (node: Node): Node => {
    if (node.isText) return node
    const attrs = { ...node.attrs }
    if (carriesId(node)) attrs.id = renamed.get(String(node.attrs.id)) ?? newId()
    if (typeof attrs.calcId === 'string') attrs.calcId = renamed.get(attrs.calcId) ?? attrs.calcId
    return node.type.create(attrs, copy(node.content), node.marks)
  }
  return new Slice(copy(slice.content), slice.openStart, slice.openEnd)
}

/** Gives an id to every block that has none, and a new one to the second bearer of the same. */
export function mendIds(state: EditorState, newId: () => string): Transaction | null {
  const seen = new Set<string>()
  const tr = state.tr
  state.doc.descendants((node, pos) => {
    if (!carriesId(node)) return
    const id: unknown = node.attrs.id
    if (typeof id === 'string' && id !== '' && !seen.has(id)) {
      seen.add(id)
      return
    }
    const fresh = newId()
    seen.add(fresh)
    tr.setNodeAttribute(pos, 'id', fresh)
  })
  return tr.docChanged ? tr : null
}

export function blockIds(newId: () => string): Plugin {
  return new Plugin({
    appendTransaction: (transactions, _before, after) =>
      transactions.some(tr => tr.steps.some(bringsBlocks)) ? mendIds(after, newId) : null,
    props: { transformPasted: slice => withNewIds(slice, newId) },
  })
}

/** Typing inside a block makes no new block: the note is looked through only after a split, a paste or a wrap. */
function bringsBlocks(step: Step): boolean {
  if (step instanceof ReplaceAroundStep) return true
  return step instanceof ReplaceStep && step.slice.content.firstChild?.isBlock === true
}
