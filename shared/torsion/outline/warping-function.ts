/**
 * The warping function φ on the boundary, and from it the shear centre and
 * the warping constant. With the shear known, dφ/ds = τ − x·n along every loop.
 */
import type { PanelMesh } from '#shared/torsion/outline/panels'
import type { BoundaryShear } from '#shared/torsion/outline/boundary-shear'
import { panelPolynomials } from '#shared/torsion/outline/panel-polynomials'

/** Integral of nodal values along each loop from its first panel's start, at the nodes. */
function integrated({ panels, order, count }: PanelMesh, values: Float64Array, weights: Float64Array): Float64Array {
  const { integralTo } = panelPolynomials(order)
  const result = new Float64Array(count)
  let [loop, base] = [-1, 0]
  for (const { first, half, loop: own } of panels) {
    if (own !== loop) [loop, base] = [own, 0]
    let whole = 0
    for (let k = 0; k < order; k += 1) {
      let sum = 0
      for (let j = 0; j < order; j += 1) sum += (integralTo[k * order + j] as number) * (values[first + j] as number)
      result[first + k] = base + half * sum
      whole += (weights[first + k] as number) * (values[first + k] as number)
    }
    base += whole
  }
  return result
}

/** ∂φ/∂n on the boundary is y·n_x − x·n_y. */
const normalSlope = ({ x, y, nx, ny }: PanelMesh, i: number): number => (y[i] as number) * (nx[i] as number) - (x[i] as number) * (ny[i] as number)

/**
 * φ at the nodes, up to one constant. Each hole has a constant of its own
 * against the outer loop: Green's identity of φ with ∫ ln r dA over the hole,
 * harmonic in the material, gives it.
 */
export function warpingOnBoundary(mesh: PanelMesh, { tau, holes }: BoundaryShear, loopAreas: readonly number[]): Float64Array {
  const { count, x, y, nx, ny, w, loopOf } = mesh
  const slope = Float64Array.from({ length: count }, (_, i) => (tau[i] as number) - (x[i] as number) * (nx[i] as number) - (y[i] as number) * (ny[i] as number))
  const phi = integrated(mesh, slope, w)
  const shifts = holes.map(({ value, slope: steep }, index) => {
    let sum = 0
    for (let i = 0; i < count; i += 1) sum += (w[i] as number) * ((phi[i] as number) * (steep[i] as number) - (value[i] as number) * normalSlope(mesh, i))
    return sum / (2 * Math.PI * Math.abs(loopAreas[index + 1] ?? 1))
  })
  return phi.map((value, i) => value + ((loopOf[i] ?? 0) === 0 ? 0 : shifts[(loopOf[i] ?? 1) - 1] ?? 0))
}

/** ∫φ dA, ∫xφ dA, ∫yφ dA by Green's identity with r²/4, x·r²/8 and y·r²/8 (§4.1). */
export interface WarpingMoments { readonly whole: number, readonly x: number, readonly y: number }

export function warpingMoments(mesh: PanelMesh, phi: Float64Array): WarpingMoments {
  const { count, x, y, nx, ny, w } = mesh
  let [whole, mx, my] = [0, 0, 0]
  for (let i = 0; i < count; i += 1) {
    const px = x[i] as number
    const py = y[i] as number
    const weight = w[i] as number
    const value = weight * (phi[i] as number)
    const normal = weight * normalSlope(mesh, i)
    const square = px * px + py * py
    const reach = px * (nx[i] as number) + py * (ny[i] as number)
    whole += value * reach / 2 - normal * square / 4
    mx += value * (square * (nx[i] as number) + 2 * px * reach) / 8 - normal * px * square / 8
    my += value * (square * (ny[i] as number) + 2 * py * reach) / 8 - normal * py * square / 8
  }
  return { whole, x: mx, y: my }
}

/** Second moments about the centroid, in lengths of the mesh. */
export interface SecondMoments { readonly A: number, readonly Ixx: number, readonly Iyy: number, readonly Ixy: number }

/** Trefftz's shear centre, independent of Poisson's ratio, from the centroid (§4.1). */
export function trefftzCentre({ x, y }: WarpingMoments, { Ixx, Iyy, Ixy }: SecondMoments): { x: number, y: number } {
  const whole = Ixx * Iyy - Ixy * Ixy
  return { x: (Ixy * x - Iyy * y) / whole, y: (Ixx * x - Ixy * y) / whole }
}

/**
 * Γ = ∫φ² dA about the shear centre and with mean zero: what is left of φ when
 * its parts along 1, x and y are taken off. ∫φ² dA is a boundary integral with
 * u = ¼ Re(z̄·∫f dz), f = φ + i(Φ + r²/2), which is single-valued in a section
 * without holes only.
 */
export function warpingConstant(mesh: PanelMesh, phi: Float64Array, moments: WarpingMoments, { A, Ixx, Iyy, Ixy }: SecondMoments): number {
  const { count, x, y, nx, ny, w } = mesh
  const [re, im] = [new Float64Array(count), new Float64Array(count)]
  for (let i = 0; i < count; i += 1) {
    const psi = ((x[i] as number) ** 2 + (y[i] as number) ** 2) / 2
    // dz = (−n_y + i·n_x) ds
    re[i] = -(phi[i] as number) * (ny[i] as number) - psi * (nx[i] as number)
    im[i] = (phi[i] as number) * (nx[i] as number) - psi * (ny[i] as number)
  }
  const [fr, fi] = [integrated(mesh, re, w), integrated(mesh, im, w)]
  let square = 0
  for (let i = 0; i < count; i += 1) {
    const [px, py, mx, my, value] = [x[i] as number, y[i] as number, nx[i] as number, ny[i] as number, phi[i] as number]
    const psi = (px * px + py * py) / 2
    const [gr, gi] = [fr[i] as number, fi[i] as number]
    const u = (px * gr + py * gi) / 4
    const [ar, ai] = [px * value + py * psi, px * psi - py * value]
    const un = (gr * mx + gi * my + ar * mx - ai * my) / 4
    square += (w[i] as number) * (value * un - u * normalSlope(mesh, i))
  }
  const whole = Ixx * Iyy - Ixy * Ixy
  const { x: a, y: b } = moments
  return square - moments.whole ** 2 / A - (a * a * Ixx - 2 * a * b * Ixy + b * b * Iyy) / whole
}
