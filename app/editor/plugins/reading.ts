import { Plugin, PluginKey, type EditorState, type Transaction } from '@tiptap/pm/state'

const key = new PluginKey<boolean>('reading')

/**
 * A note that may only be read keeps its caret, so that a checker can select
 * words by keyboard to remark on them; it takes no change of the document.
 */
export function reading(): Plugin<boolean> {
  return new Plugin<boolean>({
    key,
    state: {
      init: () => true,
      apply: (tr, only) => (tr.getMeta(key) as boolean | undefined) ?? only,
    },
    filterTransaction: (tr, state) => !tr.docChanged || !key.getState(state) || tr.getMeta('fromServer') === true,
    props: {
      attributes: (state): Record<string, string> => (key.getState(state) ? { 'class': 'reading', 'aria-readonly': 'true' } : { class: 'writing' }),
    },
  })
}

export const isReading = (state: EditorState): boolean => key.getState(state) !== false

export const setReading = (tr: Transaction, only: boolean): Transaction => tr.setMeta(key, only).setMeta('addToHistory', false)
