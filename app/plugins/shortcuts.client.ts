export default defineNuxtPlugin(() => {
  const on = useShortcutsOn()
  window.addEventListener('keydown', (event) => {
    if (!on.value) return
    const shortcut = shortcutFor(event)
    if (!shortcut) return
    event.preventDefault()
    shortcut.act()
  })
})
