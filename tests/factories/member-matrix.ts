/**
 * The bar by the other way: 4 × 4 member matrices of methods §3.5, assembled and solved densely. It shares nothing
 * with the engine but the data, and serves where kL of each member lies between about 0.3 and 30.
 */
import type { Member } from '#shared/torsion/warping/member'
import type { BarCase, Support } from '#shared/torsion/warping/warping-bar'

interface Entries { K11: number, K12: number, K22: number, K24: number }

function entries({ length, GJ, EG }: Member): Entries & { k: number, u: number } {
  const k = Math.sqrt(GJ / EG)
  const u = k * length
  const [C, S] = [Math.cosh(u), Math.sinh(u)]
  const D = 2 * (1 - C) + u * S
  return { k, u, K11: GJ * k * S / D, K12: GJ * (C - 1) / D, K22: GJ / k * (u * C - S) / D, K24: GJ / k * (S - u) / D }
}

/** Twist of every node. Uniform torques only. */
export function twistsByMatrices(members: readonly Member[], supports: readonly Support[], load: BarCase): number[] {
  const n = 2 * (members.length + 1)
  const K = Array.from({ length: n }, () => new Array<number>(n).fill(0))
  const f = new Array<number>(n).fill(0)
  members.forEach((member, e) => {
    const { K11, K12, K22, K24 } = entries(member)
    const local = [[K11, K12, -K11, K12], [K12, K22, -K12, K24], [-K11, -K12, K11, -K12], [K12, K24, -K12, K22]]
    local.forEach((row, i) => row.forEach((value, j) => {
      K[2 * e + i]![2 * e + j]! += value
    }))
  })
  for (const { member, m } of load.distributed) {
    const { length } = members[member]!
    const { k, u } = entries(members[member]!)
    const bimoment = m / k ** 2 * (u / 2 / Math.tanh(u / 2) - 1)
    ;[m * length / 2, bimoment, m * length / 2, -bimoment].forEach((value, i) => {
      f[2 * member + i]! += value
    })
  }
  for (const { node, T } of load.torques) f[2 * node]! += T
  for (const { node, B } of load.bimoments) f[2 * node + 1]! -= B
  for (const { node, twist, warping } of supports) {
    hold(K, f, 2 * node, twist)
    hold(K, f, 2 * node + 1, warping)
  }
  return solve(K, f).filter((_, i) => i % 2 === 0)
}

function hold(K: number[][], f: number[], i: number, restraint: Support['twist']): void {
  if (typeof restraint === 'number') K[i]![i]! += restraint
  if (restraint !== 'fixed') return
  K[i]!.fill(0)
  K.forEach((row) => {
    row[i] = 0
  })
  K[i]![i] = 1
  f[i] = 0
}

/** Gauss with the largest pivot. */
function solve(A: number[][], b: number[]): number[] {
  const n = b.length
  for (let j = 0; j < n; j += 1) {
    let p = j
    for (let i = j + 1; i < n; i += 1) if (Math.abs(A[i]![j]!) > Math.abs(A[p]![j]!)) p = i
    ;[A[j], A[p]] = [A[p]!, A[j]!]
    ;[b[j], b[p]] = [b[p]!, b[j]!]
    for (let i = j + 1; i < n; i += 1) {
      const share = A[i]![j]! / A[j]![j]!
      for (let c = j; c < n; c += 1) A[i]![c]! -= share * A[j]![c]!
      b[i]! -= share * b[j]!
    }
  }
  for (let i = n - 1; i >= 0; i -= 1) {
    for (let c = i + 1; c < n; c += 1) b[i]! -= A[i]![c]! * b[c]!
    b[i]! /= A[i]![i]!
  }
  return b
}
