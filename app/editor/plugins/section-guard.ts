import type { Node } from '@tiptap/pm/model'
import { Plugin, type EditorState, type Transaction } from '@tiptap/pm/state'
import { templateSection } from '#shared/note/template'

/** Whether the sections of two documents are the same ones in the same order, generated ones untouched. */
export function sameSections(before: Node, after: Node): boolean {
  if (before.childCount !== after.childCount) return false
  for (let i = 0; i < before.childCount; i++) {
    const was = before.child(i)
    const now = after.child(i)
    if (was === now) continue
    if (was.attrs.key !== now.attrs.key || was.attrs.id !== now.attrs.id) return false
    if (templateSection(String(was.attrs.key))?.generated && !was.eq(now)) return false
  }
  return true
}

/** Sections come from the template: an edit that would remove, join or move one does not happen. */
export function sectionGuard(): Plugin {
  return new Plugin({
    filterTransaction: (tr, state) => !tr.docChanged || sameSections(state.doc, tr.doc),
    props: {
      handleKeyDown(view, event) {
        if (event.key !== 'Backspace' && event.key !== 'Delete') return false
        const tr = deleteWithinSections(view.state)
        if (tr) view.dispatch(tr.scrollIntoView())
        return tr !== null
      },
      handleTextInput(view, _from, _to, text) {
        const tr = deleteWithinSections(view.state)
        if (tr) view.dispatch(tr.insertText(text).scrollIntoView())
        return tr !== null
      },
      handlePaste(view) {
        const tr = deleteWithinSections(view.state)
        if (tr) view.dispatch(tr)
        return false
      },
    },
  })
}

/** Deletes a selection that reaches over several sections, in each of them by itself. Null when it does not. */
export function deleteWithinSections(state: EditorState): Transaction | null {
  const { from, to, $from, $to } = state.selection
  if (from === to || $from.sharedDepth(to) > 0 || $from.index(0) === $to.index(0)) return null
  const tr = state.tr
  const ranges: [number, number][] = []
  state.doc.forEach((section, pos) => {
    if (templateSection(String(section.attrs.key))?.generated) return
    const start = Math.max(from, pos + 1)
    const end = Math.min(to, pos + section.nodeSize - 1)
    if (start < end) ranges.push([start, end])
  })
  for (const [start, end] of ranges.reverse()) tr.deleteRange(start, end)
  return tr
}
