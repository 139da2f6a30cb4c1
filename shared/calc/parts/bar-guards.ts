/** Guards that every section kind raises on its materials, factors, stresses, twist and margins. */
import type { Guard, MarginRow } from '#shared/calc/types'
import { declaredGuards } from '#shared/calc/guards/declared'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards, type Notch, type StressShare } from '#shared/calc/guards/fatigue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { totalTwistGuards } from '#shared/calc/guards/rotation'
import type { BarCase, StressPlace } from '#shared/calc/parts/bar-cases'
import type { BarModel } from '#shared/calc/parts/bar-fields'
import type { Refused, Unusual } from '#shared/calc/parts/model'

export interface BarState { bar: BarModel, cases: readonly BarCase[], places: readonly StressPlace[], margins: readonly MarginRow[], notches: readonly Notch[], refused: readonly Refused[], unusual: readonly Unusual[] }

export function barGuards({ bar, cases, places, margins, notches, refused, unusual }: BarState): Guard[] {
  const used = bar.materials.filter(m => places.some(place => place.materials.includes(m)))
  return [
    ...refusedGuards(refused), ...unusualGuards(unusual), ...declaredGuards(bar.declarations),
    ...materialGuards({ materials: used, cases: bar.cases, partial: bar.factors.partial }),
    ...factorGuards(bar.factors, bar.declarations.fitting),
    ...yieldGuards(margins, ['shear-yield', 'corner-yield']),
    ...fatigueGuards({ repeated: bar.declarations.repeated, notches, worst: worstShare(cases, places) }),
    ...totalTwistGuards(cases.map(c => ({ caseId: c.model.id, twist: (c.twist ?? 0) * c.toLimit }))), ...marginGuards(margins),
  ]
}

/** The place that comes nearest to its ultimate shear strength at limit load. */
function worstShare(cases: readonly BarCase[], places: readonly StressPlace[]): StressShare | null {
  const nearest = places.reduce<{ share: number, place: StressPlace } | null>((high, place) => {
    const weakest = place.materials.reduce<number | null>((low, m) => (m.Fsu === null ? low : Math.min(low ?? Infinity, m.Fsu)), null)
    const share = weakest === null ? 0 : place.perTorque / weakest
    return share > (high?.share ?? 0) ? { share, place } : high
  }, null)
  const heaviest = cases.reduce<BarCase | null>((high, c) => (high === null || Math.abs(c.torque) * c.toLimit > Math.abs(high.torque) * high.toLimit ? c : high), null)
  if (!nearest || !heaviest) return null
  const { place, share } = nearest
  return { share: share * Math.abs(heaviest.torque) * heaviest.toLimit, place: place.place, ...(place.wall === undefined ? {} : { wall: place.wall }), caseId: heaviest.model.id }
}
