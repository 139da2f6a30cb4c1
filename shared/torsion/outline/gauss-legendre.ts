/** Gauss–Legendre rule on −1…1: roots of the Legendre polynomial by Newton's method, exact for polynomials up to degree 2n − 1. */

export interface GaussRule { readonly nodes: Float64Array, readonly weights: Float64Array }

const rules = new Map<number, GaussRule>()

/** P_n and its derivative at x. */
function legendre(n: number, x: number): [number, number] {
  let [before, now] = [1, x]
  for (let k = 2; k <= n; k += 1) [before, now] = [now, ((2 * k - 1) * x * now - (k - 1) * before) / k]
  return [now, n * (x * now - before) / (x * x - 1)]
}

function makeRule(n: number): GaussRule {
  const [nodes, weights] = [new Float64Array(n), new Float64Array(n)]
  for (let i = 0; i < n; i += 1) {
    let x = -Math.cos(Math.PI * (i + 0.75) / (n + 0.5))
    for (let step = 0; step < 8; step += 1) {
      const [value, slope] = legendre(n, x)
      x -= value / slope
    }
    const slope = legendre(n, x)[1]
    nodes[i] = x
    weights[i] = 2 / ((1 - x * x) * slope * slope)
  }
  return { nodes, weights }
}

/** The rule with n ≥ 2 nodes in rising order. */
export function gaussLegendre(n: number): GaussRule {
  const known = rules.get(n)
  if (known) return known
  const rule = makeRule(n)
  rules.set(n, rule)
  return rule
}
