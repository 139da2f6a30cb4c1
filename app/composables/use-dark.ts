import { useEventListener, useMutationObserver } from '@vueuse/core'
import { ref, type Ref } from 'vue'

/** Whether the page shows its night colours; drawings carry their colours in themselves and must know. */
export function useDark(): Ref<boolean> {
  const dark = ref(false)
  if (typeof document === 'undefined') return dark
  const root = document.documentElement
  const read = () => {
    dark.value = getComputedStyle(root).colorScheme.includes('dark')
  }
  read()
  useMutationObserver(root, read, { attributes: true, attributeFilter: ['data-theme'] })
  if (window.matchMedia) useEventListener(window.matchMedia('(prefers-color-scheme: dark)'), 'change', read)
  return dark
}
