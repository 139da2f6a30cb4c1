import { useTimeoutPoll } from '@vueuse/core'
import { computed, ref } from 'vue'
import { ask } from '~/composables/issue-api'

interface Printing { state: 'waiting' | 'ready' | 'failed', fileId: string | null }

/** An uncontrolled PDF: asked for, waited for, then opened. */
export function useDraftPdf(issueId: () => string) {
  const job = ref<string | null>(null)
  const trouble = ref<string | null>(null)
  const poll = useTimeoutPoll(async () => {
    const answer = await ask<Printing>(`/api/issues/${issueId()}/draft-pdf/${job.value}`)
    if (answer.ok && answer.value.state === 'waiting') return
    poll.pause()
    job.value = null
    if (answer.ok && answer.value.fileId) window.location.assign(`/files/${answer.value.fileId}`)
    else trouble.value = answer.ok ? 'The PDF could not be made. Try again; if it fails again, tell the administrator.' : answer.error.message
  }, 1000, { immediate: false })

  async function print() {
    trouble.value = null
    const answer = await ask<{ jobId: string }>(`/api/issues/${issueId()}/draft-pdf`, { method: 'POST', body: {} })
    if (!answer.ok) {
      trouble.value = answer.error.message
      return
    }
    job.value = answer.value.jobId
    poll.resume()
  }
  return { print, failed: computed(() => trouble.value !== null), says: computed(() => trouble.value ?? (job.value ? 'The uncontrolled PDF is being made.' : null)) }
}
