/** Every load case of a section with its torque, twist and stresses, and the margins of all of them. */
import type { CaseRow, Fault, MarginRow } from '#shared/calc/types'
import type { BarModel } from '#shared/calc/parts/bar-fields'
import type { CaseModel, MaterialModel } from '#shared/calc/parts/model'
import { judgeMargins, linearSet, marginSet, type JudgedMargins, type MarginMode, type MarginPlace, type MarginSet } from '#shared/calc/parts/margin-rows'
import { knockdownOf, levelsOf, lowestStrength, strengthUnit } from '#shared/calc/parts/strength'

/** Stress of a place per torque, MPa per N·mm. */
export interface StressPlace extends MarginPlace { materials: readonly MaterialModel[], perTorque: number }

export interface BarCase {
  model: CaseModel
  /** As given, at the level given. */
  torque: number
  rate: number
  twist: number | null
  toLimit: number
  toUltimate: number
  tauMax: number
  tauMaxPlace: string
}

export type SolvedBar = { ok: true, cases: BarCase[] } | { ok: false, faults: Fault[] }

/** Torque or rate of every case through the stiffness GJ of the section, N·mm². */
export function solveBar(bar: BarModel, GJ: number, places: readonly StressPlace[]): SolvedBar {
  const peak = places.reduce<StressPlace | null>((high, place) => (high === null || place.perTorque > high.perTorque ? place : high), null)
  const faults: Fault[] = []
  const cases = bar.cases.flatMap((model, i): BarCase[] => {
    const levels = levelsOf(bar.factors, model.level)
    const torque = model.rate ? model.rate.value * GJ : model.torque?.value ?? 0
    const rate = torque / GJ
    if (!levels.ok || !Number.isFinite(rate)) {
      faults.push({ path: `loading.cases.${i}`, message: levels.ok ? 'The rate of twist is not a finite number. Check the load and the section.' : levels.reason })
      return []
    }
    return [{
      model, torque, rate, twist: bar.length ? rate * bar.length.value : null, toLimit: levels.toLimit, toUltimate: levels.toUltimate,
      tauMax: (peak?.perTorque ?? 0) * Math.abs(torque), tauMaxPlace: peak?.wall ?? peak?.place ?? '',
    }]
  })
  return faults.length > 0 ? { ok: false, faults } : { ok: true, cases }
}

/** Margins of the bar's stresses and of its twist. */
export const SHEAR_ULTIMATE: MarginMode = { mode: 'shear-ultimate', label: 'Shear, ultimate', level: 'ultimate', dimension: 'stress' }
export const SHEAR_YIELD: MarginMode = { mode: 'shear-yield', label: 'Shear, yield', level: 'limit', dimension: 'stress' }
export const TWIST: MarginMode = { mode: 'twist', label: 'Twist', level: 'limit', dimension: 'angle' }

export function barMargins(bar: BarModel, cases: readonly BarCase[], places: readonly StressPlace[], more: readonly MarginSet[] = []): JudgedMargins {
  return judgeMargins([...stressSets(bar, cases, places, SHEAR_ULTIMATE, SHEAR_YIELD), ...more, ...twistSet(bar, cases)])
}

/** Ultimate and yield margins of some places, each with the strengths of its materials at the temperature of the case. */
export function stressSets(bar: BarModel, cases: readonly BarCase[], places: readonly StressPlace[], ultimate: MarginMode, yielding: MarginMode): MarginSet[] {
  const { factors } = bar
  const caseIds = cases.map(c => c.model.id)
  const shown = places.map((place): MarginPlace => ({ ...place, unit: strengthUnit(place.materials) }))
  const set = (mode: MarginMode, name: 'Fsu' | 'Fsy', factor: (c: BarCase) => number) => {
    const allowables = strengthsByMaterials(cases, name)
    return linearSet(mode, shown, caseIds, p => places[p]?.perTorque ?? 0, Float64Array.from(cases, c => Math.abs(c.torque) * factor(c)), p => allowables(places[p]?.materials ?? []))
  }
  return [set(ultimate, 'Fsu', c => c.toUltimate * factors.special), set(yielding, 'Fsy', c => c.toLimit * factors.specialAtLimit)]
}

/** The strength in every case, once for each set of materials; null where one of them has none. */
function strengthsByMaterials(cases: readonly BarCase[], name: 'Fsu' | 'Fsy'): (materials: readonly MaterialModel[]) => Float64Array | null {
  const known = new Map<string, Float64Array | null>()
  return (materials) => {
    const key = materials.map(m => m.id).join(' ')
    const held = known.get(key)
    if (held !== undefined) return held
    const found = lowestStrength(materials, name, () => 1) === null ? null : Float64Array.from(cases, c => lowestStrength(materials, name, m => knockdownOf(m, c.model.temperature?.value)) ?? Number.NaN)
    known.set(key, found)
    return found
  }
}

function twistSet(bar: BarModel, cases: readonly BarCase[]): MarginSet[] {
  const allowed = bar.twistAllowed
  if (allowed === null || bar.length === null) return []
  return [marginSet(TWIST, [{ where: '', place: 'the bar', unit: allowed.unit }], cases.map(c => c.model.id), (_, i) => {
    const c = cases[i]
    return c && c.twist !== null ? { applied: Math.abs(c.twist) * c.toLimit, allowable: allowed.value } : null
  })]
}

export function barCaseRows(cases: readonly BarCase[], margins: readonly MarginRow[]): CaseRow[] {
  const least = new Map<string, number>()
  for (const { caseId, ms } of margins) if (ms !== null) least.set(caseId, Math.min(least.get(caseId) ?? Infinity, ms))
  return cases.map(c => ({
    caseId: c.model.id, title: c.model.title, level: c.model.level, torque: c.torque, rate: c.rate, twist: c.twist,
    tauMax: c.tauMax, tauMaxWall: c.tauMaxPlace, tauCorner: null, leastMargin: least.get(c.model.id) ?? null,
  }))
}
