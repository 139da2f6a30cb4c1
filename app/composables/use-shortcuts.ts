import { computed, onBeforeUnmount, onMounted, shallowReactive } from 'vue'

export interface Shortcut {
  /** As `KeyboardEvent.key` says it; one key, without modifiers. */
  key: string
  /** What it does, as the list shows it. */
  label: string
  act: () => void
}

/** Shortcuts of what is on the screen; the last one named for a key wins. */
const offered = shallowReactive<Shortcut[]>([])
export const offeredShortcuts = (): readonly Shortcut[] => offered

/** Single keys can be switched off: they get in the way of speech input. */
export function useShortcutsOn() {
  const kept = useCookie<string | null>('torquill-keys', { sameSite: 'lax', path: '/', maxAge: 365 * 24 * 3600, default: () => null })
  return computed({
    get: () => kept.value !== 'off',
    set: (on: boolean) => {
      kept.value = on ? null : 'off'
    },
  })
}

/** Offers shortcuts while the component is mounted. */
export function useShortcuts(list: Shortcut[]) {
  onMounted(() => offered.push(...list))
  onBeforeUnmount(() => {
    for (const shortcut of list) offered.splice(offered.indexOf(shortcut), 1)
  })
}

/** Keys that belong to what is being typed, or to an open dialog, are left alone. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false
  return target.isContentEditable || target.matches('input:not([type=checkbox]):not([type=radio]), textarea, select') || target.closest('[role=dialog], [role=menu], [role=listbox]') !== null
}

export function shortcutFor(event: KeyboardEvent): Shortcut | null {
  if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return null
  return offered.findLast(shortcut => shortcut.key === event.key) ?? null
}
