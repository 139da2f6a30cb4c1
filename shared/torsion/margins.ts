/**
 * Reserve factor and margin of safety, and which of many governs
 * (methods reference §7.3, §8). Margins keep full precision here.
 */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

export type Reserve
  = | { readonly ok: true, readonly loaded: true, readonly rf: number, readonly ms: number }
    /** Nothing is applied: the margin is high, and no infinity is written. */
    | { readonly ok: true, readonly loaded: false, readonly rf: null, readonly ms: null }
    | Refusal

/** RF = allowable / |applied| unchecked; Infinity where nothing is applied. For loops over many margins. */
export const bareReserve = (allowable: number, applied: number): number => allowable / Math.abs(applied)

/** RF = allowable / |applied|, MS = RF − 1; both in the same unit, allowable > 0. */
export function reserveFactor(allowable: number, applied: number): Reserve {
  if (!Number.isFinite(applied)) return refusal('The applied value is not a finite number.')
  if (!Number.isFinite(allowable) || allowable <= 0) return refusal('The allowable must be greater than zero.')
  if (applied === 0) return { ok: true, loaded: false, rf: null, ms: null }
  const rf = bareReserve(allowable, applied)
  if (!Number.isFinite(rf)) return { ok: true, loaded: false, rf: null, ms: null }
  return { ok: true, loaded: true, rf, ms: rf - 1 }
}

/** A margin of zero passes; the decision reads the full value, never the shown one. */
export const passes = (ms: number | null): boolean => ms === null || ms >= 0

/** Rows whose reserve factor lies within this of the least are listed beside it (§8). */
export const tieWithin = 0.005

/**
 * Indices of the least margin and of all that tie with it, the least first.
 * The half per cent is of the reserve factor, since half a per cent of a margin
 * near zero is nothing. Rows without load never govern.
 */
export function governingRows(margins: readonly (number | null)[]): number[] {
  const loaded = margins.flatMap((ms, index) => (ms === null ? [] : [{ index, rf: 1 + ms }]))
  const least = loaded.reduce((found, { rf }) => Math.min(found, rf), Infinity)
  return loaded
    .filter(({ rf }) => rf <= least * (1 + tieWithin))
    .sort((a, b) => a.rf - b.rf || a.index - b.index)
    .map(({ index }) => index)
}

export interface CaseValue { readonly caseId: string, readonly value: number }
export interface Envelope { readonly max: CaseValue, readonly min: CaseValue }

/** Largest and smallest signed value with their cases, the first named where equal; null for no case (§8). */
export function envelope(values: readonly CaseValue[]): Envelope | null {
  const [first, ...rest] = values
  if (!first) return null
  return rest.reduce<Envelope>(({ max, min }, one) => ({
    max: one.value > max.value ? one : max,
    min: one.value < min.value ? one : min,
  }), { max: first, min: first })
}
