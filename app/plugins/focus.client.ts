// After a change of page, reading and tabbing begin at its content, as after a load; a mere change of the query moves nothing.
export default defineNuxtPlugin((nuxt) => {
  let path = useRouter().currentRoute.value.path
  nuxt.hook('page:finish', () => {
    const now = useRouter().currentRoute.value
    if (now.path === path) return
    path = now.path
    if (!now.hash) document.getElementById('content')?.focus({ preventScroll: true })
  })
})
