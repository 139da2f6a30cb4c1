/**
 * Constants of the solids that are no closed forms: sums of series, and values computed with stated
 * convergence, in one place, so that each can be compared with its source and disturbed by a test.
 */

/** Right isosceles triangle on the leg a: J/a⁴ is the sum of the exact double series (methods §1.5). */
export const isoscelesJ = 0.0260896517
/** Its peak τ/(Gθ′a) at the middle of the hypotenuse: boundary elements, observed order 1.98. */
export const isoscelesPeak = 0.459174
/** Handbook value of τ·a³/T for it, rounded, from memory: 2.4 % higher, that is on the safe side. */
export const isoscelesHandbook = 18.02
/** Sand heap of the right isosceles triangle: T_p/(τ_y a³). */
export const isoscelesPlastic = 0.0976311

export interface PolygonConstants { readonly sides: number, readonly J: number, readonly peak: number }
/** J/d⁴ and τ_max/(Gθ′d) on d = twice the apothem: collocation with corner functions, residual 1e-13 (methods §1.8). */
export const polygons = {
  pentagon: { sides: 5, J: 0.12324827713, peak: 0.636963983793 },
  hexagon: { sides: 6, J: 0.11505099440459, peak: 0.613038471314 },
  octagon: { sides: 8, J: 0.10749933516512, peak: 0.584313746706 },
} as const satisfies Record<string, PolygonConstants>

/** Circle with one flat, s = depth / R: [s, J/R⁴, τ_max/(Gθ′R)], boundary elements, order 2.00 (methods §1.7). */
export const segmentTable: readonly (readonly [number, number, number])[] = [
  [0.05, 1.5475088, 1.154953], [0.1, 1.5041841, 1.190542], [0.2, 1.3850684, 1.210258], [0.3, 1.2415368, 1.199877], [0.4, 1.0872959, 1.173101],
  [0.5, 0.9314565, 1.135308], [0.6, 0.7804741, 1.089284], [0.8, 0.5100863, 0.978619],
]
/** Fits to those values in powers of √s: J/R⁴ = π/2 + Σ c·s^p within 0.05 %, τ_max/(Gθ′R) = 1 + Σ c·s^p within 0.02 %. */
export const segmentFitJ: readonly (readonly [number, number])[] = [[-1.6384, 1.5], [-2.6904, 2], [4.4522, 2.5], [-1.3965, 3]]
export const segmentFitPeak: readonly (readonly [number, number])[] = [[0.9022, 0.5], [-0.9076, 1], [-0.1196, 1.5], [-0.0262, 2]]

/** Torsion table of Young & Budynas, from memory: J = a b³ [1/3 − c₁ (b/a)(1 − (b/a)⁴/c₂)] on full sides a ≥ b. */
export const rectangleHandbookJ = { c1: 0.21, c2: 12 }
/** The same table: τ_max = 3T/(a b²)·[1 + Σ c·(b/a)^p]. */
export const rectangleHandbookPeak = [0.6095, 0.8865, -1.8023, 0.91] as const
