/** What is done with the polynomial on a panel: read between its nodes, integrated from its start. */
import { gaussLegendre } from '#shared/torsion/outline/gauss-legendre'

export interface PanelPolynomials {
  readonly order: number
  /** Places −1…1 at which a panel is read, its ends among them. */
  readonly places: Float64Array
  /** Row m: weights of the nodal values for the value at place m. */
  readonly valueAt: Float64Array
  /** Row k: weights of the nodal values for the integral from −1 to node k. */
  readonly integralTo: Float64Array
}

const placesRead = 33

function legendreUpTo(degree: number, u: number): number[] {
  const values = [1, u]
  for (let k = 1; k < degree; k += 1) values.push(((2 * k + 1) * u * (values[k] ?? 0) - k * (values[k - 1] ?? 0)) / (k + 1))
  return values
}

/** ℓ_j(u) = Σ_k (2k + 1)/2 · w_j · P_k(u_j) · P_k(u): exact, since the Gauss rule integrates products of the P_k. */
function weightsOf(order: number, terms: readonly number[]): number[] {
  const { nodes, weights } = gaussLegendre(order)
  return Array.from(nodes, (node, j) => legendreUpTo(order - 1, node).slice(0, order)
    .reduce((sum, value, k) => sum + (2 * k + 1) / 2 * (weights[j] ?? 0) * value * (terms[k] ?? 0), 0))
}

/** ∫ P_k from −1 to u. */
function legendreIntegrals(order: number, u: number): number[] {
  const values = legendreUpTo(order, u)
  return Array.from({ length: order }, (_, k) => (k === 0 ? u + 1 : ((values[k + 1] ?? 0) - (values[k - 1] ?? 0)) / (2 * k + 1)))
}

const made = new Map<number, PanelPolynomials>()

/** The tables for panels with `order` nodes. */
export function panelPolynomials(order: number): PanelPolynomials {
  const known = made.get(order)
  if (known) return known
  const places = Float64Array.from({ length: placesRead }, (_, m) => -1 + 2 * m / (placesRead - 1))
  const tables: PanelPolynomials = {
    order, places,
    valueAt: Float64Array.from([...places].flatMap(u => weightsOf(order, legendreUpTo(order, u)))),
    integralTo: Float64Array.from([...gaussLegendre(order).nodes].flatMap(u => weightsOf(order, legendreIntegrals(order, u)))),
  }
  made.set(order, tables)
  return tables
}
