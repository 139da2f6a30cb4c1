/** Guards on fatigue: no life is computed, the note says where it is treated (methods §7.6). */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { figure } from '#shared/calc/parts/say'

const FATIGUE_SHARE = 0.3
const FATIGUE_FACTOR = 1.5

/** A stress raiser with its factor; `place` as in a sentence, e.g. `node 3`. */
export interface Notch { place: string, factor: number }
/** Stress at limit over the ultimate shear strength at one place. */
export interface StressShare { share: number, place: string, wall?: string, caseId: string }

/** A declared repeated load, the worst notch, and the highest stress share above its limit (G-27). */
export function fatigueGuards({ repeated, notches, worst }: { repeated: boolean, notches: readonly Notch[], worst: StressShare | null }): Guard[] {
  const guards: Guard[] = []
  if (repeated) guards.push(fired('G-27', { of: 'repeated', values: { declared: 1 }, message: 'The load is declared repeated; no life is computed here.' }))
  const notch = notches.filter(n => n.factor > FATIGUE_FACTOR).sort((a, b) => b.factor - a.factor)[0]
  if (notch) guards.push(fired('G-27', { of: 'notch', values: { K: notch.factor }, message: `The corner factor at ${notch.place} is ${figure(notch.factor)}, above ${FATIGUE_FACTOR}.` }))
  if (worst && worst.share > FATIGUE_SHARE) {
    guards.push(fired('G-27', {
      of: 'stress', ...(worst.wall === undefined ? {} : { wall: worst.wall }), caseId: worst.caseId, values: { 'τ/Fsu': worst.share },
      message: `At limit load ${worst.place} reaches ${figure(worst.share)} of its ultimate shear strength in case ${worst.caseId}, above ${FATIGUE_SHARE}.`,
    }))
  }
  return guards
}
