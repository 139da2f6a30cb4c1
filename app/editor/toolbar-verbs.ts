import type { Editor } from '@tiptap/core'
import { calcKind } from '#shared/calc/registry'
import { panelPlace, showPanel, type Panel } from '~/editor/panels'
import { insertBlock, run, setBlock } from '~/editor/verbs'

export interface Verb {
  id: string
  words: string
  /** Full accessible name where the word alone is too short. */
  label?: string
  keys?: string
  run: (editor: Editor) => void
  on?: (editor: Editor) => boolean
}

const chain = (editor: Editor) => editor.chain().focus()
const mark = (id: string, words: string, name: string, keys?: string): Verb =>
  ({ id, words, label: name, ...(keys ? { keys } : {}), run: editor => chain(editor).toggleMark(id).run(), on: editor => editor.isActive(id) })

function block(id: string, words: string, type: string, attrs: Record<string, unknown> = {}): Verb {
  return {
    id, words,
    run: (editor) => {
      const nodeType = editor.schema.nodes[type]
      if (nodeType) run(editor, state => setBlock(state, nodeType, attrs))
      editor.view.focus()
    },
    on: editor => editor.isActive(type, attrs),
  }
}

export function open(editor: Editor, panel: Panel) {
  editor.view.dispatch(showPanel(editor.state.tr, { panel, at: panelPlace(editor.state, editor.state.selection.from) }))
}

export function openTie(editor: Editor) {
  const { from, to } = editor.state.selection
  open(editor, { kind: 'tie', from, to, text: editor.state.doc.textBetween(from, to, ' ') })
}

/** @returns the id of the new calculation */
export function insertCalculation(editor: Editor, name: string, newId: () => string): string | null {
  const type = editor.schema.nodes.calculation
  if (!type) return null
  const kind = calcKind(name)
  const id = newId()
  const inputs = JSON.parse(JSON.stringify(kind.blank())) as Record<string, unknown>
  const node = type.create({ id, kind: kind.kind, kindVersion: kind.version, title: '', inputs })
  run(editor, state => insertBlock(state, node, newId))
  return id
}

/** The verbs of the toolbar in their groups. */
export function toolbarVerbs(): { label: string, verbs: Verb[] }[] {
  return [
    { label: 'Blocks', verbs: [
      block('paragraph', 'Text', 'paragraph'), block('h1', 'Heading 1', 'heading', { level: 1 }), block('h2', 'Heading 2', 'heading', { level: 2 }), block('h3', 'Heading 3', 'heading', { level: 3 }),
      { id: 'bulletList', words: 'List', run: editor => chain(editor).toggleBulletList().run(), on: editor => editor.isActive('bulletList') },
      { id: 'orderedList', words: 'Numbered', label: 'Numbered list', run: editor => chain(editor).toggleOrderedList().run(), on: editor => editor.isActive('orderedList') },
    ] },
    { label: 'Marks', verbs: [
      mark('bold', 'Bold', 'Bold', 'Ctrl B'), mark('italic', 'Italic', 'Italic', 'Ctrl I'), mark('underline', 'Underline', 'Underline', 'Ctrl U'),
      mark('strike', 'Strike', 'Strike through'), mark('subscript', 'Subscript', 'Subscript'), mark('superscript', 'Superscript', 'Superscript'),
      { id: 'link', words: 'Link', run: editor => open(editor, { kind: 'link' }), on: editor => editor.isActive('link') },
    ] },
    { label: 'Insert', verbs: [
      { id: 'table', words: 'Table', label: 'Insert table', run: editor => chain(editor).insertTable({ rows: 3, cols: 3, withHeaderRow: true }).run() },
      { id: 'equation', words: 'Equation', label: 'Insert equation', run: editor => open(editor, { kind: 'equation', pos: null, inline: false }) },
      { id: 'symbol', words: 'Symbol', label: 'Symbol: insert an equation in the line', run: editor => open(editor, { kind: 'equation', pos: null, inline: true }) },
      { id: 'figure', words: 'Figure', label: 'Insert figure', run: editor => open(editor, { kind: 'figure', pos: null }) },
      { id: 'calculation', words: 'Calculation', label: 'Insert calculation', run: editor => open(editor, { kind: 'calculation' }) },
      { id: 'tied', words: 'Tied value', label: 'Insert tied value', keys: 'Ctrl Shift E', run: openTie },
    ] },
    { label: 'History', verbs: [
      { id: 'undo', words: 'Undo', keys: 'Ctrl Z', run: editor => chain(editor).undo().run() },
      { id: 'redo', words: 'Redo', keys: 'Ctrl Y', run: editor => chain(editor).redo().run() },
    ] },
  ]
}

/** Verbs that show only while the caret is in a table. */
export const tableVerbs: Verb[] = [
  { id: 'rowAfter', words: 'Add row', run: editor => chain(editor).addRowAfter().run() },
  { id: 'columnAfter', words: 'Add column', run: editor => chain(editor).addColumnAfter().run() },
  { id: 'deleteRow', words: 'Remove row', run: editor => chain(editor).deleteRow().run() },
  { id: 'deleteColumn', words: 'Remove column', run: editor => chain(editor).deleteColumn().run() },
  { id: 'headerRow', words: 'Header row', run: editor => chain(editor).toggleHeaderRow().run() },
  { id: 'deleteTable', words: 'Remove table', run: editor => chain(editor).deleteTable().run() },
]
