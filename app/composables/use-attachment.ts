import { shallowRef } from 'vue'
import { ask } from '~/composables/issue-api'
import { useIssueStore } from '~/stores/issue'

/** A file that goes with a remark or a reply: sent when the words are. */
export function useAttachment() {
  const issue = useIssueStore()
  const file = shallowRef<File | null>(null)
  function choose(event: Event) {
    file.value = (event.target as HTMLInputElement).files?.[0] ?? null
  }
  async function upload(): Promise<{ ok: true, id: string | null } | { ok: false, message: string }> {
    if (!file.value) return { ok: true, id: null }
    const body = new FormData()
    body.append('file', file.value)
    const answer = await ask<{ id: string }>(`/api/issues/${issue.view?.id}/files?purpose=attachment`, { method: 'POST', body })
    return answer.ok ? { ok: true, id: answer.value.id } : { ok: false, message: answer.error.message }
  }
  return { choose, upload }
}
