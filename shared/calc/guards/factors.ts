/** Guards on the factors in force. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import type { FactorModel } from '#shared/calc/parts/model'
import { below, figure } from '#shared/calc/parts/say'
import { leastFittingFactor, usualFactorOfSafety } from '#shared/torsion/factors'

/** Factors below the usual (G-35) and two special factors at once (G-36). `fitting`: the part is declared one. */
export function factorGuards(factors: FactorModel, fitting: boolean): Guard[] {
  const guards: Guard[] = []
  if (factors.partial) {
    if (factors.reason === '') {
      guards.push(fired('G-35', {
        of: 'partial', values: { 'factor of safety': factors.ultimate }, title: 'Partial factors without their paragraph',
        message: `The basis is declared to work with partial factors (${figure(factors.ultimate)} on loads), and its paragraph is not quoted.`,
      }))
    }
  } else {
    if (below(factors.ultimate, usualFactorOfSafety)) guards.push(fired('G-35', { of: 'safety', values: { 'factor of safety': factors.ultimate }, message: `The factor of safety is ${figure(factors.ultimate)}, below ${usualFactorOfSafety}.` }))
    if (fitting && below(factors.special, leastFittingFactor)) guards.push(fired('G-35', { of: 'fitting', values: { 'special factor': factors.special }, message: `The part is declared a fitting and the special factor in force is ${figure(factors.special)}, below ${leastFittingFactor}.` }))
  }
  const applied = factors.specials.filter(f => f.value > 1)
  if (applied.length > 1) {
    guards.push(fired('G-36', {
      values: Object.fromEntries(applied.map(f => [f.name, f.value])),
      message: `Two or more special factors are given (${applied.map(f => `${f.name} ${figure(f.value)}`).join(', ')}); the highest, ${figure(factors.special)}, is used.`,
    }))
  }
  return guards
}
