/**
 * One uniform member in torsion with warping (Vlasov; methods §3.3, §3.5), exactly, under end loads and a
 * torque distributed linearly. N, mm, rad. u = kL with k² = GJ/EΓ; no expression overflows or cancels for any u.
 *
 * The four relations between what stands at its ends are kept apart, instead of being condensed into the
 * 4 × 4 stiffness matrix of §3.5: condensed, twist is lost in warping (or warping in twist) as u leaves 1.
 */

/** A stretch with one section. EΓ = 0 is a member that does not warp: only its twist counts. */
export interface Member { readonly length: number, /** N·mm², > 0 */ readonly GJ: number, /** EΓ, N·mm⁴, ≥ 0 */ readonly EG: number }

/** What stands at the ends of a member in one load case; m runs linearly from m1 to m2, N·mm/mm. */
export interface MemberEnds { readonly phi: number, readonly rate: number, readonly T: number, readonly B1: number, readonly B2: number, readonly m1: number, readonly m2: number }

export interface MemberState { readonly phi: number, readonly rate: number, readonly B: number, readonly T: number, /** T_SV = GJ φ′ */ readonly Tsv: number, /** T_ω = B′ */ readonly Tw: number }

/** kL; infinite where the member does not warp. */
export const decayOf = ({ length, GJ, EG }: Member): number => (EG === 0 ? Infinity : length * Math.sqrt(GJ / EG))

/** Below, power series with positive terms are summed; above, nothing cancels any more. */
const SERIES_BELOW = 4

/** Σ over n ≥ 1 of c(n)·h^(2n+1)/(2n+1)!, for positive c. */
function oddSeries(h: number, coefficient: (n: number) => number): number {
  let [sum, power] = [0, h]
  for (let n = 1; n < 60; n += 1) {
    power *= h * h / (2 * n * (2 * n + 1))
    const term = power * coefficient(n)
    sum += term
    if (n > 2 && term < 1e-18 * sum) break
  }
  return sum
}

/**
 * How the ends are related, for a bimoment B and a distributed torque m:
 *   φ₂′ − φ₁′ = −(k/GJ)·[even·(B₁ + B₂) + evenLoad·(m₁ + m₂)/k²],
 *   φ₂ − φ₁ = (L/2)(φ₁′ + φ₂′) − (1/GJ)·[odd·(B₁ − B₂) + oddLoad·(m₁ − m₂)/k²].
 */
export interface Relations { readonly even: number, readonly evenLoad: number, readonly odd: number, readonly oddLoad: number }

/** ∫ and first moment over a member of what each end and load contributes to its bimoment: tanh h, h − tanh h, h coth h − 1, h²/3 − (h coth h − 1) with h = u/2. */
export function memberRelations(u: number): Relations {
  const h = u / 2
  const even = Math.tanh(h)
  if (h >= SERIES_BELOW) return { even, evenLoad: h - even, odd: h / even - 1, oddLoad: h * h / 3 - (h / even - 1) }
  const lag = oddSeries(h, n => 2 * n)
  return { even, evenLoad: lag / Math.cosh(h), odd: lag / Math.sinh(h), oddLoad: oddSeries(h, n => 2 * n * (2 * n - 2) / 3) / Math.sinh(h) }
}

/** sinh a / sinh b for 0 ≤ a ≤ b, b > 0. */
export const sinhRatio = (a: number, b: number): number => (a === 0 ? 0 : b < 1e-8 ? a / b : Math.exp(a - b) * Math.expm1(-2 * a) / Math.expm1(-2 * b))

/** cosh a / sinh b for 0 ≤ a ≤ b, b not small. */
const coshRatio = (a: number, b: number): number => Math.exp(a - b) * (1 + Math.exp(-2 * a)) / -Math.expm1(-2 * b)

/** x/u − sinh x / sinh u: the bimoment of a torque that grows from zero to one at x = u, times k². */
export function swell(x: number, u: number): number {
  if (u >= 2 * SERIES_BELOW) return x / u - sinhRatio(x, u)
  let [sum, far, near] = [0, 1, 1]
  for (let n = 1; n < 60; n += 1) {
    const below = 2 * n * (2 * n + 1)
    far *= u * u / below
    near *= x * x / below
    sum += far - near
    if (n > 2 && far < 1e-18 * sum) break
  }
  return x * sum / Math.sinh(u)
}

/** Abscissas and weights of the five-point Gauss rule on (0, 1): standard table. */
const GAUSS: readonly (readonly [number, number])[] = [
  [0.04691007703066802, 0.11846344252809454], [0.23076534494715845, 0.23931433524968324], [0.5, 0.28444444444444444], [0.7692346550528415, 0.23931433524968324], [0.9530899229693319, 0.11846344252809454],
]

/** Below, φ′ follows from the bimoment, which is what is large; above, from the torque that is left to twist. */
const WARPING_LEADS_BELOW = 1
/** Numbers held for a place: what B₁, B₂, m₁ and m₂ give there of B, of B′ or the change of φ′, and of φ. */
export const SHAPE = 12

/** The share of each end and load in the state at z, written at `o`. */
export function writeShape(member: Member, u: number, z: number, shape: Float64Array, o: number): void {
  if (u === Infinity) return
  const k = u / member.length
  const [x, y] = [k * z, k * (member.length - z)]
  shape[o] = sinhRatio(y, u)
  shape[o + 1] = sinhRatio(x, u)
  shape[o + 2] = swell(y, u) / k ** 2
  shape[o + 3] = swell(x, u) / k ** 2
  if (u < WARPING_LEADS_BELOW) return writeIntegrals(member, u, x, shape, o)
  shape[o + 4] = -k * coshRatio(y, u)
  shape[o + 5] = k * coshRatio(x, u)
  shape[o + 6] = -(1 / u - coshRatio(y, u)) / k
  shape[o + 7] = (1 / u - coshRatio(x, u)) / k
}

/** (1/EΓ)·∫B and its integral from the start, for u < 1, where the rule is exact to rounding. */
function writeIntegrals({ GJ, length }: Member, u: number, x: number, shape: Float64Array, o: number): void {
  const k = u / length
  for (const [part, weight] of GAUSS) {
    const [at, left] = [part * x, x * (1 - part)]
    const [first, second] = [swell(u - at, u), swell(at, u)]
    const values = [sinhRatio(u - at, u), sinhRatio(at, u), first / k ** 2, second / k ** 2]
    for (let i = 0; i < 4; i += 1) {
      const share = weight * x * (values[i] as number) / GJ
      shape[o + 4 + i] = (shape[o + 4 + i] as number) + share * k
      shape[o + 8 + i] = (shape[o + 8 + i] as number) + share * left
    }
  }
}

/** Where the results of one place are written. */
export interface StateArrays { readonly phi: Float64Array, readonly rate: Float64Array, readonly B: Float64Array, readonly T: Float64Array, readonly Tw: Float64Array }

/** What the ends and loads give together of four shapes that stand at `p`. */
function sumOf({ B1, B2, m1, m2 }: MemberEnds, shape: Float64Array, p: number): number {
  return B1 * (shape[p] as number) + B2 * (shape[p + 1] as number) + m1 * (shape[p + 2] as number) + m2 * (shape[p + 3] as number)
}

/** The state at z from the ends and the shape that stands at `o`, written at `i`. */
export function writeState({ length, GJ }: Member, u: number, ends: MemberEnds, z: number, shape: Float64Array, o: number, out: StateArrays, i: number): void {
  const { phi, rate, T, m1, m2 } = ends
  const B = sumOf(ends, shape, o)
  const growth = (m2 - m1) * z * z / (2 * length)
  const torque = T - m1 * z - growth
  out.B[i] = B
  out.T[i] = torque
  if (u < WARPING_LEADS_BELOW) {
    const slope = rate - sumOf(ends, shape, o + 4)
    out.rate[i] = slope
    out.Tw[i] = torque - GJ * slope
    out.phi[i] = phi + rate * z - sumOf(ends, shape, o + 8)
    return
  }
  const Tw = sumOf(ends, shape, o + 4)
  out.Tw[i] = Tw
  out.rate[i] = (torque - Tw) / GJ
  out.phi[i] = phi + (T * z - m1 * z * z / 2 - growth * z / 3 - (B - (u === Infinity ? 0 : ends.B1))) / GJ
}
