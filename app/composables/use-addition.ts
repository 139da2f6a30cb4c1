import { ref, type Ref } from 'vue'
import type { z } from 'zod'
import type { ApiError } from '#shared/schemas/api-error'

/**
 * A dialog that adds one thing: what is typed, its faults by field, and the press
 * that sends it. Closes and begins anew once it is added; a refusal keeps every word.
 */
export function useAddition<Typed extends object>(open: Ref<boolean>, spec: { schema: z.ZodType<object>, path: string, blank: () => Typed, added: (id: string) => void }) {
  const api = useApi()
  const typed = ref(spec.blank()) as Ref<Typed>
  const faults = ref<Record<string, string>>({})
  const error = ref<ApiError | null>(null)
  const busy = ref(false)

  async function add() {
    if (busy.value) return
    const read = spec.schema.safeParse(typed.value)
    faults.value = read.success ? {} : fieldFaults(read.error)
    error.value = null
    if (!read.success) return
    busy.value = true
    const answer = await api.post<{ id: string }>(spec.path, read.data)
    busy.value = false
    if (!answer.ok) {
      faults.value = answer.error.fields ?? {}
      error.value = answer.error.fields ? null : answer.error
      return
    }
    typed.value = spec.blank()
    open.value = false
    spec.added(answer.value.id)
  }
  return { typed, faults, error, busy, add }
}
