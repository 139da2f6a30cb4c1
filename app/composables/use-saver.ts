import type { Editor } from '@tiptap/core'
import type { Transaction } from '@tiptap/pm/state'
import type { Node } from '@tiptap/pm/model'
import { onBeforeUnmount } from 'vue'
import type { IssueView, SaveAnswer } from '#shared/schemas/issue-view'
import { ask } from '~/composables/issue-api'
import { docHash } from '~/editor/doc-hash'
import { Saver, type Batch, type SaverPort, type Sent } from '~/editor/saver'
import { forgetUnsent, keepUnsent } from '~/editor/unsent'
import { useIssueStore } from '~/stores/issue'
import { useResultsStore } from '~/stores/results'
import { useSaveStore } from '~/stores/save'
import { calculationsOf } from '#shared/note/calculations'

export interface Me { id: string, name: string }

/** Saves what the editor changes, and tells the strip how it stands. */
export function useSaver(editor: Editor, issue: IssueView, me: Me, onConflict: () => void) {
  const issues = useIssueStore()
  const results = useResultsStore()
  const save = useSaveStore()
  save.set({ phase: 'saved', save: issue.save, savedAt: issue.savedAt, unsent: 0, since: null, message: null })

  function stored(answer: SaveAnswer, doc: Node) {
    const saved = new Map(calculationsOf(doc).map(each => [each.id, each.inputs]))
    const now = new Map(calculationsOf(editor.state.doc).map(each => [each.id, each.inputs]))
    results.takeServer(answer.results, id => saved.get(id) !== now.get(id))
    issues.takeSave(answer, me)
  }
  const port: SaverPort = {
    send: batch => send(issue.id, batch),
    hash: docHash,
    newKey: () => crypto.randomUUID(),
    now: () => new Date(),
    keep(kept) {
      if (kept) keepUnsent(localStorage, { issueId: issue.id, personId: me.id, ...kept, at: new Date().toISOString() })
      else forgetUnsent(localStorage, issue.id, me.id)
    },
    show: state => save.set(state),
    stored,
    conflict: onConflict,
    later: (run, ms) => window.setTimeout(run, ms),
    cancel: timer => window.clearTimeout(timer),
  }
  const saver = new Saver(port, issue.save, editor.state.doc)
  const onTransaction = ({ transaction }: { transaction: Transaction }) => {
    if (transaction.docChanged && !transaction.getMeta('fromServer')) saver.changed(transaction.steps, transaction.doc)
  }
  editor.on('transaction', onTransaction)
  const leave = watchLeaving(saver)
  issues.settle = () => saver.flush()
  onBeforeUnmount(() => {
    editor.off('transaction', onTransaction)
    leave()
    issues.settle = async () => true
    void saver.flush().finally(() => saver.stop())
  })
  return saver
}

async function send(issueId: string, batch: Batch): Promise<Sent> {
  const answer = await ask<SaveAnswer>(`/api/issues/${issueId}/content`, { method: 'PUT', body: { ...batch } })
  if (answer.ok) return { kind: 'stored', answer: answer.value }
  if (answer.status === 0 || answer.status >= 500 || answer.status === 429) return { kind: 'no-connection' }
  if (answer.status === 409 && answer.error.code === 'save-conflict') return { kind: 'conflict', message: answer.error.message }
  return { kind: 'refused', message: answer.error.message }
}

/** Sends at once when the page is hidden, asks before it is left with something unsent, and tries again when the connection is back. */
function watchLeaving(saver: Saver): () => void {
  const hidden = () => {
    if (document.visibilityState === 'hidden') void saver.flush()
  }
  const online = () => void saver.flush()
  const before = (event: BeforeUnloadEvent) => {
    if (saver.unsent) event.preventDefault()
  }
  document.addEventListener('visibilitychange', hidden)
  window.addEventListener('online', online)
  window.addEventListener('beforeunload', before)
  return () => {
    document.removeEventListener('visibilitychange', hidden)
    window.removeEventListener('online', online)
    window.removeEventListener('beforeunload', before)
  }
}
