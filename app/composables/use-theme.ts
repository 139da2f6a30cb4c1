import { computed } from 'vue'

export type ThemeChoice = 'light' | 'dark' | 'system'

/** Which ground the pages stand on; without a choice they follow the system. */
export function useTheme() {
  const kept = useCookie<string | null>('torquill-theme', { sameSite: 'lax', path: '/', maxAge: 365 * 24 * 3600, default: () => null })
  const choice = computed<ThemeChoice>(() => kept.value === 'light' || kept.value === 'dark' ? kept.value : 'system')
  function choose(wanted: ThemeChoice) {
    kept.value = wanted === 'system' ? null : wanted
  }
  return { choice, choose }
}
