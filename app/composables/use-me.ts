import { computed } from 'vue'
import type { Me, ProjectRole } from '#shared/schemas/lists'

/** What a person is, in words: `analyst and checker`, `auditor`. */
export function dutyOf(me: Pick<Me, 'auditor' | 'administrator' | 'projects'>): string {
  const held = (['analyst', 'checker', 'approver'] as const).filter(role => me.projects.some(project => project.roles.includes(role)))
  const duties = [...held, ...(me.auditor ? ['auditor'] : []), ...(me.administrator ? ['administrator'] : [])]
  return duties.length > 1 ? `${duties.slice(0, -1).join(', ')} and ${duties.at(-1)}` : duties[0] ?? 'no role yet'
}

/** The signed-in person on a page that needs one. */
export function useMe() {
  const store = useMeStore()
  const me = computed(() => store.me)
  const seesTrail = computed(() => me.value !== null && (me.value.auditor || me.value.administrator))
  const projectsAs = (role: ProjectRole) => me.value?.projects.filter(project => project.roles.includes(role)) ?? []
  return { me, seesTrail, projectsAs, duty: computed(() => me.value ? dutyOf(me.value) : '') }
}
