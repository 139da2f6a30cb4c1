import { defineStore } from 'pinia'
import { ref } from 'vue'
import type { Me } from '#shared/schemas/lists'

/** Who is signed in; null when nobody is. */
export const useMeStore = defineStore('me', () => {
  const me = ref<Me | null>(null)
  /** Whether the server was asked: a stranger on an open page is asked for once. */
  const asked = ref(false)

  /** @throws when the server cannot be asked; nobody signed in is not a failure. */
  async function load(): Promise<Me | null> {
    const fetcher = useRequestFetch() as typeof $fetch
    asked.value = true
    try {
      me.value = await fetcher<unknown>('/api/me', { retry: 0 }) as Me
    } catch (thrown) {
      const refusal = refusalOf(thrown)
      if (refusal.status !== 401) throw createError({ statusCode: refusal.status || 503, statusMessage: refusal.error.code, data: refusal.error, fatal: true })
      me.value = null
    }
    return me.value
  }
  function forget() {
    me.value = null
  }
  return { me, asked, load, forget }
})
