/** Peak stress on the inner face of a curved wall over the stress G·θ′·t on a flat one (methods reference §1.10). */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

/**
 * Exact for a long circular strip of inside radius `inside` and thickness t;
 * high, hence safe, for a bend of limited angle.
 */
export function bendFactor(inside: number, t: number): number | null {
  if (!(inside > 0 && t > 0)) return null
  const x = t / inside
  // (1 + x/2)/ln(1 + x) − 1, over x; by its series where the logarithm would cancel.
  const K = x < 1e-4 ? 1 + x / 6 - x * x / 12 : ((x + x * x / 2) / Math.log1p(x) - 1) / x
  return Number.isFinite(K) ? K : null
}

export type StripFactor = { readonly ok: true, readonly K: number } | Refusal

/** The same factor on the inner face of an arc wall, by its mid-line radius. */
export function stripFactor({ radius, t }: { readonly radius: number, readonly t: number }): StripFactor {
  const K = bendFactor(radius - t / 2, t)
  return K === null ? refusal('The mid-line radius of the arc must be more than half its thickness.') : { ok: true, K }
}
