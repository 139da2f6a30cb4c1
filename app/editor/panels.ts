import type { EditorState, Transaction } from '@tiptap/pm/state'
import { Plugin, PluginKey } from '@tiptap/pm/state'
import { Decoration, DecorationSet } from '@tiptap/pm/view'

/**
 * The form a person has open in the text: it stands under the block it speaks
 * of and pushes the rest down, so that nothing floats over the note.
 */
export type Panel
  = | { kind: 'equation', pos: number | null, inline: boolean }
    | { kind: 'figure', pos: number | null }
    | { kind: 'tie', from: number, to: number, text: string }
    | { kind: 'calculation' }
    | { kind: 'link' }

interface Open { panel: Panel, at: number }

export const panelKey = new PluginKey<Open | null>('panel')

/** Opens a panel under the block at `at`, or closes it with null. */
export function showPanel(tr: Transaction, open: Open | null): Transaction {
  return tr.setMeta(panelKey, { open }).setMeta('addToHistory', false)
}

export const openPanel = (state: EditorState): Panel | null => panelKey.getState(state)?.panel ?? null

/** End of the block of its section in which a position stands: where a panel can be put. */
export function panelPlace(state: EditorState, pos: number): number {
  const $pos = state.doc.resolve(Math.min(pos, state.doc.content.size))
  return $pos.depth >= 2 ? $pos.after(2) : $pos.nodeAfter && $pos.depth === 1 ? pos + $pos.nodeAfter.nodeSize : $pos.pos
}

/** `slot` is the element in which the page shows the form. */
export function panelPlugin(slot: HTMLElement): Plugin<Open | null> {
  return new Plugin<Open | null>({
    key: panelKey,
    state: {
      init: () => null,
      apply(tr, open) {
        const meta = tr.getMeta(panelKey) as { open: Open | null } | undefined
        if (meta) return meta.open
        if (!open || !tr.docChanged) return open
        return { panel: movePanel(open.panel, tr), at: tr.mapping.map(open.at) }
      },
    },
    props: {
      decorations(state) {
        const open = panelKey.getState(state)
        if (!open) return null
        const widget = Decoration.widget(open.at, slot, { side: 1, key: 'panel', stopEvent: () => true, ignoreSelection: true })
        return DecorationSet.create(state.doc, [widget])
      },
    },
  })
}

function movePanel(panel: Panel, tr: Transaction): Panel {
  if (panel.kind === 'tie') return { ...panel, from: tr.mapping.map(panel.from), to: tr.mapping.map(panel.to) }
  if ((panel.kind === 'equation' || panel.kind === 'figure') && panel.pos !== null) return { ...panel, pos: tr.mapping.map(panel.pos) }
  return panel
}
