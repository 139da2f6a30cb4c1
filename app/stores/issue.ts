import { defineStore } from 'pinia'
import { computed, ref, shallowRef } from 'vue'
import type { AnswerView, IssueView, SaveAnswer } from '#shared/schemas/issue-view'
import { ask, type Answer } from '~/composables/issue-api'
import { useResultsStore } from '~/stores/results'

/** The issue on the screen, as the server last described it, and the acts a person can do on it. */
export const useIssueStore = defineStore('issue', () => {
  const results = useResultsStore()
  const view = shallowRef<IssueView | null>(null)
  const busy = ref(false)
  /** Sends what is not saved yet; the editor sets it. Acts on an issue speak of a save, so they wait for it. */
  const settle = shallowRef<() => Promise<boolean>>(async () => true)

  const answers = computed(() => {
    const byGuard = new Map<string, AnswerView>()
    for (const answer of view.value?.answers ?? []) byGuard.set(`${answer.calcId} ${answer.guardKey}`, answer)
    return byGuard
  })
  function answerTo(calcId: string, guardKey: string): AnswerView | null {
    return answers.value.get(`${calcId} ${guardKey}`) ?? null
  }
  function take(next: IssueView) {
    const other = view.value?.id !== next.id
    if (other) results.clear()
    view.value = next
    if (other || results.preview.size === 0) results.takeServer(next.results)
  }
  function takeSave(answer: SaveAnswer, by: { id: string, name: string }) {
    if (!view.value) return
    const { results: _, ...rest } = answer
    view.value = { ...view.value, ...rest, savedBy: by }
  }
  async function load(issueId: string): Promise<Answer<IssueView>> {
    const answer = await ask<IssueView>(`/api/issues/${issueId}`)
    if (answer.ok) take(answer.value)
    return answer
  }
  /** One act on the issue; the answer is the issue afterwards. */
  async function act(path: string, body: Record<string, unknown> = {}, method: 'POST' | 'PATCH' = 'POST'): Promise<Answer<IssueView>> {
    const issue = view.value
    if (!issue) throw new Error('No issue is open')
    busy.value = true
    try {
      await settle.value()
      const answer = await ask<IssueView>(`/api/issues/${issue.id}/${path}`, { method, body })
      if (answer.ok) take(answer.value)
      return answer
    } finally {
      busy.value = false
    }
  }
  /** State and save the person looked at: the server refuses when either moved. */
  function expected() {
    return { state: view.value?.state, save: view.value?.save }
  }
  return { view, busy, settle, answerTo, take, takeSave, load, act, expected }
})
