/** Peak stress at an inside corner of a closed cell over the mean stress q/t at the same torque (methods §2.3). */
import { finiteOrRefused } from '#shared/torsion/finite'
import { closedMachinedTable } from '#shared/torsion/cells/published'
import { refusal, type Refusal } from '#shared/torsion/section'

export interface CellCorner { readonly ok: true, readonly K: number, readonly source: string }

/** Bent sheet, concentric: exact for a long arc, 10 to 25 % high (safe) on a square tube. ri, t in mm, > 0. */
export const closedBendFactor = (ri: number, t: number): number => (t / ri) / Math.log1p(t / ri)

/**
 * The factor already holds the variation through the thickness: it is not multiplied by 1 + χ.
 * Machined fillets are tabulated for r/t from 0.125 to 1; between the values of that convex table
 * the chord is on the safe side.
 */
export function cellCornerFactor(radius: number, t: number, make: 'machined' | 'bent'): CellCorner | Refusal {
  if (!(Number.isFinite(radius) && radius > 0)) return refusal('A sharp inside corner has no finite stress. Give the inside radius of the drawing.')
  if (!(Number.isFinite(t) && t > 0)) return refusal('The thickness must be greater than zero.')
  if (make === 'bent') return finiteOrRefused({ ok: true as const, K: closedBendFactor(radius, t), source: 'closed form of a long concentric bend' })
  const x = radius / t
  const above = closedMachinedTable.findIndex(([at]) => at >= x * (1 - 1e-12))
  const [upper, lower] = [closedMachinedTable[above], closedMachinedTable[above - 1]]
  if (upper && Math.abs(upper[0] - x) <= 1e-12 * x) return { ok: true, K: upper[1], source: 'table of machined corners in a closed cell' }
  if (!upper || !lower) return refusal(`The table of machined corners in a closed cell covers r/t from 0.125 to 1; here it is ${x.toPrecision(3)}. Use the general outline.`)
  return { ok: true, K: lower[1] + (upper[1] - lower[1]) * (x - lower[0]) / (upper[0] - lower[0]), source: 'table of machined corners in a closed cell' }
}
