import { Extension } from '@tiptap/core'
import { NodeSelection, Selection } from '@tiptap/pm/state'
import { moveBlock, run, setBlock } from '~/editor/verbs'

export interface NoteKeysOptions {
  toToolbar: () => void
  openCalculation: (id: string) => void
  openEquation: (pos: number, inline: boolean) => void
  tie: () => void
}

/** Keys of the note. The ends of a long note are found from the document, not from what is drawn. */
export const NoteKeys = Extension.create<NoteKeysOptions>({
  name: 'noteKeys',
  // Before the kit's own keys, whose block commands would lose the ids of blocks.
  priority: 1000,
  addOptions: () => ({ toToolbar: () => undefined, openCalculation: () => undefined, openEquation: () => undefined, tie: () => undefined }),
  addKeyboardShortcuts() {
    const { editor, options } = this
    const ends = (make: () => Selection) => () => {
      editor.view.dispatch(editor.state.tr.setSelection(make()).scrollIntoView())
      return true
    }
    const block = (type: string, attrs = {}) => () => {
      const nodeType = editor.schema.nodes[type]
      if (nodeType) run(editor, state => setBlock(state, nodeType, attrs))
      return true
    }
    const enter = () => {
      const { selection } = editor.state
      if (!(selection instanceof NodeSelection)) return false
      const { node, from } = selection
      if (node.type.name === 'calculation') options.openCalculation(String(node.attrs.id))
      else if (node.type.name === 'equation' || node.type.name === 'inlineEquation') options.openEquation(from, node.isInline)
      else return false
      return true
    }
    return {
      'Mod-Home': ends(() => Selection.atStart(editor.state.doc)),
      'Mod-End': ends(() => Selection.atEnd(editor.state.doc)),
      'Mod-Alt-0': block('paragraph'),
      'Mod-Alt-1': block('heading', { level: 1 }),
      'Mod-Alt-2': block('heading', { level: 2 }),
      'Mod-Alt-3': block('heading', { level: 3 }),
      'Alt-ArrowUp': () => run(editor, state => moveBlock(state, -1)),
      'Alt-ArrowDown': () => run(editor, state => moveBlock(state, 1)),
      'Enter': enter,
      'Mod-Shift-e': () => {
        options.tie()
        return true
      },
      'Alt-F10': () => {
        options.toToolbar()
        return true
      },
    }
  },
})
