/**
 * A bar along its span with restrained warping: stepped members, supports at any node, several load cases
 * (methods §3.5). Factorised once; every case is a solution of the same equations. N, mm, rad.
 * At a step continuity of φ′ is an approximation (G-19).
 */
import { factorise, solveFactorised, type Factorised } from '#shared/torsion/cholesky'
import { refusal, type Refusal } from '#shared/torsion/section'
import { memberStiffness, stateAt, uniformLoad, type Member, type MemberEnds, type MemberState, type MemberStiffness } from '#shared/torsion/warping/member'

/** What holds a node: nothing, everything, or a spring in N·mm/rad (twist) or N·mm³/rad (warping). */
export type Restraint = 'free' | 'fixed' | number
export interface Support { readonly node: number, readonly twist: Restraint, readonly warping: Restraint }

export interface BarCase {
  readonly torques: readonly { readonly node: number, readonly T: number }[]
  /** Uniform torque on a member, N·mm/mm. */
  readonly distributed: readonly { readonly member: number, readonly m: number }[]
  /** P·ω of an axial force P along +z at a point with the sectorial coordinate ω, N·mm². */
  readonly bimoments: readonly { readonly node: number, readonly B: number }[]
}

export interface Station extends MemberState { readonly z: number, readonly member: number }

export interface Reaction { readonly node: number, /** On the bar, N·mm. */ readonly torque: number, /** On the bar, in the sense of P·ω, N·mm². */ readonly bimoment: number }

export interface BarResponse {
  readonly nodes: readonly { readonly z: number, readonly phi: number, readonly rate: number }[]
  readonly members: readonly MemberEnds[]
  readonly reactions: readonly Reaction[]
  /** |Σ torques + Σ reactions| over the largest of them. */
  readonly residual: number
}

export interface WarpingBar {
  readonly ok: true
  readonly length: number
  /** kL of each member. */
  readonly u: readonly number[]
  readonly respond: (load: BarCase) => BarResponse | Refusal
  /** States at `count` equal steps of every member, both ends of each included. */
  readonly stations: (response: BarResponse, count?: number) => Station[]
}

export const mostMembers = 200
const finite = (value: number): boolean => Number.isFinite(value)
const isSpring = (value: Restraint): value is number => typeof value === 'number'

/** @returns a refusal for numbers that are none, a node that does not exist, or a bar that nothing holds against turning. */
export function warpingBar(members: readonly Member[], supports: readonly Support[]): WarpingBar | Refusal {
  const fault = unsound(members, supports)
  if (fault) return refusal(fault)
  const stiffness = members.map(memberStiffness)
  const K = assemble(stiffness, supports)
  const kept = freeUnknowns(K, stiffness, supports)
  const factor = factorScaled(K, kept)
  if (!factor) return refusal('Nothing holds the bar against turning: hold the twist of at least one node.')
  const zs = members.reduce<number[]>((at, { length }) => [...at, (at.at(-1) ?? 0) + length], [0])
  const solver: Solver = { members, supports, stiffness, K, kept, factor, zs }
  return {
    ok: true, length: zs.at(-1) ?? 0, u: stiffness.map(one => one.u),
    respond: load => respond(solver, load), stations: (response, count = 20) => stationsOf(solver, response, count),
  }
}

interface Scaled { readonly factor: Factorised, readonly scale: Float64Array }
interface Solver { readonly members: readonly Member[], readonly supports: readonly Support[], readonly stiffness: readonly MemberStiffness[], readonly K: Float64Array, readonly kept: readonly number[], readonly factor: Scaled, readonly zs: readonly number[] }

function unsound(members: readonly Member[], supports: readonly Support[]): string | null {
  if (members.length === 0) return 'The bar has no length. Add the first member.'
  if (members.length > mostMembers) return `The bar has ${members.length} members; at most ${mostMembers} can be computed.`
  for (const [i, { length, GJ, EG }] of members.entries()) {
    if (!(finite(length) && length > 0)) return `Member ${i + 1} needs a length greater than zero.`
    if (!(finite(GJ) && GJ > 0)) return `Member ${i + 1} needs a torsional stiffness GJ greater than zero.`
    if (!(finite(EG) && EG >= 0)) return `Member ${i + 1} needs a warping stiffness EΓ of zero or more.`
    if (EG > 0 && !(finite(length * Math.sqrt(GJ / EG)) && length * Math.sqrt(GJ / EG) > 1e-4)) return `Member ${i + 1} is too short for its warping stiffness to be computed with. Check its length, GJ and EΓ.`
  }
  const seen = new Set<number>()
  for (const { node, twist, warping } of supports) {
    if (!(Number.isInteger(node) && node >= 0 && node <= members.length)) return `A support stands at node ${node}, which the bar does not have.`
    if (seen.has(node)) return `Node ${node} has two supports. Keep one.`
    seen.add(node)
    if ([twist, warping].some(one => isSpring(one) && !(finite(one) && one >= 0))) return `The support at node ${node} needs stiffnesses of zero or more.`
  }
  return null
}

/** Unknowns 2i and 2i + 1 are φ and φ′ of node i. */
function assemble(stiffness: readonly MemberStiffness[], supports: readonly Support[]): Float64Array {
  const n = 2 * (stiffness.length + 1)
  const K = new Float64Array(n * n)
  const add = (i: number, j: number, value: number) => {
    K[i * n + j] = (K[i * n + j] ?? 0) + value
    if (i !== j) K[j * n + i] = (K[j * n + i] ?? 0) + value
  }
  stiffness.forEach(({ K11, K12, K22, K24 }, e) => {
    const [a, b, c, d] = [2 * e, 2 * e + 1, 2 * e + 2, 2 * e + 3]
    add(a, a, K11)
    add(a, b, K12)
    add(a, c, -K11)
    add(a, d, K12)
    add(b, b, K22)
    add(b, c, -K12)
    add(b, d, K24)
    add(c, c, K11)
    add(c, d, -K12)
    add(d, d, K22)
  })
  for (const { node, twist, warping } of supports) {
    if (isSpring(twist)) add(2 * node, 2 * node, twist)
    if (isSpring(warping)) add(2 * node + 1, 2 * node + 1, warping)
  }
  return K
}

/** Unknowns that are neither held nor without meaning: φ′ between members that do not warp has none. */
function freeUnknowns(K: Float64Array, stiffness: readonly MemberStiffness[], supports: readonly Support[]): number[] {
  const n = 2 * (stiffness.length + 1)
  const held = new Set(supports.flatMap(({ node, twist, warping }) => [...(twist === 'fixed' ? [2 * node] : []), ...(warping === 'fixed' ? [2 * node + 1] : [])]))
  return Array.from({ length: n }, (_, i) => i).filter(i => !held.has(i) && !(i % 2 === 1 && K[i * n + i] === 0))
}

/** Rows and columns scaled to a unit diagonal, so that twist and rate of twist weigh alike. */
function factorScaled(K: Float64Array, kept: readonly number[]): Scaled | null {
  const n = Math.sqrt(K.length)
  const scale = Float64Array.from(kept, i => 1 / Math.sqrt(K[i * n + i] ?? 1))
  const A = new Float64Array(kept.length ** 2)
  kept.forEach((i, a) => kept.forEach((j, b) => {
    A[a * kept.length + b] = (K[i * n + j] ?? 0) * (scale[a] ?? 1) * (scale[b] ?? 1)
  }))
  const factor = factorise(A, kept.length)
  return factor.ok ? { factor, scale } : null
}

function loadVector({ members, stiffness }: Solver, load: BarCase): Float64Array | Refusal {
  const f = new Float64Array(2 * (members.length + 1))
  const add = (i: number, value: number) => {
    f[i] = (f[i] ?? 0) + value
  }
  const nodeFault = [...load.torques, ...load.bimoments].find(({ node }) => !(Number.isInteger(node) && node >= 0 && node <= members.length))
  if (nodeFault) return refusal(`A load stands at node ${nodeFault.node}, which the bar does not have.`)
  if ([...load.torques.map(one => one.T), ...load.distributed.map(one => one.m), ...load.bimoments.map(one => one.B)].some(value => !finite(value))) return refusal('A load is not a finite number.')
  for (const { node, T } of load.torques) add(2 * node, T)
  for (const { node, B } of load.bimoments) add(2 * node + 1, -B)
  for (const { member, m } of load.distributed) {
    const one = members[member]
    if (!one) return refusal(`A distributed torque stands on member ${member + 1}, which the bar does not have.`)
    const { torque, bimoment } = uniformLoad(one, stiffness[member]?.u ?? Infinity, m)
    add(2 * member, torque)
    add(2 * member + 1, bimoment)
    add(2 * member + 2, torque)
    add(2 * member + 3, -bimoment)
  }
  return f
}

function respond(solver: Solver, load: BarCase): BarResponse | Refusal {
  const f = loadVector(solver, load)
  if (!(f instanceof Float64Array)) return f
  const { kept, factor, members, zs } = solver
  const x = solveFactorised(factor.factor, Float64Array.from(kept, (i, a) => (f[i] ?? 0) * (factor.scale[a] ?? 1)))
  const d = new Float64Array(f.length)
  kept.forEach((i, a) => {
    d[i] = (x[a] ?? 0) * (factor.scale[a] ?? 1)
  })
  const m = members.map((_, e) => load.distributed.reduce((sum, one) => (one.member === e ? sum + one.m : sum), 0))
  const ends = members.map((member, e) => memberEnds(member, solver.stiffness[e] as MemberStiffness, d, e, m[e] ?? 0))
  const reactions = reactionsOf(solver, d, f)
  const total = [...load.torques.map(one => one.T), ...members.map((member, e) => (m[e] ?? 0) * member.length)]
  const all = [...total, ...reactions.map(one => one.torque)]
  const largest = all.reduce((high, one) => Math.max(high, Math.abs(one)), 0)
  return {
    nodes: zs.map((z, i) => ({ z, phi: d[2 * i] ?? 0, rate: d[2 * i + 1] ?? 0 })), members: ends, reactions,
    residual: largest === 0 ? 0 : Math.abs(all.reduce((sum, one) => sum + one, 0)) / largest,
  }
}

/** Actions at the ends: (−T(0), B(0), T(L), −B(L)) = K d less what the distributed torque stands for. */
function memberEnds(member: Member, { u, K11, K12, K22, K24 }: MemberStiffness, d: Float64Array, e: number, m: number): MemberEnds {
  const [p1, r1, p2, r2] = [d[2 * e] ?? 0, d[2 * e + 1] ?? 0, d[2 * e + 2] ?? 0, d[2 * e + 3] ?? 0]
  const { torque, bimoment } = uniformLoad(member, u, m)
  const turned = p1 - p2
  return {
    phi: p1, rate: r1, m,
    T: -(K11 * turned + K12 * (r1 + r2)) + torque,
    B1: K12 * turned + K22 * r1 + K24 * r2 - bimoment,
    B2: -(K12 * turned + K24 * r1 + K22 * r2 + bimoment),
  }
}

/** What the supports do to the bar. */
function reactionsOf({ K, supports }: Solver, d: Float64Array, f: Float64Array): Reaction[] {
  const n = d.length
  const rest = (i: number) => {
    let sum = -(f[i] ?? 0)
    for (let j = 0; j < n; j += 1) sum += (K[i * n + j] ?? 0) * (d[j] ?? 0)
    return sum
  }
  const of = (restraint: Restraint, i: number) => (restraint === 'fixed' ? rest(i) : isSpring(restraint) ? -restraint * (d[i] ?? 0) : 0)
  return supports.map(({ node, twist, warping }) => ({ node, torque: of(twist, 2 * node), bimoment: -of(warping, 2 * node + 1) }))
}

function stationsOf({ members, stiffness, zs }: Solver, response: BarResponse, count: number): Station[] {
  return members.flatMap((member, e) => {
    const ends = response.members[e]
    if (!ends) return []
    return Array.from({ length: count + 1 }, (_, i) => {
      const z = member.length * i / count
      return { z: (zs[e] ?? 0) + z, member: e, ...stateAt(member, stiffness[e]?.u ?? Infinity, ends, z) }
    })
  })
}
