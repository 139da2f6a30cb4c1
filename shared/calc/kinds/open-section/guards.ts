/** Every guard of an open section that fires, in the order of the methods reference. */
import type { Guard } from '#shared/calc/types'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import { geometryGuards } from '#shared/calc/kinds/open-section/guards-geometry'
import { loadingGuards } from '#shared/calc/kinds/open-section/guards-loading'
import type { Solution } from '#shared/calc/kinds/open-section/solution'

export function openSectionGuards(s: Solution): Guard[] {
  const used = s.model.materials.filter(m => s.model.walls.some(w => w.material === m))
  const materials = materialGuards({ materials: used, cases: s.model.cases, partial: s.model.factors.partial })
  return inOrder([...geometryGuards(s), ...materials, ...loadingGuards(s)])
}
