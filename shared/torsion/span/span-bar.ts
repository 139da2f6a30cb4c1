/**
 * Torque and twist along a bar of stepped and tapering segments, with point and distributed torques and any
 * number of rigid or flexible supports (methods §5.1, §5.2). Free warping. N, mm, rad.
 */
import { finiteOrRefused } from '#shared/torsion/finite'
import { factorise, solveFactorised, type Factorised } from '#shared/torsion/cholesky'
import { refusal, type Refusal } from '#shared/torsion/section'
import { flexibility, flexibilityIntegral, stiffnessAt, type Segment } from '#shared/torsion/span/segment'

/** Held rigidly, or by a spring in N·mm/rad. */
export interface SpanSupport { readonly node: number, readonly stiffness: 'rigid' | number }
export interface SpanCase {
  readonly torques: readonly { readonly node: number, readonly T: number }[]
  /** Linear from m1 to m2 along the segment, N·mm/mm. */
  readonly distributed: readonly { readonly segment: number, readonly m1: number, readonly m2: number }[]
}

export interface SpanEnds { readonly phi: number, /** Internal torque on the face towards +z at the start. */ readonly T: number, readonly m1: number, readonly m2: number }
export interface SpanResponse {
  readonly nodes: readonly { readonly z: number, readonly phi: number }[]
  readonly segments: readonly SpanEnds[]
  readonly reactions: readonly { readonly node: number, readonly torque: number }[]
  /** |Σ reactions + Σ torques| over the largest of them. */
  readonly residual: number
}
export interface SpanStation { readonly z: number, readonly segment: number, readonly T: number, readonly phi: number, /** rad/mm */ readonly rate: number }

export interface SpanBar {
  readonly ok: true
  readonly length: number
  /** More supports than equilibrium needs: the share of each follows from stiffness (G-21). */
  readonly indeterminate: boolean
  readonly respond: (load: SpanCase) => SpanResponse | Refusal
  /** Even stations of every segment, the same for every case. */
  readonly stations: (response: SpanResponse, count?: number) => SpanStation[]
  /** Where torque (m = 0) or twist (T = 0) turns inside a segment: with the ends of the segments, every extreme exactly. */
  readonly turns: (response: SpanResponse) => SpanStation[]
}

export const mostSegments = 500
const positive = (value: number) => Number.isFinite(value) && value > 0

/** @returns a refusal for numbers that are none, supports that stand nowhere or hold nothing. */
export function spanBar(segments: readonly Segment[], supports: readonly SpanSupport[]): SpanBar | Refusal {
  const fault = unsound(segments, supports)
  if (fault) return refusal(fault)
  const zs = segments.reduce<number[]>((at, { length }) => [...at, (at.at(-1) ?? 0) + length], [0])
  const rigid = new Set(supports.flatMap(({ node, stiffness }) => (stiffness === 'rigid' ? [node] : [])))
  const stiff = segments.map(segment => 1 / flexibility(segment))
  const kept = zs.flatMap((_, i) => (rigid.has(i) ? [] : [i]))
  const factor = assemble(stiff, supports, kept)
  if (!factor) return refusal('Nothing holds the bar against turning: give at least one support a stiffness.')
  const solver: Solver = { segments, supports, stiff, zs, kept, factor }
  return { ok: true, length: zs.at(-1) ?? 0, indeterminate: supports.length > 1, respond: load => respond(solver, load), stations: (response, count = 20) => stationsOf(solver, response, () => Array.from({ length: count + 1 }, (_, i) => i / count)), turns: response => stationsOf(solver, response, turningParts) }
}

interface Solver { readonly segments: readonly Segment[], readonly supports: readonly SpanSupport[], readonly stiff: readonly number[], readonly zs: readonly number[], readonly kept: readonly number[], readonly factor: Factorised }

function unsound(segments: readonly Segment[], supports: readonly SpanSupport[]): string | null {
  if (segments.length === 0) return 'The bar has no length. Add the first segment.'
  if (segments.length > mostSegments) return `The bar has ${segments.length} segments; at most ${mostSegments} can be computed.`
  for (const [i, segment] of segments.entries()) {
    if (!positive(segment.length)) return `Segment ${i + 1} needs a length greater than zero.`
    const { stiffness } = segment
    const numbers = stiffness.along === 'uniform' ? [stiffness.GJ] : stiffness.along === 'linear' ? [stiffness.GJ1, stiffness.GJ2] : [stiffness.G, stiffness.d1, stiffness.d2]
    if (!numbers.every(positive)) return `Segment ${i + 1} needs a stiffness greater than zero.`
    if (!positive(flexibility(segment))) return `Segment ${i + 1} cannot be computed with such sizes. Check its numbers and their units.`
    if (Math.max(...numbers.slice(-2)) > 1e3 * Math.min(...numbers.slice(-2)) && stiffness.along !== 'uniform') return `The ends of segment ${i + 1} are too far apart for one taper. Split it.`
  }
  if (supports.length === 0) return 'The bar has no support. Add one that holds it against turning.'
  const seen = new Set<number>()
  for (const { node, stiffness } of supports) {
    if (!(Number.isInteger(node) && node >= 0 && node <= segments.length)) return `A support stands at node ${node}, which the bar does not have.`
    if (seen.has(node)) return `Node ${node} has two supports. Keep one.`
    seen.add(node)
    if (stiffness !== 'rigid' && !(Number.isFinite(stiffness) && stiffness >= 0)) return `The support at node ${node} needs a stiffness of zero or more.`
  }
  return null
}

function assemble(stiff: readonly number[], supports: readonly SpanSupport[], kept: readonly number[]): Factorised | null {
  const n = kept.length
  const place = new Map(kept.map((node, i) => [node, i]))
  const A = new Float64Array(n * n)
  const add = (i: number | undefined, j: number | undefined, value: number) => {
    if (i !== undefined && j !== undefined) A[i * n + j] = (A[i * n + j] ?? 0) + value
  }
  stiff.forEach((k, e) => {
    const [a, b] = [place.get(e), place.get(e + 1)]
    add(a, a, k)
    add(b, b, k)
    add(a, b, -k)
    add(b, a, -k)
  })
  for (const { node, stiffness } of supports) if (stiffness !== 'rigid') add(place.get(node), place.get(node), stiffness)
  const factor = factorise(A, n)
  return factor.ok ? factor : null
}

/** Torque of the distributed load from the start of a segment to a part of it. */
const gathered = (length: number, m1: number, m2: number, part: number): number => length * part * (m1 + part / 2 * (m2 - m1))

function respond(solver: Solver, load: SpanCase): SpanResponse | Refusal {
  const { segments, supports, stiff, zs, kept, factor } = solver
  const f = new Float64Array(zs.length)
  for (const { node, T } of load.torques) {
    if (!(Number.isInteger(node) && node >= 0 && node < zs.length)) return refusal(`A torque stands at node ${node}, which the bar does not have.`)
    if (!Number.isFinite(T)) return refusal('A torque is not a finite number.')
    f[node] = (f[node] ?? 0) + T
  }
  const m = segments.map(() => ({ m1: 0, m2: 0, drop: 0 }))
  for (const { segment, m1, m2 } of load.distributed) {
    const held = m[segment]
    if (!held) return refusal(`A distributed torque stands on segment ${segment + 1}, which the bar does not have.`)
    if (!Number.isFinite(m1) || !Number.isFinite(m2)) return refusal('A distributed torque is not a finite number.')
    held.m1 += m1
    held.m2 += m2
  }
  // With both ends held, the far end turns by the twist of what has been gathered; the end actions undo it.
  segments.forEach((segment, e) => {
    const one = m[e]
    const k = stiff[e] ?? 0
    if (!one || (one.m1 === 0 && one.m2 === 0)) return
    one.drop = flexibilityIntegral(segment, 0, 1, part => gathered(segment.length, one.m1, one.m2, part))
    const atStart = k * one.drop
    f[e] = (f[e] ?? 0) + atStart
    f[e + 1] = (f[e + 1] ?? 0) + gathered(segment.length, one.m1, one.m2, 1) - atStart
  })
  const phi = new Float64Array(zs.length)
  solveFactorised(factor, Float64Array.from(kept, node => f[node] ?? 0)).forEach((value, i) => {
    phi[kept[i] ?? 0] = value
  })
  const ends = segments.map((_, e): SpanEnds => {
    const one = m[e] ?? { m1: 0, m2: 0, drop: 0 }
    return { phi: phi[e] ?? 0, T: (stiff[e] ?? 0) * ((phi[e + 1] ?? 0) - (phi[e] ?? 0) + one.drop), m1: one.m1, m2: one.m2 }
  })
  return finiteOrRefused({ nodes: zs.map((z, i) => ({ z, phi: phi[i] ?? 0 })), segments: ends, ...balance(solver, load, ends, phi) })

  function balance({ segments: list }: Solver, { torques }: SpanCase, run: readonly SpanEnds[], turned: Float64Array): Pick<SpanResponse, 'reactions' | 'residual'> {
    const applied = (node: number) => torques.reduce((sum, one) => (one.node === node ? sum + one.T : sum), 0)
    const leaving = (node: number) => (run[node] ? run[node].T : 0)
    const arriving = (node: number) => {
      const [one, segment] = [run[node - 1], list[node - 1]]
      return one && segment ? one.T - gathered(segment.length, one.m1, one.m2, 1) : 0
    }
    const reactions = supports.map(({ node, stiffness }) => ({ node, torque: stiffness === 'rigid' ? arriving(node) - leaving(node) - applied(node) : -stiffness * (turned[node] ?? 0) }))
    const all = [...torques.map(one => one.T), ...run.map((one, e) => gathered(list[e]?.length ?? 0, one.m1, one.m2, 1)), ...reactions.map(one => one.torque)]
    const largest = all.reduce((high, one) => Math.max(high, Math.abs(one)), 0)
    return { reactions, residual: largest === 0 ? 0 : Math.abs(all.reduce((sum, one) => sum + one, 0)) / largest }
  }
}

function stationsOf({ segments, zs }: Solver, response: SpanResponse, partsOf: (length: number, ends: SpanEnds) => readonly number[]): SpanStation[] {
  return segments.flatMap((segment, e) => {
    const ends = response.segments[e]
    if (!ends) return []
    const torque = (part: number) => ends.T - gathered(segment.length, ends.m1, ends.m2, part)
    let [phi, reached] = [ends.phi, 0]
    return partsOf(segment.length, ends).map((part): SpanStation => {
      if (part > reached) phi += flexibilityIntegral(segment, reached, part, torque)
      reached = part
      return { z: (zs[e] ?? 0) + part * segment.length, segment: e, T: torque(part), phi, rate: torque(part) / stiffnessAt(segment, part) }
    })
  })
}

/** Parts of a segment strictly inside it at which m or T is zero, in order. */
function turningParts(length: number, { T, m1, m2 }: SpanEnds): number[] {
  // T = L (p m1 + p²/2 (m2 − m1)) at p; written so that no root is lost to cancellation.
  const [curve, own] = [(m2 - m1) / 2, T / length]
  const half = (m1 + (m1 < 0 ? -1 : 1) * Math.sqrt(m1 ** 2 + 4 * curve * own)) / 2
  return [m1 / (m1 - m2), own / half, -half / curve].filter(part => part > 0 && part < 1).sort((a, b) => a - b)
}
