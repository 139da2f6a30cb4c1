import type { Editor } from '@tiptap/core'

/** Where a mark stands in the document now: it may have moved since the save that brought it. */
export function rangeOfMark(editor: Editor, mark: string): { from: number, to: number } | null {
  const pieces = [...editor.view.dom.querySelectorAll(`[data-mark="${CSS.escape(mark)}"]`)]
  const first = pieces[0]
  const last = pieces.at(-1)
  if (!first || !last) return null
  return { from: editor.view.posAtDOM(first, 0), to: editor.view.posAtDOM(last, last.childNodes.length) }
}
