/** Every guard of an open section that fires, in the order of the methods reference. */
import type { Guard } from '#shared/calc/types'
import { geometryGuards } from '#shared/calc/kinds/open-section/guards-geometry'
import { loadingGuards } from '#shared/calc/kinds/open-section/guards-loading'
import { materialGuards } from '#shared/calc/kinds/open-section/guards-material'
import type { Solution } from '#shared/calc/kinds/open-section/solution'

export function openSectionGuards(solution: Solution): Guard[] {
  const guards = [...geometryGuards(solution), ...materialGuards(solution), ...loadingGuards(solution)]
  return guards.sort((a, b) => a.id < b.id ? -1 : a.id > b.id ? 1 : a.key < b.key ? -1 : 1)
}
