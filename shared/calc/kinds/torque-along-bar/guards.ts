import { fired } from '#shared/calc/guards/catalogue'
import { declaredGuards } from '#shared/calc/guards/declared'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards, type StressShare } from '#shared/calc/guards/fatigue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import { totalTwistGuards } from '#shared/calc/guards/rotation'
import type { AlongSolution } from '#shared/calc/kinds/torque-along-bar/solve'
import { degrees, figure } from '#shared/calc/parts/say'
import type { Guard } from '#shared/calc/types'

/** Half-angle of taper above which the closed form is in doubt (common practice). */
const TAPER = 10 * Math.PI / 180

export function alongGuards(s: AlongSolution): Guard[] {
  const { model, cases, margins } = s
  const used = model.materials.filter(m => model.segments.some(segment => segment.material === m))
  return inOrder([
    ...refusedGuards(model.refused), ...unusualGuards(model.unusual), ...declaredGuards({ ...model.declarations, taper: null }), ...tapers(s),
    ...materialGuards({ materials: used, cases: model.cases, partial: model.factors.partial }), ...factorGuards(model.factors, model.declarations.fitting),
    ...sharing(s), ...yieldGuards(margins, ['shear-yield']), ...fatigueGuards({ repeated: model.declarations.repeated, notches: [], worst: worstShare(s) }),
    ...totalTwistGuards(cases.map(c => ({ caseId: c.model.id, twist: c.twistMax * c.toLimit }))), ...marginGuards(margins),
  ])
}

function tapers({ model }: AlongSolution): Guard[] {
  const steepest = model.segments.reduce((high, one) => (one.taper > high.taper ? one : high), model.segments[0] ?? { taper: 0, id: '' })
  const angle = Math.max(steepest.taper, Math.abs(model.declarations.taper ?? 0))
  if (angle <= TAPER) return []
  return [fired('G-38', { values: { 'half-angle, °': degrees(angle) }, message: `The bar tapers at a half-angle of ${figure(degrees(angle))}°${steepest.taper === angle ? ` in segment ${steepest.id}` : ''}, more than 10°.` })]
}

/** More supports than equilibrium needs: stiffness and clearance decide who carries what (G-21). */
function sharing({ model }: AlongSolution): Guard[] {
  const loose = model.supports.filter(support => support.clearance !== null)
  const guards: Guard[] = []
  if (model.supports.length > 1) {
    guards.push(fired('G-21', { values: { supports: model.supports.length }, message: `${model.supports.length} supports share the torque by their stiffness and that of the bar between them.` }))
  }
  if (loose.length > 0) {
    guards.push(fired('G-21', { of: 'clearance', values: { 'clearance, °': degrees(Math.max(...loose.map(one => Math.abs(one.clearance ?? 0)))) }, message: `The support at node ${loose.map(one => one.node).join(', ')} has a clearance; it is computed as if it took hold at once.` }))
  }
  return guards
}

function worstShare({ cases, model }: AlongSolution): StressShare | null {
  return cases.reduce<StressShare | null>((worst, c) => model.segments.reduce<StressShare | null>((high, { id, material }, i) => {
    const tau = c.segments[i]?.tau ?? null
    const share = tau === null || material.Fsu === null ? 0 : tau * c.toLimit / material.Fsu
    return share > (high?.share ?? 0) ? { share, place: `segment ${id}`, caseId: c.model.id } : high
  }, worst), null)
}
