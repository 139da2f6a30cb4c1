/**
 * Margins under combined stress: always the multiplier of the load that just reaches the criterion, never one
 * less a sum (methods §7.4). Ratios R = applied / allowable, ≥ 0.
 */
import { refusal, type Refusal } from '#shared/torsion/section'
import type { Reserve } from '#shared/torsion/margins'

/** Equivalent stress of von Mises, MPa. */
export const vonMises = (sigma: number, tau: number): number => Math.sqrt(sigma ** 2 + 3 * tau ** 2)

/** σ and τ of components that act at the same fibre, station and case: normal stresses with their signs, shear at the worse face. */
export function atOneFibre(normal: readonly number[], shear: { readonly sv: number, readonly omega: number, readonly direct: number }): { sigma: number, tau: number } {
  return { sigma: normal.reduce((sum, one) => sum + one, 0), tau: Math.abs(shear.sv) + Math.abs(shear.omega) + Math.abs(shear.direct) }
}

const unloaded: Reserve = { ok: true, loaded: false, rf: null, ms: null }
const reserve = (rf: number): Reserve => (Number.isFinite(rf) ? { ok: true, loaded: true, rf, ms: rf - 1 } : unloaded)
const sound = (...ratios: number[]): boolean => ratios.every(R => Number.isFinite(R) && R >= 0)
const unsound = refusal('A stress ratio must be zero or more: applied over allowable, both as magnitudes.')

/** Rn² + Rs² = 1: normal stress with shear or torsion. */
export function circleRule(Rn: number, Rs: number): Reserve {
  if (!sound(Rn, Rs)) return unsound
  return Rn === 0 && Rs === 0 ? unloaded : reserve(1 / Math.hypot(Rn, Rs))
}

/** Rc + Rs² = 1: panel buckling under compression and shear. RF = 2/(Rc + √(Rc² + 4Rs²)). */
export function compressionWithShear(Rc: number, Rs: number): Reserve {
  if (!sound(Rc, Rs)) return unsound
  return Rc === 0 && Rs === 0 ? unloaded : reserve(2 / (Rc + Math.sqrt(Rc ** 2 + 4 * Rs ** 2)))
}

/** Rb² + Rs² = 1: panel buckling under bending and shear (NACA TN 3781 and Bruhn, from memory). */
export const bendingWithShear = (Rb: number, Rs: number): Reserve => circleRule(Rb, Rs)

/** The multiplier λ > 0 at which a rising criterion reaches one, by bisection between bounds that hold it. */
function multiplier(criterion: (lambda: number) => number, below: number, above: number): number {
  let [low, high] = [below, above]
  for (let i = 0; i < 1200 && high - low > 1e-15 * high; i += 1) {
    const middle = (low + high) / 2
    if (criterion(middle) < 1) low = middle
    else high = middle
  }
  return (low + high) / 2
}

/** (λR₁)^a + (λR₂)^b = 1 for proportional loading; a, b > 0. */
export function powerRule(R1: number, R2: number, a: number, b: number): Reserve | Refusal {
  if (!sound(R1, R2)) return unsound
  if (!(Number.isFinite(a) && a > 0 && Number.isFinite(b) && b > 0)) return refusal('The exponents of an interaction must be greater than zero.')
  if (R1 === 0 && R2 === 0) return unloaded
  // One part alone reaches one at 1/R, and both together not before each has reached a half.
  const above = Math.min(1 / R1, 1 / R2)
  const below = Math.min(0.5 ** (1 / a) / R1, 0.5 ** (1 / b) / R2)
  return reserve(multiplier(lambda => (lambda * R1) ** a + (lambda * R2) ** b, below, above))
}

/** One part of the loading is steady and only the other grows: the margin on the varying load alone (methods §7.4). */
export function varyingOnly(steady: number, varying: number, a: number, b: number): Reserve | Refusal {
  if (!sound(steady, varying)) return unsound
  if (!(Number.isFinite(a) && a > 0 && Number.isFinite(b) && b > 0)) return refusal('The exponents of an interaction must be greater than zero.')
  if (steady >= 1) return refusal('The steady load alone reaches the criterion: no multiplier of the varying load remains.')
  return varying === 0 ? unloaded : reserve((1 - steady ** a) ** (1 / b) / varying)
}
