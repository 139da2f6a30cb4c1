/** Square systems whose entries lie near the diagonal: factorised once by rows exchanged for the largest pivot, solved for many right-hand sides. */

/** Entry (i, j) stands at `entries[j * stride + offset + i - j]`; the first `kl` rows of each column take what pivoting fills in. */
export interface Banded { readonly n: number, readonly kl: number, readonly ku: number, readonly stride: number, readonly offset: number, readonly entries: Float64Array }
export interface FactorisedBand { readonly ok: true, readonly matrix: Banded, readonly pivots: Int32Array }

/** An empty matrix of n unknowns with kl entries below and ku above the diagonal. */
export function bandedMatrix(n: number, kl: number, ku: number): Banded {
  const stride = 2 * kl + ku + 1
  return { n, kl, ku, stride, offset: kl + ku, entries: new Float64Array(stride * n) }
}

/** Replaces the entries by their factors; `ok: false` where the matrix is singular. */
export function factoriseBand(matrix: Banded): FactorisedBand | { readonly ok: false } {
  const { n, kl, ku, stride, offset, entries: a } = matrix
  const pivots = new Int32Array(n)
  const at = (i: number, j: number) => j * stride + offset + i - j
  for (let j = 0; j < n; j += 1) {
    const last = Math.min(n - 1, j + kl)
    let pivot = j
    for (let i = j + 1; i <= last; i += 1) if (Math.abs(a[at(i, j)] as number) > Math.abs(a[at(pivot, j)] as number)) pivot = i
    pivots[j] = pivot
    const largest = a[at(pivot, j)] as number
    if (!(Math.abs(largest) > 0 && Number.isFinite(largest))) return { ok: false }
    const right = Math.min(n - 1, j + kl + ku)
    for (let c = j; c <= right && pivot !== j; c += 1) {
      const [one, other] = [at(j, c), at(pivot, c)]
      const held = a[one] as number
      a[one] = a[other] as number
      a[other] = held
    }
    for (let i = j + 1; i <= last; i += 1) eliminate(a, at, { i, j, right, by: largest })
  }
  return { ok: true, matrix, pivots }
}

function eliminate(a: Float64Array, at: (i: number, j: number) => number, { i, j, right, by }: { i: number, j: number, right: number, by: number }) {
  const share = (a[at(i, j)] as number) / by
  a[at(i, j)] = share
  if (share === 0) return
  for (let c = j + 1; c <= right; c += 1) a[at(i, c)] = (a[at(i, c)] as number) - share * (a[at(j, c)] as number)
}

/** x of A x = b, in place of b. */
export function solveBand({ matrix, pivots }: FactorisedBand, b: Float64Array): Float64Array {
  const { n, kl, ku, stride, offset, entries: a } = matrix
  for (let j = 0; j < n; j += 1) {
    const pivot = pivots[j] as number
    const value = b[pivot] as number
    b[pivot] = b[j] as number
    b[j] = value
    const last = Math.min(n - 1, j + kl)
    for (let i = j + 1, p = j * stride + offset + 1; i <= last; i += 1, p += 1) b[i] = (b[i] as number) - (a[p] as number) * value
  }
  for (let j = n - 1; j >= 0; j -= 1) {
    const value = (b[j] as number) / (a[j * stride + offset] as number)
    b[j] = value
    for (let i = Math.max(0, j - kl - ku), p = j * stride + offset + i - j; i < j; i += 1, p += 1) b[i] = (b[i] as number) - (a[p] as number) * value
  }
  return b
}
