/** Dense linear equations by blocked elimination with partial pivoting. Row by row in one typed array. */

/** Columns taken together: a block of rows of this width stays in the fastest memory. */
const block = 32

function swapRows(a: Float64Array, n: number, p: number, q: number): void {
  for (let k = 0, i = p * n, j = q * n; k < n; k += 1, i += 1, j += 1) {
    const kept = a[i] as number
    a[i] = a[j] as number
    a[j] = kept
  }
}

/** Eliminates columns from…to below the diagonal, within those columns. False where no pivot is left. */
function factorColumns(a: Float64Array, n: number, from: number, to: number, b: Float64Array): boolean {
  for (let k = from; k < to; k += 1) {
    let pivot = k
    for (let i = k + 1; i < n; i += 1) if (Math.abs(a[i * n + k] as number) > Math.abs(a[pivot * n + k] as number)) pivot = i
    const head = a[pivot * n + k] as number
    if (!(Math.abs(head) > 0)) return false
    if (pivot !== k) {
      swapRows(a, n, k, pivot)
      const kept = b[k] as number
      b[k] = b[pivot] as number
      b[pivot] = kept
    }
    for (let i = k + 1; i < n; i += 1) {
      const factor = (a[i * n + k] as number) / head
      a[i * n + k] = factor
      if (factor !== 0) for (let j = k + 1; j < to; j += 1) a[i * n + j] = (a[i * n + j] as number) - factor * (a[k * n + j] as number)
    }
  }
  return true
}

/** Rows from…to of the upper factor to the right of the eliminated columns. */
function upperRows(a: Float64Array, n: number, from: number, to: number): void {
  for (let k = from; k < to; k += 1) {
    for (let i = k + 1; i < to; i += 1) {
      const factor = a[i * n + k] as number
      for (let j = to, p = i * n + to, q = k * n + to; j < n; j += 1, p += 1, q += 1) a[p] = (a[p] as number) - factor * (a[q] as number)
    }
  }
}

/** What remains below and to the right: A −= L·U, four rows by four eliminated columns at a time. Rows left over go one by one. */
function updateRest(a: Float64Array, n: number, from: number, to: number): void {
  const whole = to + 4 * Math.floor((n - to) / 4)
  for (let i = to; i < whole; i += 4) {
    for (let k = from; k < to; k += 4) updateFour(a, n, i, k, to)
  }
  for (let i = whole; i < n; i += 1) {
    for (let k = from; k < to; k += 1) {
      const factor = a[i * n + k] as number
      for (let j = to, p = i * n + to, q = k * n + to; j < n; j += 1, p += 1, q += 1) a[p] = (a[p] as number) - factor * (a[q] as number)
    }
  }
}

/** Four rows from i, four eliminated columns from k: sixteen factors are read once while the columns to the right run by. */
function updateFour(a: Float64Array, n: number, i: number, k: number, to: number): void {
  let p = i * n + k
  const a0 = a[p] as number
  const a1 = a[p + 1] as number
  const a2 = a[p + 2] as number
  const a3 = a[p + 3] as number
  p += n
  const b0 = a[p] as number
  const b1 = a[p + 1] as number
  const b2 = a[p + 2] as number
  const b3 = a[p + 3] as number
  p += n
  const c0 = a[p] as number
  const c1 = a[p + 1] as number
  const c2 = a[p + 2] as number
  const c3 = a[p + 3] as number
  p += n
  const d0 = a[p] as number
  const d1 = a[p + 1] as number
  const d2 = a[p + 2] as number
  const d3 = a[p + 3] as number
  let u0 = k * n + to
  let u1 = u0 + n
  let u2 = u1 + n
  let u3 = u2 + n
  let r0 = i * n + to
  let r1 = r0 + n
  let r2 = r1 + n
  let r3 = r2 + n
  for (let j = to; j < n; j += 1) {
    const x0 = a[u0] as number
    const x1 = a[u1] as number
    const x2 = a[u2] as number
    const x3 = a[u3] as number
    a[r0] = (a[r0] as number) - a0 * x0 - a1 * x1 - a2 * x2 - a3 * x3
    a[r1] = (a[r1] as number) - b0 * x0 - b1 * x1 - b2 * x2 - b3 * x3
    a[r2] = (a[r2] as number) - c0 * x0 - c1 * x1 - c2 * x2 - c3 * x3
    a[r3] = (a[r3] as number) - d0 * x0 - d1 * x1 - d2 * x2 - d3 * x3
    u0 += 1
    u1 += 1
    u2 += 1
    u3 += 1
    r0 += 1
    r1 += 1
    r2 += 1
    r3 += 1
  }
}

/** Solves A·x = b in place: `a` is overwritten by its factors, `b` by the solution. False for a singular matrix. */
export function solveDense(a: Float64Array, b: Float64Array): boolean {
  const n = b.length
  for (let from = 0; from < n; from += block) {
    const to = Math.min(n, from + block)
    if (!factorColumns(a, n, from, to, b)) return false
    upperRows(a, n, from, to)
    updateRest(a, n, from, to)
  }
  for (let i = 1; i < n; i += 1) {
    let sum = b[i] as number
    for (let k = 0; k < i; k += 1) sum -= (a[i * n + k] as number) * (b[k] as number)
    b[i] = sum
  }
  for (let i = n - 1; i >= 0; i -= 1) {
    let sum = b[i] as number
    for (let k = i + 1; k < n; k += 1) sum -= (a[i * n + k] as number) * (b[k] as number)
    b[i] = sum / (a[i * n + i] as number)
  }
  return b.every(Number.isFinite)
}
