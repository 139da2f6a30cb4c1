/** Whether a typed number is a result, at the precision at which it was typed. */
import type { Fact } from '#shared/note/loose/facts'
import type { NumberToken } from '#shared/note/loose/number-tokens'
import { fromEngine, intervalToEngine, toEngine, unitFits } from '#shared/units/units'
import type { UnitId } from '#shared/units/units'

/** Fewer digits than this name no result by themselves: 2 mm is anything from 1.5 to 2.5. */
const TELLING_DIGITS = 3
/** Unless they are as good as exact. */
const AS_GOOD_AS_EXACT = 0.005

/** Truncation towards −∞ in the last typed place; a hair absorbs binary writing. */
function truncatesTo(value: number, typed: number, place: number): boolean {
  const cut = Math.floor(value / place + 1e-7) * place
  return Math.abs((value < 0 && cut === 0 ? -place : cut) - typed) < place * 1e-6
}

/** Half a unit of the last place; zeros at the end of a whole number may be fill, beyond the first three digits. */
function tolerances(token: NumberToken): number[] {
  const fill = Math.min(token.trailingZeros, Math.max(0, token.digits.length - TELLING_DIGITS))
  return fill > 0 ? [token.place / 2, token.place * 10 ** fill / 2] : [token.place / 2]
}

/** Whether `typed ± tolerance`, a number in `unit`, is the value of the fact. */
export function isValue(typed: number, tolerance: number, fact: Fact, unit: UnitId): boolean {
  const value = fromEngine(fact.value, unit)
  if (typed < 0 && value > 0) return false
  const difference = Math.abs(typed) - Math.abs(value)
  // Ratios are shown rounded up.
  if (fact.dimension === 'ratio' && difference >= 0 && difference < 2 * tolerance) return true
  return Math.abs(difference) <= tolerance * (1 + 1e-9) + Math.abs(value) * 1e-12
}

/** Whether the token in that unit states the fact. */
export function agrees(token: NumberToken, fact: Fact, unit: UnitId): boolean {
  if (!unitFits(unit, fact.dimension)) return fact.truncated && unit === '' && truncatesTo(fact.value, token.value, token.place)
  const value = fromEngine(fact.value, unit)
  if (fact.truncated) {
    if (truncatesTo(value, token.value, token.place)) return true
    return token.value === 10 && value > 10
  }
  if (!tolerances(token).some(tolerance => isValue(token.value, tolerance, fact, unit))) return false
  const difference = Math.abs(Math.abs(token.value) - Math.abs(value))
  return token.digits.length >= TELLING_DIGITS || difference <= AS_GOOD_AS_EXACT * Math.abs(value)
}

/** Bounds in engine units of what the token may mean in that unit. */
export function engineRange(token: NumberToken, unit: UnitId): [number, number] {
  const middle = Math.abs(toEngine(token.value, unit))
  const spread = Math.abs(intervalToEngine(Math.max(...tolerances(token)) * 2, unit)) + middle * 1e-9
  return [Math.max(0, middle - spread), middle + spread]
}
