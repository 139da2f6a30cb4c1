/**
 * The shear along the boundary of a twisted section, per G·θ′, as the unknown
 * of a boundary-integral equation.
 *
 * The stress function Φ (∇²Φ = −2, §1) is constant on every loop. Green's
 * identity with g = −ln r/2π over the material gives, for every point P of
 * every loop, with τ = −∂Φ/∂n,
 *   ∮ g·τ ds + Φ(loop of P) = 2∫ g dA,
 * and each loop carries ∮ τ ds = 2·(area it encloses, signed by its sense).
 * The outer constant comes out as zero, which is a check. The right side is
 * 2∫ g dA = −(1/π) ∮ (½ ln r − ¼)(Q − P)·n ds. Unlike the warping function of
 * §4.1 nothing is differentiated afterwards: the shear itself is solved for.
 */
import type { PanelMesh } from '#shared/torsion/outline/panels'
import { logMatrix } from '#shared/torsion/outline/log-matrix'
import { solveDense } from '#shared/torsion/outline/dense-solve'

/** All in lengths of the mesh. */
export interface BoundaryShear {
  /** At the nodes, positive along the walk with the material on the left. */
  readonly tau: Float64Array
  /** Φ on every loop. */
  readonly loopPhi: Float64Array
  /** For every hole: ∫ ln r dA over the hole and its derivative along the outward normal, at the nodes. */
  readonly holes: readonly HolePotential[]
}
export interface HolePotential { readonly value: Float64Array, readonly slope: Float64Array }

/** ∫ ln r dA over the inside of each hole, and its normal derivative, by their boundary integrals (holes are walked clockwise). */
function holePotential(matrix: Float64Array, stride: number, mesh: PanelMesh, loop: number): HolePotential {
  const { count, x, y, nx, ny, w, loopOf } = mesh
  const [value, slope] = [new Float64Array(count), new Float64Array(count)]
  const own = Array.from({ length: count }, (_, j) => j).filter(j => loopOf[j] === loop)
  for (let i = 0; i < count; i += 1) {
    let sum = 0
    let gx = 0
    let gy = 0
    for (const j of own) {
      const weight = matrix[i * stride + j] as number
      const reach = ((x[j] as number) - (x[i] as number)) * (nx[j] as number) + ((y[j] as number) - (y[i] as number)) * (ny[j] as number)
      sum -= (0.5 * weight - 0.25 * (w[j] as number)) * reach
      gx += weight * (nx[j] as number)
      gy += weight * (ny[j] as number)
    }
    value[i] = sum
    slope[i] = gx * (nx[i] as number) + gy * (ny[i] as number)
  }
  return { value, slope }
}

/** Fills in the right side, the loop constants and the circulations. Multiplied by −2π, so that the matrix is ∫ ln r itself. */
function completeEquations(matrix: Float64Array, right: Float64Array, mesh: PanelMesh, loopAreas: readonly number[]): void {
  const { count, x, y, nx, ny, w, loopOf } = mesh
  const stride = right.length
  for (let i = 0; i < count; i += 1) {
    const row = i * stride
    const px = x[i] as number
    const py = y[i] as number
    let sum = 0
    for (let j = 0; j < count; j += 1) {
      sum += ((matrix[row + j] as number) - 0.5 * (w[j] as number)) * (((x[j] as number) - px) * (nx[j] as number) + ((y[j] as number) - py) * (ny[j] as number))
    }
    right[i] = sum
    const constant = count + (loopOf[i] as number)
    matrix[row + constant] = 1
    matrix[constant * stride + i] = w[i] as number
  }
  for (const [loop, area] of loopAreas.entries()) right[count + loop] = 2 * area
}

/**
 * Solves for the shear on a mesh. `loopAreas` are the signed areas the loops
 * enclose, in squared lengths of the mesh. Null where the equations are
 * singular, which no sound outline leads to.
 */
export function boundaryShear(mesh: PanelMesh, loopAreas: readonly number[]): BoundaryShear | null {
  const { count, loops } = mesh
  const stride = count + loops
  const matrix = logMatrix(mesh, stride)
  const holes = Array.from({ length: loops - 1 }, (_, index) => holePotential(matrix, stride, mesh, index + 1))
  const right = new Float64Array(stride)
  completeEquations(matrix, right, mesh, loopAreas)
  if (!solveDense(matrix, right)) return null
  return { tau: right.slice(0, count), loopPhi: right.slice(count).map(value => -value / (2 * Math.PI)), holes }
}
