/**
 * One uniform member in torsion with warping (Vlasov; methods §3.3, §3.5): exact stiffness and the run of
 * twist and bimoment between its ends. N, mm, rad. u = kL with k² = GJ/EΓ; no formula overflows or cancels
 * for any u.
 */

/** A stretch with one section. EΓ = 0 is a member that does not warp: only its twist counts. */
export interface Member { readonly length: number, /** N·mm², > 0 */ readonly GJ: number, /** EΓ, N·mm⁴, ≥ 0 */ readonly EG: number }

export interface MemberStiffness { readonly u: number, readonly K11: number, readonly K12: number, readonly K22: number, readonly K24: number }

/** Below, the power series of sinh and cosh are summed, all of whose terms are positive; above, exponentials. */
const SERIES_BELOW = 8

/** Σ of c(n)·u^(2n)/(2n)! and the like: terms are made from one another until they no longer count. */
function series(u: number, first: number, start: number, coefficient: (n: number) => number): number {
  let [sum, power] = [0, first]
  for (let n = start; n < 60; n += 1) {
    const term = power * coefficient(n)
    sum += term
    if (term < 1e-18 * sum) break
    power *= u * u / ((2 * n + 1) * (2 * n + 2))
  }
  return sum
}

/** The four combinations of sinh u and cosh u that the stiffness is made of, over a common factor that cancels. */
function combinations(u: number): { S: number, Cm1: number, D: number, uCmS: number, Smu: number } {
  if (u < SERIES_BELOW) {
    const even = (start: number, coefficient: (n: number) => number) => series(u, u ** (2 * start) / factorial(2 * start), start, coefficient)
    return {
      S: even(0, n => u / (2 * n + 1)), Cm1: even(1, () => 1), D: even(2, n => 2 * n - 2),
      uCmS: even(1, n => u * 2 * n / (2 * n + 1)), Smu: even(1, n => u / (2 * n + 1)),
    }
  }
  // Divided by cosh u: tanh u is 1 to rounding long before 1/cosh u is zero.
  const inverse = 2 * Math.exp(-u) / (1 + Math.exp(-2 * u))
  const T = Math.tanh(u)
  return { S: T, Cm1: 1 - inverse, D: 2 * (inverse - 1) + u * T, uCmS: u - T, Smu: T - u * inverse }
}

const factorial = (n: number): number => (n <= 1 ? 1 : n * factorial(n - 1))

/** Entries of the matrix between (φ₁, φ₁′, φ₂, φ₂′) and (−T(0), B(0), T(L), −B(L)). */
export function memberStiffness({ length, GJ, EG }: Member): MemberStiffness {
  if (EG === 0) return { u: Infinity, K11: GJ / length, K12: 0, K22: 0, K24: 0 }
  const u = length * Math.sqrt(GJ / EG)
  const { S, Cm1, D, uCmS, Smu } = combinations(u)
  return { u, K11: GJ / length * u * S / D, K12: GJ * Cm1 / D, K22: GJ * length / u * uCmS / D, K24: GJ * length / u * Smu / D }
}

/** h coth h − 1, without cancellation. */
function cothExcess(h: number): number {
  if (h > 20) return h - 1
  const { S, uCmS } = combinations(h)
  return uCmS / S
}

/** Nodal actions that stand for a uniform torque m in N·mm/mm: torque at each end, and the bimoment at the first (the second has its negative). */
export function uniformLoad({ length, EG }: Member, u: number, m: number): { torque: number, bimoment: number } {
  return { torque: m * length / 2, bimoment: EG === 0 ? 0 : m * length ** 2 / u ** 2 * cothExcess(u / 2) }
}

/** sinh(a)/sinh(b) for 0 ≤ a ≤ b, b > 0. */
function sinhRatio(a: number, b: number): number {
  return a === 0 ? 0 : b < 1e-8 ? a / b : Math.exp(a - b) * Math.expm1(-2 * a) / Math.expm1(-2 * b)
}

/** Abscissas and weights of the five-point Gauss rule on (0, 1): standard table. */
const GAUSS: readonly (readonly [number, number])[] = [
  [0.04691007703066802, 0.11846344252809454], [0.23076534494715845, 0.23931433524968324], [0.5, 0.28444444444444444], [0.7692346550528415, 0.23931433524968324], [0.9530899229693319, 0.11846344252809454],
]

/** What acts at the ends of a member in one load case. */
export interface MemberEnds { readonly phi: number, readonly rate: number, readonly T: number, readonly B1: number, readonly B2: number, readonly m: number }

export interface MemberState { readonly phi: number, readonly rate: number, readonly B: number, readonly T: number, /** T_SV = GJ φ′ */ readonly Tsv: number, /** T_ω = B′ */ readonly Tw: number }

/** B at z from the start: the ends' bimoments die out exponentially, the distributed torque adds m/k²·(1 − cosh(k(z − L/2))/cosh h). */
export function bimomentAt({ length }: Member, u: number, { B1, B2, m }: MemberEnds, z: number): number {
  if (u === Infinity) return 0
  const k = u / length
  return B1 * sinhRatio(u - k * z, u) + B2 * sinhRatio(k * z, u) + m / k ** 2 * bump(u, k * z)
}

/** 1 − cosh(x − h)/cosh h with h = u/2, as a product of what is small: no cancellation. */
function bump(u: number, x: number): number {
  const h = u / 2
  return 2 * sinhRatio(Math.min(x, u - x) / 2, h) * coshRatio(Math.max(x, u - x) / 2, h)
}

/** sinh h · sinh(b)/cosh h for b ≤ h: the other factor of the bump. */
function coshRatio(b: number, h: number): number {
  return h < 20 ? Math.sinh(h) * Math.sinh(b) / Math.cosh(h) : 0.5 * Math.exp(b) * -Math.expm1(-2 * b) * Math.tanh(h)
}

/** ∫B dz from the start, for φ′ = φ₁′ − ∫B/EΓ; u < 1. (cosh u − cosh(u − x))/sinh u and (cosh x − 1)/sinh u are taken as products. */
function bimomentIntegral({ length }: Member, u: number, { B1, B2, m }: MemberEnds, z: number): number {
  const k = u / length
  const x = k * z
  const half = 2 * sinhRatio(x / 2, u)
  return half * (B1 * Math.sinh(u - x / 2) + B2 * Math.sinh(x / 2)) / k + m / k ** 3 * lag(u, x)
}

/** x − (sinh(x − h) + sinh h)/cosh h for u < 1, h = u/2: of the third order, summed as ∫ of the bump by Gauss's rule. */
const lag = (u: number, x: number): number => GAUSS.reduce((sum, [part, weight]) => sum + weight * x * bump(u, part * x), 0)

/** The run of a member at z, 0 ≤ z ≤ L. */
export function stateAt(member: Member, u: number, ends: MemberEnds, z: number): MemberState {
  const { GJ, EG } = member
  const T = ends.T - ends.m * z
  if (u === Infinity) {
    const phi = ends.phi + (ends.T * z - ends.m * z ** 2 / 2) / GJ
    return { phi, rate: T / GJ, B: 0, T, Tsv: T, Tw: 0 }
  }
  const B = bimomentAt(member, u, ends, z)
  // Where warping carries most, φ′ follows from the bimoment; where twist does, from the torque it carries.
  const rate = u < 1 ? ends.rate - bimomentIntegral(member, u, ends, z) / EG : (T - bimomentSlope(member, u, ends, z)) / GJ
  const phi = u < 1 ? ends.phi + twistBetween(member, u, ends, z) : ends.phi + (ends.T * z - ends.m * z ** 2 / 2 - (B - ends.B1)) / GJ
  return { phi, rate, B, T, Tsv: GJ * rate, Tw: T - GJ * rate }
}

/** B′ where u is not small. */
function bimomentSlope({ length }: Member, u: number, { B1, B2, m }: MemberEnds, z: number): number {
  const k = u / length
  const cosh = (y: number) => Math.exp(y - u) * (1 + Math.exp(-2 * y)) / -Math.expm1(-2 * u)
  const h = u / 2
  const slope = h < 20 ? -Math.sinh(k * z - h) / Math.cosh(h) : -Math.sign(k * z - h) * Math.exp(Math.abs(k * z - h) - h)
  return k * (B2 * cosh(k * z) - B1 * cosh(u - k * z)) + m / k * slope
}

/** ∫φ′ dz from the start; for u < 1 the rule is exact to rounding. */
const twistBetween = (member: Member, u: number, ends: MemberEnds, z: number): number =>
  GAUSS.reduce((sum, [part, weight]) => sum + weight * z * (ends.rate - bimomentIntegral(member, u, ends, part * z) / member.EG), 0)
