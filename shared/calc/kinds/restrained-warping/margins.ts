/** Margins per wall, corner and case: shear, normal stress and both together at the same fibre (methods §7.3, §7.4). */
import { judgeMargins, marginSet, type JudgedMargins, type MarginMode, type MarginPlace, type MarginSet } from '#shared/calc/parts/margin-rows'
import { knockdownOf, lowestStrength, strengthUnit, type StrengthName } from '#shared/calc/parts/strength'
import type { MaterialModel } from '#shared/calc/parts/model'
import type { WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import type { Measure } from '#shared/torsion/warping/stress-peaks'

export interface StressMode extends MarginMode { measure: Measure, strength: StrengthName | null }
export const SHEAR: StressMode = { mode: 'shear-ultimate', label: 'Shear on the flats, ultimate', level: 'ultimate', dimension: 'stress', measure: 'tau', strength: 'Fsu' }
export const NORMAL: StressMode = { mode: 'normal-ultimate', label: 'Normal stress, ultimate', level: 'ultimate', dimension: 'stress', measure: 'sigma', strength: 'Ftu' }
export const COMBINED: StressMode = { mode: 'combined-ultimate', label: 'Normal stress and shear together, ultimate', level: 'ultimate', dimension: 'ratio', measure: 'circle', strength: null }
export const MISES: StressMode = { mode: 'equivalent-yield', label: 'Equivalent stress, yield', level: 'limit', dimension: 'stress', measure: 'mises', strength: 'Fty' }
export const CORNER_ULTIMATE: MarginMode = { mode: 'corner-ultimate', label: 'Shear at the corners, ultimate', level: 'ultimate', dimension: 'stress' }
export const CORNER_YIELD: MarginMode = { mode: 'corner-yield', label: 'Shear at the corners, yield', level: 'limit', dimension: 'stress' }
export const TWIST: MarginMode = { mode: 'twist', label: 'Twist', level: 'limit', dimension: 'angle' }
export const STRESS_MODES: readonly StressMode[] = [SHEAR, NORMAL, COMBINED, MISES]

type Unjudged = Omit<WarpingSolution, 'margins' | 'governing'>

export const warpingMargins = (s: Unjudged): JudgedMargins => judgeMargins([...STRESS_MODES.map(mode => stressSet(s, mode)), ...cornerSets(s), ...twistSet(s)])

/** From the level given to the level of the mode, with the special factor in force there. */
export const factorOf = ({ model: { factors } }: Pick<WarpingSolution, 'model'>, c: WarpingCase, level: MarginMode['level']): number =>
  level === 'ultimate' ? c.toUltimate * factors.special : c.toLimit * factors.specialAtLimit

/** Strength of some materials at the temperature of a case. */
const strengthAt = (materials: readonly MaterialModel[], name: StrengthName, c: WarpingCase): number | null =>
  lowestStrength(materials, name, m => knockdownOf(m, c.model.temperature?.value))

/** Both strengths of the circle rule fall alike with temperature: the rule is judged cold and divided by the factor, the lowest where materials meet. */
const warm = (materials: readonly MaterialModel[], c: WarpingCase): number => Math.min(...materials.map(m => knockdownOf(m, c.model.temperature?.value)))

function stressSet(s: Unjudged, mode: StressMode): MarginSet {
  const places = s.groups.map(({ id, wall, place, materials }): MarginPlace => ({
    where: id.replace(' ', '-'), place, unit: mode.strength === null ? '' : strengthUnit(materials), ...(wall === undefined ? {} : { wall }),
  }))
  return marginSet(mode, places, s.cases.map(c => c.model.id), (p, i) => {
    const [group, c] = [s.groups[p], s.cases[i]]
    const value = c?.stress[p]?.[mode.measure].value
    if (!group || !c || value === undefined) return null
    const applied = value * factorOf(s, c, mode.level)
    if (mode.strength === null) {
      const known = lowestStrength(group.materials, 'Ftu', () => 1) !== null && lowestStrength(group.materials, 'Fsu', () => 1) !== null
      return known ? { applied: applied / warm(group.materials, c), allowable: 1 } : null
    }
    const allowable = strengthAt(group.materials, mode.strength, c)
    return allowable === null ? null : { applied, allowable }
  })
}

function cornerSets(s: Unjudged): MarginSet[] {
  const places = s.corners.map(({ node, wall, place, materials }): MarginPlace => ({ where: `corner-${node}`, wall, place, unit: strengthUnit(materials) }))
  const set = (mode: MarginMode, name: StrengthName) => marginSet(mode, places, s.cases.map(c => c.model.id), (p, i) => {
    const [corner, c] = [s.corners[p], s.cases[i]]
    const allowable = corner && c ? strengthAt(corner.materials, name, c) : null
    return c && allowable !== null ? { applied: (c.corner[p] ?? 0) * factorOf(s, c, mode.level), allowable } : null
  })
  return [set(CORNER_ULTIMATE, 'Fsu'), set(CORNER_YIELD, 'Fsy')]
}

function twistSet(s: Unjudged): MarginSet[] {
  const allowed = s.model.twistAllowed
  if (allowed === null) return []
  return [marginSet(TWIST, [{ where: '', place: 'the bar', unit: allowed.unit }], s.cases.map(c => c.model.id), (_, i) => {
    const c = s.cases[i]
    return c ? { applied: Math.abs(c.peaks.phi.phi) * c.toLimit, allowable: allowed.value } : null
  })]
}
