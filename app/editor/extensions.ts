import { Extension, type AnyExtension } from '@tiptap/core'
import { CalculationNode, EquationNode, FigureNode, InlineEquationNode, SectionNode, TiedNode } from '#shared/note/nodes'
import { noteExtensions } from '#shared/note/schema'
import type { Mounts } from '~/editor/mounts'
import { NoteKeys, type NoteKeysOptions } from '~/editor/note-keys'
import { panelPlugin } from '~/editor/panels'
import { blockIds } from '~/editor/plugins/block-ids'
import { guidance } from '~/editor/plugins/guidance'
import { marks, type Marked } from '~/editor/plugins/marks'
import { reading } from '~/editor/plugins/reading'
import { sectionGuard } from '~/editor/plugins/section-guard'
import { calculationView } from '~/editor/views/calculation-view'
import { equationView } from '~/editor/views/equation-view'
import { figureView } from '~/editor/views/figure-view'
import { sectionView } from '~/editor/views/section-view'
import { tiedView, type ReadTied } from '~/editor/views/tied-view'

export interface EditorParts {
  mounts: Mounts
  readTied: ReadTied
  slot: HTMLElement
  marked: Marked
  keys: NoteKeysOptions
  newId: () => string
}

/** The schema of a note with the views and habits of the screen. */
export function editorExtensions({ mounts, readTied, slot, marked, keys, newId }: EditorParts): AnyExtension[] {
  return [
    ...noteExtensions({
      section: SectionNode.extend({ addNodeView: () => sectionView(mounts) }),
      calculation: CalculationNode.extend({ addNodeView: () => calculationView(mounts) }),
      equation: EquationNode.extend({ addNodeView: () => equationView }),
      inlineEquation: InlineEquationNode.extend({ addNodeView: () => equationView }),
      figure: FigureNode.extend({ addNodeView: () => figureView }),
      tied: TiedNode.extend({ addNodeView: () => tiedView(readTied) }),
    }),
    NoteKeys.configure(keys),
    Extension.create({
      name: 'noteHabits',
      addProseMirrorPlugins: () => [reading(), sectionGuard(), blockIds(newId), guidance(), marks(marked), panelPlugin(slot)],
    }),
  ]
}
