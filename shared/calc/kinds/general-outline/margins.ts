/** Margins of safety per case and mode (methods §7). Where the peak shear is unbounded there is no stress margin at all. */
import type { CaseSolution, Solution } from '#shared/calc/kinds/general-outline/solution'
import { judgeMargins, marginSet, type JudgedMargins, type MarginMode, type MarginSet } from '#shared/calc/parts/margin-rows'

type Unjudged = Omit<Solution, 'margins' | 'governing'>
export type Mode = 'shear-ultimate' | 'shear-yield' | 'twist'

const MODES: Record<Mode, MarginMode> = {
  'shear-ultimate': { mode: 'shear-ultimate', label: 'Peak shear, ultimate', level: 'ultimate', dimension: 'stress' },
  'shear-yield': { mode: 'shear-yield', label: 'Peak shear, yield', level: 'limit', dimension: 'stress' },
  'twist': { mode: 'twist', label: 'Twist', level: 'limit', dimension: 'angle' },
}

export function judgedMargins(s: Unjudged): JudgedMargins {
  const { material, factors, twistAllowed } = s.model
  const caseIds = s.cases.map(c => c.model.id)
  const peak = { where: '', place: s.peaks?.first.edge ?? '', unit: material.units.strength }
  const stress = (mode: MarginMode, strength: number | null, factor: (c: CaseSolution) => number): MarginSet[] =>
    s.peaks === null ? [] : [marginSet(mode, [peak], caseIds, (_, i) => {
      const c = s.cases[i]
      return c && c.tau !== null && strength !== null ? { applied: c.tau * factor(c), allowable: strength * c.knockdown } : null
    })]
  const twist = twistAllowed === null ? [] : [marginSet(MODES.twist, [{ where: '', place: 'the bar', unit: twistAllowed.unit }], caseIds, (_, i) => {
    const c = s.cases[i]
    return c && c.twist !== null ? { applied: Math.abs(c.twist) * c.toLimit, allowable: twistAllowed.value } : null
  })]
  return judgeMargins([
    ...stress(MODES['shear-ultimate'], material.Fsu, c => c.toUltimate * factors.special),
    ...stress(MODES['shear-yield'], material.Fsy, c => c.toLimit * factors.specialAtLimit), ...twist,
  ])
}
