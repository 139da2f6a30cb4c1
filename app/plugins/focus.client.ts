// After a change of page, reading and tabbing begin at its content, as after a load; a mere change of the query moves nothing.
export default defineNuxtPlugin((nuxt) => {
  const { currentRoute } = useRouter()
  let path = currentRoute.value.path
  nuxt.hook('page:finish', () => {
    if (currentRoute.value.path === path) return
    path = currentRoute.value.path
    if (!currentRoute.value.hash) document.getElementById('content')?.focus({ preventScroll: true })
  })
})
