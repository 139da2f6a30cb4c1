import { onBeforeUnmount, ref, type Ref } from 'vue'
import type { IssueView } from '#shared/schemas/issue-view'
import { ask } from '~/composables/issue-api'

type Writer = IssueView['writer']

/** Half the time after which an unkept pen falls free would be cut close; a third leaves two tries. */
const EVERY = 20_000

/**
 * The pen: who may write in a draft, one at a time. Held, it is kept by asking
 * again; while another holds it, it is asked for in the same rhythm, so that the
 * screen says when it is free.
 */
export function usePen(issueId: string, first: Writer, mayWrite: boolean) {
  const writer: Ref<Writer> = ref(first)
  const held = ref(false)
  const refused = ref<string | null>(null)

  async function take(): Promise<boolean> {
    const answer = await ask<{ writer: Writer }>(`/api/issues/${issueId}/lease`, { method: 'POST', body: {} })
    if (answer.ok) {
      writer.value = answer.value.writer
      held.value = answer.value.writer?.you === true
      refused.value = null
    } else if (answer.status !== 0) {
      held.value = false
      refused.value = answer.error.message
      await look()
    }
    return held.value
  }
  async function look() {
    const answer = await ask<{ writer: Writer }>(`/api/issues/${issueId}/lease`)
    if (answer.ok) writer.value = answer.value.writer
  }
  async function lay() {
    if (!held.value) return
    held.value = false
    await ask(`/api/issues/${issueId}/lease`, { method: 'DELETE', keepalive: true })
  }
  const timer = mayWrite ? window.setInterval(() => void (held.value ? take() : look()), EVERY) : 0
  const leaving = () => void lay()
  window.addEventListener('pagehide', leaving)
  onBeforeUnmount(() => {
    window.clearInterval(timer)
    window.removeEventListener('pagehide', leaving)
    void lay()
  })
  return { writer, held, refused, take, lay }
}
