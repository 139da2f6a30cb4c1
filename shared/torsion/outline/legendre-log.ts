/**
 * ∫ P_k(u)·ln|ζ − u| du over −1…1 for a point ζ in the complex plane of a
 * panel, and from it the exact weights of a polynomial density against the
 * logarithm: the panel may be long against the distance of the point, as the
 * two faces of a sheet are (methods reference §4.1 for linear elements).
 */
import { gaussLegendre } from '#shared/torsion/outline/gauss-legendre'

export interface LogRule {
  readonly order: number
  readonly nodes: Float64Array
  readonly weights: Float64Array
  /** Writes ∫ ℓ_j(u) ln|ζ − u| du for the Lagrange polynomials ℓ_j of the nodes into `out`. */
  readonly weightsAt: (re: number, im: number, out: Float64Array) => void
}

/** (2k + 1)/2 · w_j · P_k(u_j): from Legendre moments to weights of nodal values. */
function momentsToNodes(order: number, nodes: Float64Array, weights: Float64Array): Float64Array {
  const table = new Float64Array(order * order)
  for (let j = 0; j < order; j += 1) {
    const u = nodes[j] ?? 0
    let [before, now] = [0, 1]
    for (let k = 0; k < order; k += 1) {
      table[k * order + j] = (2 * k + 1) / 2 * (weights[j] ?? 0) * now;
      [before, now] = [now, ((2 * k + 1) * u * now - k * before) / (k + 1)]
    }
  }
  return table
}

const rules = new Map<number, LogRule>()

function makeRule(order: number): LogRule {
  const { nodes, weights } = gaussLegendre(order)
  const table = momentsToNodes(order, nodes, weights)
  const moments = new Float64Array(order)
  const q = new Float64Array(order + 1)
  const weightsAt = (re: number, im: number, out: Float64Array): void => {
    const [rightR, leftR] = [(re + 1) * (re + 1) + im * im, (re - 1) * (re - 1) + im * im]
    const [logRight, logLeft] = [0.5 * Math.log(rightR), 0.5 * Math.log(leftR)]
    const [argRight, argLeft] = [Math.atan2(im, re + 1), Math.atan2(im, re - 1)]
    moments[0] = (re + 1) * logRight - (re - 1) * logLeft - im * (argRight - argLeft) - 2
    // Legendre functions of the second kind Q_k(ζ) by their recurrence; ∫ P_k/(ζ − u) du = 2 Q_k.
    let [r0, i0] = [0.5 * (logRight - logLeft), 0.5 * (argRight - argLeft)]
    let [r1, i1] = [re * r0 - im * i0 - 1, re * i0 + im * r0]
    q[0] = r0
    q[1] = r1
    for (let k = 1; k < order; k += 1) {
      const r2 = ((2 * k + 1) * (re * r1 - im * i1) - k * r0) / (k + 1)
      const i2 = ((2 * k + 1) * (re * i1 + im * r1) - k * i0) / (k + 1)
      q[k + 1] = r2
      r0 = r1
      i0 = i1
      r1 = r2
      i1 = i2
    }
    for (let k = 1; k < order; k += 1) moments[k] = 2 * ((q[k + 1] ?? 0) - (q[k - 1] ?? 0)) / (2 * k + 1)
    for (let j = 0; j < order; j += 1) {
      let sum = 0
      for (let k = 0; k < order; k += 1) sum += (table[k * order + j] ?? 0) * (moments[k] ?? 0)
      out[j] = sum
    }
  }
  return { order, nodes, weights, weightsAt }
}

/** The rule for polynomials of degree below `order` (2…16). */
export function logRule(order: number): LogRule {
  const known = rules.get(order)
  if (known) return known
  const rule = makeRule(order)
  rules.set(order, rule)
  return rule
}
