// Runs in the head before anything is painted: a page that follows the system never flashes the other ground.
const followSystem = `{const r=document.documentElement;r.dataset.theme??=matchMedia('(prefers-color-scheme: dark)').matches?'dark':'light'}`

export default defineNuxtPlugin(() => {
  const { choice } = useTheme()
  if (import.meta.server) {
    useHead({
      htmlAttrs: choice.value === 'system' ? {} : { 'data-theme': choice.value },
      script: [{ key: 'theme', innerHTML: followSystem, tagPriority: 'critical' }],
    })
    return
  }
  const system = matchMedia('(prefers-color-scheme: dark)')
  const apply = () => {
    const wanted = choice.value === 'system' ? (system.matches ? 'dark' : 'light') : choice.value
    document.documentElement.dataset.theme = wanted
  }
  system.addEventListener('change', apply)
  watch(choice, apply, { immediate: true })
})
