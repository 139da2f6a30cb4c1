/**
 * Shear buckling of a rectangular plate by Ritz's method: k_s of τ_cr = k_s π²E/12(1−ν²)·(t/b)², for edges that
 * are simply supported or clamped (methods §2.5). Products of Legendre polynomials times what the edges ask
 * for; an upper bound that falls towards the true value as terms are added.
 */
import { factorise } from '#shared/torsion/cholesky'

/** Long edges have the length a ≥ b; they are the ones at y = ±1. */
export interface PlateEdges { readonly long: 'supported' | 'clamped', readonly short: 'supported' | 'clamped' }

/** One direction: integrals over (−1, 1) of products of the functions and their derivatives. */
interface Basis { readonly n: number, readonly ff: Float64Array, readonly gg: Float64Array, readonly hh: Float64Array, readonly fg: Float64Array }

const POINTS = 48

/** Gauss–Legendre points by Newton on the Legendre polynomial. */
function gauss(count: number): { x: number, w: number }[] {
  return Array.from({ length: count }, (_, i) => {
    let x = Math.cos(Math.PI * (i + 0.75) / (count + 0.5))
    let slope = 1
    for (let step = 0; step < 50; step += 1) {
      let [before, at] = [1, x]
      for (let k = 2; k <= count; k += 1) [before, at] = [at, ((2 * k - 1) * x * at - (k - 1) * before) / k]
      slope = count * (x * at - before) / (x * x - 1)
      const move = at / slope
      x -= move
      if (Math.abs(move) < 1e-16) break
    }
    return { x, w: 2 / ((1 - x * x) * slope * slope) }
  })
}

const points = gauss(POINTS)

/** Legendre polynomials and two derivatives, 0 … n−1, at x. */
function legendre(n: number, x: number): { p: number[], d: number[], s: number[] } {
  const [p, d, s] = [[1, x], [0, 1], [0, 0]]
  for (let k = 2; k < n; k += 1) {
    p[k] = ((2 * k - 1) * x * (p[k - 1] ?? 0) - (k - 1) * (p[k - 2] ?? 0)) / k
    d[k] = (d[k - 2] ?? 0) + (2 * k - 1) * (p[k - 1] ?? 0)
    s[k] = (s[k - 2] ?? 0) + (2 * k - 1) * (d[k - 1] ?? 0)
  }
  return { p: p.slice(0, n), d: d.slice(0, n), s: s.slice(0, n) }
}

/** P_i·(1 − x²) for supported edges, P_i·(1 − x²)² for clamped ones. */
function basis(n: number, edge: 'supported' | 'clamped'): Basis {
  const make = () => new Float64Array(n * n)
  const [ff, gg, hh, fg] = [make(), make(), make(), make()]
  for (const { x, w } of points) {
    const { p, d, s } = legendre(n, x)
    const q = 1 - x * x
    const [e, de, dde] = edge === 'supported' ? [q, -2 * x, -2] : [q * q, -4 * x * q, 12 * x * x - 4]
    const f = p.map(v => v * e)
    const g = p.map((v, i) => v * de + (d[i] ?? 0) * e)
    const h = p.map((v, i) => v * dde + 2 * (d[i] ?? 0) * de + (s[i] ?? 0) * e)
    for (let i = 0; i < n; i += 1) {
      for (let j = 0; j < n; j += 1) {
        const at = i * n + j
        const [fi, fj, gi, gj] = [f[i] ?? 0, f[j] ?? 0, g[i] ?? 0, g[j] ?? 0]
        ff[at] = (ff[at] ?? 0) + w * fi * fj
        gg[at] = (gg[at] ?? 0) + w * gi * gj
        hh[at] = (hh[at] ?? 0) + w * (h[i] ?? 0) * (h[j] ?? 0)
        fg[at] = (fg[at] ?? 0) + w * fi * gj
      }
    }
  }
  return { n, ff, gg, hh, fg }
}

/** Terms along the short and the long side: a long plate buckles in more waves. */
const acrossTerms = 8
const alongTerms = (ratio: number): number => Math.min(10 + 2 * Math.ceil(ratio), 26)

/**
 * k_s of a plate with sides a ≥ b, ratio = a/b. Poisson's ratio falls out for edges that stay straight.
 * Shear couples terms that are even in both directions with those odd in both (or mixed with mixed), so each
 * of the two families is solved alone.
 */
export function shearBucklingCoefficient(ratio: number, edges: PlateEdges): number {
  const X = basis(alongTerms(ratio), edges.short)
  const Y = basis(acrossTerms, edges.long)
  return Math.min(family(X, Y, ratio, true), family(X, Y, ratio, false))
}

/** Smallest k of K w = k N w within one family: the inverse of the largest eigenvalue of L⁻¹ N L⁻ᵀ. */
function family(X: Basis, Y: Basis, ratio: number, alike: boolean): number {
  const terms: (readonly [number, number])[] = []
  for (let i = 0; i < X.n; i += 1) for (let j = 0; j < Y.n; j += 1) if (((i + j) % 2 === 0) === alike) terms.push([i, j])
  const n = terms.length
  const K = new Float64Array(n * n)
  const N = new Float64Array(n * n)
  const r2 = ratio * ratio
  for (let a = 0; a < n; a += 1) {
    const [i, j] = terms[a] ?? [0, 0]
    for (let b = 0; b < n; b += 1) {
      const [k, l] = terms[b] ?? [0, 0]
      const [x, y, xT, yT] = [i * X.n + k, j * Y.n + l, k * X.n + i, l * Y.n + j]
      // In ξ = 2x/a and η = 2y/b, factors common to both matrices left out: bending along, across, and mixed.
      K[a * n + b] = (X.hh[x] ?? 0) * (Y.ff[y] ?? 0) / r2 + r2 * (X.ff[x] ?? 0) * (Y.hh[y] ?? 0) + 2 * (X.gg[x] ?? 0) * (Y.gg[y] ?? 0)
      // N_xy (w_x v_y + w_y v_x) with N_xy = k π²D/b².
      N[a * n + b] = ratio * ((X.fg[xT] ?? 0) * (Y.fg[y] ?? 0) + (X.fg[x] ?? 0) * (Y.fg[yT] ?? 0))
    }
  }
  return 4 / Math.PI ** 2 / largestEigenvalue(K, N, n)
}

function largestEigenvalue(K: Float64Array, N: Float64Array, n: number): number {
  const factor = factorise(K, n)
  if (!factor.ok) return Number.NaN
  const { L } = factor
  const forward = (b: Float64Array) => {
    for (let i = 0; i < n; i += 1) {
      let sum = b[i] ?? 0
      for (let k = 0; k < i; k += 1) sum -= (L[i * n + k] ?? 0) * (b[k] ?? 0)
      b[i] = sum / (L[i * n + i] ?? 1)
    }
    return b
  }
  const backward = (b: Float64Array) => {
    for (let i = n - 1; i >= 0; i -= 1) {
      let sum = b[i] ?? 0
      for (let k = i + 1; k < n; k += 1) sum -= (L[k * n + i] ?? 0) * (b[k] ?? 0)
      b[i] = sum / (L[i * n + i] ?? 1)
    }
    return b
  }
  const apply = (v: Float64Array) => {
    const w = backward(Float64Array.from(v))
    const out = new Float64Array(n)
    for (let i = 0; i < n; i += 1) {
      let sum = 0
      for (let k = 0; k < n; k += 1) sum += (N[i * n + k] ?? 0) * (w[k] ?? 0)
      out[i] = sum
    }
    return forward(out)
  }
  return lanczos(apply, n)
}

/** The largest eigenvalue in magnitude of a symmetric operator: Lanczos with full reorthogonalisation, then bisection on its tridiagonal. */
function lanczos(apply: (v: Float64Array) => Float64Array, n: number): number {
  const steps = Math.min(n, 40)
  const basisVectors: Float64Array[] = []
  const [alpha, beta]: [number[], number[]] = [[], []]
  let v = Float64Array.from({ length: n }, (_, i) => 1 / (1 + i) + (i % 3) * 0.1)
  let norm = Math.sqrt(dot(v, v))
  v = v.map(one => one / norm)
  for (let step = 0; step < steps; step += 1) {
    basisVectors.push(v)
    const w = apply(v)
    alpha.push(dot(w, v))
    for (let pass = 0; pass < 2; pass += 1) for (const u of basisVectors) subtract(w, u, dot(w, u))
    norm = Math.sqrt(dot(w, w))
    if (norm < 1e-12 * Math.abs(alpha[0] ?? 1) || norm === 0) break
    beta.push(norm)
    v = w.map(one => one / norm)
  }
  return tridiagonalLargest(alpha, beta)
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0
  for (let i = 0; i < a.length; i += 1) sum += (a[i] ?? 0) * (b[i] ?? 0)
  return sum
}

function subtract(w: Float64Array, u: Float64Array, factor: number) {
  for (let i = 0; i < w.length; i += 1) w[i] = (w[i] ?? 0) - factor * (u[i] ?? 0)
}

/** Largest eigenvalue by Sturm's count. */
function tridiagonalLargest(alpha: readonly number[], beta: readonly number[]): number {
  const bound = alpha.reduce((high, a, i) => Math.max(high, Math.abs(a) + Math.abs(beta[i] ?? 0) + Math.abs(beta[i - 1] ?? 0)), 0)
  const above = (x: number) => {
    let [count, d] = [0, 1]
    alpha.forEach((a, i) => {
      d = a - x - (i > 0 ? (beta[i - 1] ?? 0) ** 2 / (d === 0 ? 1e-300 : d) : 0)
      if (d > 0) count += 1
    })
    return count
  }
  let [low, high] = [-bound, bound]
  for (let i = 0; i < 200 && high - low > 1e-15 * bound; i += 1) {
    const middle = (low + high) / 2
    if (above(middle) > 0) low = middle
    else high = middle
  }
  return high
}
