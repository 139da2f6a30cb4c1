/** Guards on rotation: large total twist and the large-twist (Wagner) ratio. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { degrees, figure } from '#shared/calc/parts/say'

/** Degrees over the whole length at limit (common practice). */
const TWIST_CAUTION = 10
const TWIST_STOP = 20
/** Typed angles are compared a hair above, so that 20° is not above 20°. */
const HAIR = 1e-12
const WAGNER_CAUTION = 0.02
const WAGNER_STOP = 0.1

/** Total twist of a case at limit load, rad. */
export interface CaseTwist { caseId: string, twist: number }

/** One guard for the calculation, naming the case that twists the bar most (G-29). */
export function totalTwistGuards(cases: readonly CaseTwist[]): Guard[] {
  const worst = cases.reduce<CaseTwist | undefined>((high, next) => high && Math.abs(high.twist) >= Math.abs(next.twist) ? high : next, undefined)
  if (!worst) return []
  const twist = degrees(Math.abs(worst.twist))
  if (twist <= TWIST_CAUTION * (1 + HAIR)) return []
  const stop = twist > TWIST_STOP * (1 + HAIR)
  return [fired('G-29', {
    caseId: worst.caseId, severity: stop ? 'stop' : 'caution', deviable: stop, values: { 'twist, °': twist },
    message: `At limit load case ${worst.caseId} twists the bar by ${figure(twist)}°, more than ${stop ? TWIST_STOP : TWIST_CAUTION}°.`,
  })]
}

/** The large-twist effect of one case at one level: torque in N·mm with the cubic term, longitudinal stress in MPa. */
export interface CaseWagner { caseId: string, level: 'limit' | 'ultimate', ratio: number, torque: number, stress: number | null }

/** One guard for the calculation, naming the worst case and level: what is written for it covers the milder ones (G-28). */
export function wagnerGuards(states: readonly CaseWagner[]): Guard[] {
  const worst = states.reduce<CaseWagner | undefined>((high, next) => next.ratio > (high?.ratio ?? WAGNER_CAUTION) ? next : high, undefined)
  if (!worst) return []
  const stop = worst.ratio > WAGNER_STOP
  const stress = worst.stress === null ? '' : `, with a longitudinal stress of ${figure(worst.stress)} MPa`
  return [fired('G-28', {
    caseId: worst.caseId, severity: stop ? 'stop' : 'caution', values: { ratio: worst.ratio },
    message: `At ${worst.level} load case ${worst.caseId} has a Wagner ratio of ${figure(worst.ratio)}, above ${stop ? WAGNER_STOP : WAGNER_CAUTION}: at this rate of twist the section carries ${figure(worst.torque)} N·mm${stress}.`,
  })]
}
