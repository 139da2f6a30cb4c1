/** Circular sector and semicircle: exact series in a form without singular angles, and a closed form (methods §1.6). */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'
import { solidTorsion, type ShearPlace, type SolidTorsion } from '#shared/torsion/solids/solid'

/** Number of odd terms that are summed; the rest is added as an integral. */
const TERMS = 2000

/** J/R⁴ of a sector of the included angle α, rad. Terms fall as n⁻⁴. */
export function sectorConstant(alpha: number): number {
  let sum = 0
  for (let n = 2 * TERMS - 1; n >= 1; n -= 2) sum += 1 / (n ** 2 * (n * Math.PI / alpha + 2) ** 2)
  // The odd terms beyond N are half of the integral of (α/π)² n⁻⁴ from N.
  const tail = (alpha / Math.PI) ** 2 / (6 * (2 * TERMS) ** 3)
  return 8 * alpha / Math.PI ** 2 * (sum + tail)
}

/**
 * τ/(Gθ′R) in the middle of the arc. The alternating terms fall as n⁻²; the mean of two neighbouring
 * partial sums takes out most of what is left.
 */
export function sectorArcShear(alpha: number): number {
  let [sum, before] = [0, 0]
  for (let i = 0; i <= TERMS; i += 1) {
    const n = 2 * i + 1
    before = sum
    sum += (i % 2 === 0 ? 1 : -1) / (n * (n * Math.PI / alpha + 2))
  }
  return 8 / Math.PI * (sum + before) / 2
}

/** τ/(Gθ′R) on the straight edges at ρ = r/R, 0 < ρ < 1. */
export function sectorEdgeShear(alpha: number, rho: number): number {
  let sum = 0
  for (let i = 0; i < TERMS; i += 1) {
    const lambda = (2 * i + 1) * Math.PI / alpha
    // At λ = 2 both parts of the quotient vanish; what remains is its limit.
    sum += Math.abs(lambda - 2) < 1e-7 ? -rho * Math.log(rho) / 4 : (rho - rho ** (lambda - 1)) / (lambda ** 2 - 4)
  }
  // Beyond, ρ^(λ−1) is nothing and the odd terms sum to half of the integral of ρ (α/π)² n⁻².
  return 8 / alpha * (sum + rho * (alpha / Math.PI) ** 2 / (4 * TERMS))
}

/** The half circle has its peak at the apex itself, where the search ends a little beside it. */
const NEAR_APEX = 1e-5

const GOLDEN = (Math.sqrt(5) - 1) / 2

/** The largest edge shear and where it is, by golden section: the edge shear has one maximum. */
export function sectorEdgePeak(alpha: number): { rho: number, shear: number } {
  let [low, high] = [1e-9, 1 - 1e-9]
  let [inner, outer] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)]
  let [atInner, atOuter] = [sectorEdgeShear(alpha, inner), sectorEdgeShear(alpha, outer)]
  while (high - low > 1e-7) {
    if (atInner > atOuter) {
      high = outer;
      [outer, atOuter] = [inner, atInner]
      inner = high - GOLDEN * (high - low)
      atInner = sectorEdgeShear(alpha, inner)
    } else {
      low = inner;
      [inner, atInner] = [outer, atOuter]
      outer = low + GOLDEN * (high - low)
      atOuter = sectorEdgeShear(alpha, outer)
    }
  }
  return { rho: (low + high) / 2, shear: Math.max(atInner, atOuter) }
}

/** @param alpha included angle, 0 < α ≤ 2π; apex at the origin, symmetric about +x. */
export function torsionOfSector(R: number, alpha: number): SolidTorsion | Refusal {
  if (!(alpha <= 2 * Math.PI * (1 + 1e-12))) return refusal('The included angle must be at most 360°.')
  const arc: ShearPlace = { perRate: sectorArcShear(alpha) * R, place: 'the middle of the arc', at: { x: R, y: 0 } }
  const common = { A: alpha / 2 * R ** 2, J: sectorConstant(alpha) * R ** 4, method: '§1.6' }
  if (alpha > Math.PI * (1 + 1e-9)) {
    return solidTorsion({ ...common, peak: arc, unbounded: 'The apex is re-entrant: its stress is unbounded in linear elasticity. The peak given is that of the arc; a finite value at the apex needs its real radius and the general outline.' })
  }
  const { rho, shear } = sectorEdgePeak(alpha)
  const edge: ShearPlace = { perRate: shear * R, place: rho < NEAR_APEX ? 'the apex' : `the straight edges at r = ${(rho * R).toPrecision(4)} mm`, at: { x: rho * R * Math.cos(alpha / 2), y: rho * R * Math.sin(alpha / 2) } }
  const [peak, other] = edge.perRate >= arc.perRate ? [edge, arc] : [arc, edge]
  return solidTorsion({ ...common, peak, secondary: [other] })
}

/** Closed form; the diameter lies on x, its middle at the origin. */
export function torsionOfSemicircle(R: number): SolidTorsion {
  return solidTorsion({
    A: Math.PI / 2 * R ** 2, J: (Math.PI / 2 - 4 / Math.PI) * R ** 4, method: '§1.6',
    peak: { perRate: 8 / (3 * Math.PI) * R, place: 'the middle of the diameter', at: { x: 0, y: 0 } },
    secondary: [{ perRate: sectorArcShear(Math.PI) * R, place: 'the middle of the arc', at: { x: 0, y: R } }],
  })
}
