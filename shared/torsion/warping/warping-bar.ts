/**
 * A bar along its span with restrained warping: stepped members, supports at any node, several load cases
 * (methods §3.5). Factorised once; every case is a solution of the same equations. N, mm, rad.
 * At a step continuity of φ′ is an approximation (G-19).
 */
import { refusal, type Refusal } from '#shared/torsion/section'
import { barEquations, solveBar, warps, type BarEquations, type GatheredLoad, type Restraint, type Support } from '#shared/torsion/warping/bar-equations'
import { peaksOf, placeOf, planStations, runOf, stateWithin, type BarRun, type Peaks, type Place, type StationPlan } from '#shared/torsion/warping/bar-run'
import type { Member, MemberEnds } from '#shared/torsion/warping/member'

export type { BarRun, Peaks, Place, Restraint, Support }

export interface BarCase {
  readonly torques: readonly { readonly node: number, readonly T: number }[]
  /** Torque on a member, N·mm/mm: `m` at its start, running linearly to `mEnd` at its end; uniform where that is absent. */
  readonly distributed: readonly { readonly member: number, readonly m: number, readonly mEnd?: number }[]
  /** P·ω of an axial force P along +z at a point with the sectorial coordinate ω, N·mm². */
  readonly bimoments: readonly { readonly node: number, readonly B: number }[]
}

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
  /** States at 20 equal steps of every member and in the layers at its ends, both sides of every node included. */
  readonly run: (response: BarResponse) => BarRun
  /** The same as a list. */
  readonly stations: (response: BarResponse) => Place[]
  /** The state at any z from the start of the bar; at a node, that on its right. */
  readonly stateAt: (response: BarResponse, z: number) => Place | Refusal
  /** Where φ, φ′, B, T and T_ω are largest, between stations as well. */
  readonly peaks: (response: BarResponse, run?: BarRun) => Peaks
}

export const mostMembers = 200
const finite = (value: number): boolean => Number.isFinite(value)
const isSpring = (value: Restraint): value is number => typeof value === 'number'
const holds = (value: Restraint): boolean => value === 'fixed' || (isSpring(value) && value > 0)

/** @returns a refusal for numbers that are none, a node that does not exist, or a bar that nothing holds against turning. */
export function warpingBar(members: readonly Member[], supports: readonly Support[]): WarpingBar | Refusal {
  const fault = unsound(members, supports)
  if (fault) return refusal(fault)
  if (!supports.some(({ twist }) => holds(twist))) return refusal('Nothing holds the bar against turning: hold the twist of at least one node.')
  const equations = barEquations(members, supports)
  if (!equations) return refusal('The bar cannot be computed: its stiffnesses differ too much. Check lengths, GJ, EΓ and the springs.')
  const plan = planStations(equations.members)
  const solver: Solver = { equations, plan, zs: members.reduce<number[]>((at, { length }) => [...at, (at.at(-1) ?? 0) + length], [0]) }
  const run = (response: BarResponse) => runOf(plan, response.members, Float64Array.from(response.nodes, one => one.phi))
  return {
    ok: true, length: solver.zs.at(-1) ?? 0, u: equations.members.map(one => one.u), run,
    respond: load => respond(solver, load),
    stations: (response) => {
      const all = run(response)
      return Array.from(plan.z, (_, i) => placeOf(all, i))
    },
    stateAt: (response, z) => stateAt(solver, response, z),
    peaks: (response, known) => peaksOf(known ?? run(response), response.members),
  }
}

interface Solver { readonly equations: BarEquations, readonly plan: StationPlan, readonly zs: readonly number[] }

function unsound(members: readonly Member[], supports: readonly Support[]): string | null {
  if (members.length === 0) return 'The bar has no length. Add the first member.'
  if (members.length > mostMembers) return `The bar has ${members.length} members; at most ${mostMembers} can be computed.`
  for (const [i, { length, GJ, EG }] of members.entries()) {
    if (!(finite(length) && length > 0)) return `Member ${i + 1} needs a length greater than zero.`
    if (!(finite(GJ) && GJ > 0)) return `Member ${i + 1} needs a torsional stiffness GJ greater than zero.`
    if (!(finite(EG) && EG >= 0)) return `Member ${i + 1} needs a warping stiffness EΓ of zero or more.`
    if (EG > 0 && !soundDecay(length * Math.sqrt(GJ / EG))) return `Member ${i + 1} is too short or too long for its warping stiffness to be computed with. Check its length, GJ and EΓ.`
  }
  return unsoundSupport(members.length, supports)
}

/** Far beyond any real bar, and within what numbers hold. */
const soundDecay = (u: number): boolean => u > 1e-6 && u < 1e9

function unsoundSupport(last: number, supports: readonly Support[]): string | null {
  const seen = new Set<number>()
  for (const { node, twist, warping } of supports) {
    if (!isNode(node, last)) return `A support stands at node ${node}, which the bar does not have.`
    if (seen.has(node)) return `Node ${node} has two supports. Keep one.`
    seen.add(node)
    if ([twist, warping].some(one => isSpring(one) && !(finite(one) && one >= 0))) return `The support at node ${node} needs stiffnesses of zero or more.`
  }
  return null
}

const isNode = (node: number, last: number): boolean => Number.isInteger(node) && node >= 0 && node <= last

/** The sums of what acts at each node and on each member, or why it cannot. */
function gather({ equations: { members } }: Solver, { torques, distributed, bimoments }: BarCase): GatheredLoad | Refusal {
  const nodes = members.length + 1
  const load = { T: new Float64Array(nodes), B: new Float64Array(nodes), m1: new Float64Array(members.length), m2: new Float64Array(members.length) }
  const add = (to: Float64Array, i: number, value: number) => {
    to[i] = (to[i] as number) + value
  }
  for (const { node } of [...torques, ...bimoments]) if (!isNode(node, members.length)) return refusal(`A load stands at node ${node}, which the bar does not have.`)
  for (const { member } of distributed) if (!members[member]) return refusal(`A distributed torque stands on member ${member + 1}, which the bar does not have.`)
  for (const { node, B } of bimoments) if (B !== 0 && !warps(members, node)) return refusal(`The bimoment at node ${node} meets no member that warps. Leave it out, or give the member its EΓ.`)
  for (const { node, T } of torques) add(load.T, node, T)
  for (const { node, B } of bimoments) add(load.B, node, B)
  for (const { member, m, mEnd } of distributed) {
    add(load.m1, member, m)
    add(load.m2, member, mEnd ?? m)
  }
  return Object.values(load).every(list => list.every(finite)) ? load : refusal('A load is not a finite number.')
}

function respond(solver: Solver, acting: BarCase): BarResponse | Refusal {
  const load = gather(solver, acting)
  if ('ok' in load) return load
  const { equations: { members, supports }, zs } = solver
  const solution = solveBar(solver.equations, load)
  if (![solution.phi, solution.torque, solution.bimoment].every(list => list.every(finite)) || !solution.ends.every(one => Object.values(one).every(finite))) return refusal('The loads are too large, or the supports too soft, for the twist to be computed. Check them.')
  const reactions = supports.map(({ node }) => ({ node, torque: solution.torque[node] as number, bimoment: warps(members, node) ? solution.bimoment[node] as number : 0 }))
  return {
    nodes: zs.map((z, i) => ({ z, phi: solution.phi[i] as number, rate: rateAt(solution, members, i) })),
    members: solution.ends, reactions, residual: outOfBalance(solver, load, reactions),
  }
}

/** φ′ of a node; between members that do not warp, that on its right. */
function rateAt({ ends, rate }: ReturnType<typeof solveBar>, members: BarEquations['members'], i: number): number {
  if (warps(members, i)) return rate[i] as number
  const [left, right] = [members[i - 1], ends[i]]
  if (right) return right.rate
  const last = ends[i - 1]
  return left && last ? (last.T - (last.m1 + last.m2) * left.member.length / 2) / left.member.GJ : 0
}

function outOfBalance({ equations: { members } }: Solver, { T, m1, m2 }: GatheredLoad, reactions: readonly Reaction[]): number {
  let [sum, largest] = [0, 0]
  const count = (value: number) => {
    sum += value
    largest = Math.max(largest, Math.abs(value))
  }
  T.forEach(count)
  members.forEach(({ member: { length } }, e) => {
    count(length * ((m1[e] as number) + (m2[e] as number)) / 2)
  })
  for (const { torque } of reactions) count(torque)
  return largest === 0 ? 0 : Math.abs(sum) / largest
}

function stateAt({ plan, zs }: Solver, response: BarResponse, z: number): Place | Refusal {
  const length = zs.at(-1) ?? 0
  if (!(z >= 0 && z <= length)) return refusal('The place does not lie on the bar.')
  const e = Math.min(zs.length - 2, Math.max(0, zs.findLastIndex(start => start <= z)))
  return stateWithin(plan, response.members, e, z - (zs[e] ?? 0))
}
