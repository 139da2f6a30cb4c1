/** The junction formula of El Darwish & Johnston 1965 (methods reference §1.10), bare: no range is judged here. mm, mm⁴. */
import type { BulgeCoefficients } from '#shared/torsion/published'
import { bulgeL, bulgeT } from '#shared/torsion/published'

function alphaOf({ c0, c1, c2, c3, c4 }: BulgeCoefficients, t1: number, t2: number, r: number): number {
  return c0 + c1 * t2 / t1 + c2 * r / t1 + c3 * t2 * r / (t1 * t1) + c4 * t2 * t2 / (t1 * t1)
}

/** Bulge factor and inscribed circle of an L: through wall t₁, abutting wall t₂ ≤ t₁, inside fillet r. */
export function bulgeOfL(t1: number, t2: number, r: number): { alpha: number, D: number, J: number } {
  const D = 2 * (3 * r + t1 + t2 - Math.sqrt(2 * (2 * r + t1) * (2 * r + t2)))
  const alpha = alphaOf(bulgeL, t1, t2, r)
  return { alpha, D, J: alpha * D ** 4 }
}

/** Bulge factor and inscribed circle of a T: flange t₁, stem t₂, fillets r on both sides. */
export function bulgeOfT(t1: number, t2: number, r: number): { alpha: number, D: number, J: number } {
  const D = ((t1 + r) ** 2 + t2 * (r + t2 / 4)) / (2 * r + t1)
  const alpha = alphaOf(bulgeT, t1, t2, r)
  return { alpha, D, J: alpha * D ** 4 }
}
