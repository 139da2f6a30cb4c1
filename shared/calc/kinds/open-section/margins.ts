/**
 * Margins of safety per wall × case × mode, each with its own level, factors and allowable (methods §7).
 * Governing is the least reserve factor; whatever lies within 0.5 % of it is listed beside it.
 */
import type { MaterialModel } from '#shared/calc/parts/model'
import { judgeMargins, linearSet, marginSet, type JudgedMargins, type MarginMode, type MarginPlace, type MarginSet } from '#shared/calc/parts/margin-rows'
import { lowestStrength, strengthUnit, type StrengthName } from '#shared/calc/parts/strength'
import type { CaseSolution, Solution } from '#shared/calc/kinds/open-section/solution'

type Unjudged = Omit<Solution, 'margins' | 'governing' | 'detailed'>
export type Mode = 'shear-ultimate' | 'shear-yield' | 'corner-ultimate' | 'corner-yield' | 'twist'

export const MODES: Record<Mode, MarginMode> = {
  'shear-ultimate': { mode: 'shear-ultimate', label: 'Shear on the flats, ultimate', level: 'ultimate', dimension: 'stress' },
  'shear-yield': { mode: 'shear-yield', label: 'Shear on the flats, yield', level: 'limit', dimension: 'stress' },
  'corner-ultimate': { mode: 'corner-ultimate', label: 'Shear at the corners, ultimate', level: 'ultimate', dimension: 'stress' },
  'corner-yield': { mode: 'corner-yield', label: 'Shear at the corners, yield', level: 'limit', dimension: 'stress' },
  'twist': { mode: 'twist', label: 'Twist', level: 'limit', dimension: 'angle' },
}

export function marginRows(s: Unjudged): JudgedMargins {
  return judgeMargins([...flatSets(s), ...cornerSets(s), ...twistSets(s)])
}

interface StressPlace extends MarginPlace { materials: readonly MaterialModel[], perRate: number }

function flatSets(s: Unjudged): MarginSet[] {
  const places = s.walls.map(({ wall }): StressPlace => ({
    where: wall.id, wall: wall.id, place: wall.name.trim() === '' ? `wall ${wall.id}` : `wall ${wall.id} (${wall.name.trim()})`,
    unit: strengthUnit([wall.material]), materials: [wall.material], perRate: s.perRate.face.get(wall.id) ?? 0,
  }))
  return stressSets(s, places, MODES['shear-ultimate'], MODES['shear-yield'])
}

/** Where walls of two materials meet, the lower strength counts. */
function cornerSets(s: Unjudged): MarginSet[] {
  const places = s.corners.flatMap((corner): StressPlace[] => {
    const perRate = s.perRate.corner.get(corner.node)
    const materials = corner.walls.map(w => w.material)
    return perRate === undefined ? [] : [{ where: corner.node, wall: corner.worst.id, place: `corner ${corner.node}`, unit: strengthUnit(materials), materials, perRate }]
  })
  return stressSets(s, places, MODES['corner-ultimate'], MODES['corner-yield'])
}

function stressSets(s: Unjudged, places: StressPlace[], ultimate: MarginMode, yielding: MarginMode): MarginSet[] {
  const { factors } = s.model
  const caseIds = s.cases.map(c => c.model.id)
  const set = (mode: MarginMode, name: 'Fsu' | 'Fsy', factor: (c: CaseSolution) => number) => {
    const allowables = allowablesByMaterials(s.cases, name)
    return linearSet(mode, places, caseIds, p => places[p]?.perRate ?? 0, Float64Array.from(s.cases, c => Math.abs(c.rate) * factor(c)), p => allowables(places[p]?.materials ?? []))
  }
  return [set(ultimate, 'Fsu', c => c.toUltimate * factors.special), set(yielding, 'Fsy', c => c.toLimit * factors.specialAtLimit)]
}

/** The strength in every case, once for each set of materials. */
function allowablesByMaterials(cases: readonly CaseSolution[], name: StrengthName): (materials: readonly MaterialModel[]) => Float64Array | null {
  const known = new Map<string, Float64Array | null>()
  return (materials) => {
    const key = materials.map(m => m.id).join(' ')
    const held = known.get(key)
    if (held !== undefined) return held
    const found = lowestStrength(materials, name, () => 1) === null ? null : Float64Array.from(cases, c => lowestStrength(materials, name, m => c.knockdown.get(m.id) ?? 1) ?? Number.NaN)
    known.set(key, found)
    return found
  }
}

function twistSets(s: Unjudged): MarginSet[] {
  const allowed = s.model.twistAllowed
  if (allowed === null) return []
  return [marginSet(MODES.twist, [{ where: '', place: 'the bar', unit: allowed.unit }], s.cases.map(c => c.model.id), (_, i) => {
    const c = s.cases[i]
    return c && c.twist !== null ? { applied: Math.abs(c.twist) * c.toLimit, allowable: allowed.value } : null
  })]
}
