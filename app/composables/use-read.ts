import { computed, toValue, watch, type MaybeRefOrGetter, type Ref } from 'vue'
import type { ApiError } from '#shared/schemas/api-error'

export interface Reading<T> {
  data: Ref<T>
  pending: Ref<boolean>
  /** Why the last reading failed; `data` still holds what was read before. */
  refusal: Ref<ApiError | null>
  refresh: () => Promise<void>
}

/**
 * Reads what a page shows: on the server with the asker's cookies, again when
 * the address or the query changes. The first reading that fails becomes the
 * error page; a later one leaves what is shown and says why.
 */
export async function useRead<T>(url: MaybeRefOrGetter<string>, query?: MaybeRefOrGetter<Record<string, unknown>>): Promise<Reading<T>> {
  const nuxt = useNuxtApp()
  const route = useRoute()
  const request = useFetch<T, Error, string>(() => toValue(url), { query: computed(() => toValue(query) ?? {}), retry: 0 })
  const answer = await request
  const refusal = computed(() => answer.error.value ? refusalOf(answer.error.value) : null)

  async function leaveIfSignedOut() {
    if (refusal.value?.error.code !== 'not-signed-in') return false
    await nuxt.runWithContext(() => navigateTo(signInAddress(route.fullPath)))
    return true
  }
  if (refusal.value && !await leaveIfSignedOut()) {
    throw createError({ statusCode: refusal.value.status || 503, statusMessage: refusal.value.error.code, data: refusal.value.error, fatal: true })
  }
  watch(refusal, leaveIfSignedOut)
  return {
    data: answer.data as Ref<T>,
    pending: computed(() => answer.status.value === 'pending'),
    refusal: computed(() => refusal.value?.error ?? null),
    refresh: async () => {
      await answer.refresh()
    },
  }
}
