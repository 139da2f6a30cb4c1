/**
 * Factors on the load (methods reference §7.1): the factor of safety, and the
 * highest pertinent special factor, never the product of several (25.619).
 */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

/** 14 CFR / CS 25.303: limit to ultimate, unless otherwise specified. */
export const usualFactorOfSafety = 1.5
/** 14 CFR / CS 25.625: least fitting factor where strength is not proven by test. */
export const leastFittingFactor = 1.15

export type SpecialFactorName = 'fitting' | 'casting' | 'bearing'
export type SpecialFactors = Readonly<Partial<Record<SpecialFactorName, number>>>

export interface SpecialFactor {
  /** max(1, every factor declared) */
  readonly value: number
  readonly name: SpecialFactorName | null
  /** Declared above one and not applied, because another is higher (G-36). */
  readonly notApplied: readonly SpecialFactorName[]
}

/** The highest declared special factor; 1 where none is declared. */
export function specialFactor(factors: SpecialFactors): SpecialFactor {
  const names: SpecialFactorName[] = ['fitting', 'casting', 'bearing']
  const above = names.filter(name => (factors[name] ?? 1) > 1)
  const highest = above.reduce<SpecialFactorName | null>((best, name) => (best === null || (factors[name] ?? 1) > (factors[best] ?? 1) ? name : best), null)
  return { value: highest === null ? 1 : factors[highest] ?? 1, name: highest, notApplied: above.filter(name => name !== highest) }
}

export interface LevelFactors {
  /** f_FS, ≥ 1 */
  readonly safety: number
  /** f_sp, from `specialFactor` */
  readonly special: number
  /** Whether the special factor acts at limit level too (the usual, safe reading for fittings). */
  readonly specialAtLimit: boolean
}

/** What one action (torque, stress or rate of twist) becomes at each level; null where the level does not exist for the case. */
export interface FactoredAction {
  readonly ok: true
  readonly limit: number | null
  readonly ultimate: number
  /** What the given value was multiplied by. */
  readonly limitFactor: number | null
  readonly ultimateFactor: number
}

/**
 * The factored action. A case prescribed at ultimate gets no further factor of
 * safety, only the special one; it has a limit level only where the author has
 * confirmed that the ultimate value is a limit value times the factor (§8).
 * Valid while the response is linear in the load.
 */
export function factorAction(given: number, level: 'limit' | 'ultimate', factors: LevelFactors, limitConfirmed = false): FactoredAction | Refusal {
  const { safety, special, specialAtLimit } = factors
  if (!Number.isFinite(given)) return refusal('The load is not a finite number.')
  if (!(safety >= 1 && Number.isFinite(safety))) return refusal('The factor of safety must be at least 1.')
  if (!(special >= 1 && Number.isFinite(special))) return refusal('A special factor must be at least 1.')
  const atLimit = specialAtLimit ? special : 1
  const ultimateFactor = level === 'limit' ? safety * special : special
  const limitFactor = level === 'limit' ? atLimit : limitConfirmed ? atLimit / safety : null
  const [limit, ultimate] = [limitFactor === null ? null : given * limitFactor, given * ultimateFactor]
  if (!Number.isFinite(ultimateFactor) || !Number.isFinite(ultimate) || !Number.isFinite(limit ?? 0)) return refusal('The load times its factors is too large to compute with. Check the load, its unit and the factors.')
  return { ok: true, limit, ultimate, limitFactor, ultimateFactor }
}
