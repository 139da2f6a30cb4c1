declare module 'nuxt/app' {
  interface PageMeta {
    /** Read without signing in. */
    open?: boolean
    /** Who may see the page; the server decides again at each of its routes. */
    need?: 'administrator' | 'auditor'
  }
}

/** Pages need a signed-in person unless they say that they are open; the address is kept for the way back. */
export default defineNuxtRouteMiddleware(async (to) => {
  const store = useMeStore()
  // The count of what waits is read again on the way, without waiting for it.
  if (import.meta.client && store.me) void store.load().catch(() => undefined)
  const me = store.me ?? (to.meta.open && store.asked ? null : await store.load())
  if (to.meta.open) return
  if (!me) return navigateTo(signInAddress(to.fullPath))
  const allowed = to.meta.need === 'administrator' ? me.administrator : to.meta.need === 'auditor' ? me.auditor || me.administrator : true
  if (!allowed) {
    return abortNavigation(createError({
      statusCode: 403, statusMessage: 'not-allowed', fatal: true,
      data: { code: 'not-allowed', message: to.meta.need === 'auditor' ? 'The trail is open to auditors and administrators.' : 'People and projects are looked after by administrators; ask one.' },
    }))
  }
})
