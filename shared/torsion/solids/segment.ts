/** Circle with one flat (D-shaft): computed values, interpolated on top of their fit (methods §1.7). */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'
import { segmentFitJ, segmentFitPeak, segmentTable } from '#shared/torsion/solids/published'
import { solidTorsion, type SolidTorsion } from '#shared/torsion/solids/solid'

type Fit = readonly (readonly [number, number])[]
const powers = (fit: Fit, s: number): number => fit.reduce((sum, [c, p]) => sum + c * s ** p, 0)

/** Exact at both ends: the full circle, and the semicircle of §1.6. */
const ends = { J: [Math.PI / 2, Math.PI / 2 - 4 / Math.PI], peak: [1, 8 / (3 * Math.PI)] } as const

/** The fit is smooth and near; what it leaves at the computed points is added, linear between them. */
function corrected(fit: Fit, start: number, values: readonly (readonly [number, number])[], s: number): number {
  const rest = values.map(([x, y]) => [x, y - start - powers(fit, x)] as const)
  const above = rest.findIndex(([x]) => x >= s)
  const [upper, lower] = [rest[above], rest[above - 1]]
  const left = !upper ? 0 : !lower || upper[0] === s ? upper[1] : lower[1] + (upper[1] - lower[1]) * (s - lower[0]) / (upper[0] - lower[0])
  return start + powers(fit, s) + left
}

/** J/R⁴ at s = depth/R, 0 ≤ s ≤ 1. */
export const segmentConstant = (s: number): number =>
  corrected(segmentFitJ, ends.J[0], [[0, ends.J[0]], ...segmentTable.map(([x, J]) => [x, J] as const), [1, ends.J[1]]], s)

/** τ_max/(Gθ′R) at the middle of the flat, at s = depth/R, 0 < s ≤ 1. */
export const segmentPeak = (s: number): number =>
  corrected(segmentFitPeak, ends.peak[0], [[0, ends.peak[0]], ...segmentTable.map(([x, , peak]) => [x, peak] as const), [1, ends.peak[1]]], s)

/** @param R mm  @param depth taken off by the flat, mm, 0 ≤ depth ≤ R; centre of the circle at the origin, flat at the top. */
export function torsionOfSegment(R: number, depth: number): SolidTorsion | Refusal {
  if (depth > R) return refusal('The flat must not lie beyond the centre of the circle. Use the general outline for a smaller segment.')
  const s = depth / R
  const half = Math.acos(1 - s)
  return solidTorsion({
    A: R ** 2 * (Math.PI - half + Math.sin(half) * Math.cos(half)), J: segmentConstant(s) * R ** 4, method: '§1.7',
    peak: s === 0
      ? { perRate: R, place: 'the whole outer surface', at: { x: R, y: 0 } }
      : { perRate: segmentPeak(s) * R, place: 'the middle of the flat', at: { x: 0, y: R - depth } },
  })
}
