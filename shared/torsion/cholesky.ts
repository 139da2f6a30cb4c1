/** Symmetric positive definite systems of a few unknowns, row-major. */

export interface Factorised { readonly ok: true, readonly n: number, readonly L: Float64Array }

/** L of A = L Lᵀ; `ok: false` where A is not positive definite to rounding. */
export function factorise(A: Float64Array, n: number): Factorised | { readonly ok: false } {
  const L = new Float64Array(n * n)
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j <= i; j += 1) {
      let sum = A[i * n + j] ?? 0
      for (let k = 0; k < j; k += 1) sum -= (L[i * n + k] ?? 0) * (L[j * n + k] ?? 0)
      if (i > j) L[i * n + j] = sum / (L[j * n + j] ?? 1)
      else if (sum > 1e-14 * (A[i * n + i] ?? 0)) L[i * n + i] = Math.sqrt(sum)
      else return { ok: false }
    }
  }
  return { ok: true, n, L }
}

/** x of A x = b. */
export function solveFactorised({ n, L }: Factorised, b: Float64Array): Float64Array {
  const x = Float64Array.from(b)
  for (let i = 0; i < n; i += 1) {
    let sum = x[i] ?? 0
    for (let k = 0; k < i; k += 1) sum -= (L[i * n + k] ?? 0) * (x[k] ?? 0)
    x[i] = sum / (L[i * n + i] ?? 1)
  }
  for (let i = n - 1; i >= 0; i -= 1) {
    let sum = x[i] ?? 0
    for (let k = i + 1; k < n; k += 1) sum -= (L[k * n + i] ?? 0) * (x[k] ?? 0)
    x[i] = sum / (L[i * n + i] ?? 1)
  }
  return x
}

/** Condition number in the largest-column-sum norm, after the rows and columns are scaled to a unit diagonal. */
export function conditionOf(A: Float64Array, factor: Factorised): number {
  const { n } = factor
  const scale = Float64Array.from({ length: n }, (_, i) => Math.sqrt(A[i * n + i] ?? 1))
  let [norm, inverse] = [0, 0]
  for (let j = 0; j < n; j += 1) {
    const unit = new Float64Array(n)
    unit[j] = scale[j] ?? 1
    const column = solveFactorised(factor, unit)
    let [sum, inverseSum] = [0, 0]
    for (let i = 0; i < n; i += 1) {
      sum += Math.abs(A[i * n + j] ?? 0) / ((scale[i] ?? 1) * (scale[j] ?? 1))
      inverseSum += Math.abs(column[i] ?? 0) * (scale[i] ?? 1)
    }
    norm = Math.max(norm, sum)
    inverse = Math.max(inverse, inverseSum)
  }
  return norm * inverse
}
