/**
 * The equations of a bar with restrained warping: at each node T and B on its left, φ, φ′, T and B on its right;
 * between them what the supports do and the exact relations of the members. They lie in a narrow band.
 */
import { bandedMatrix, factoriseBand, solveBand, type Banded, type FactorisedBand } from '#shared/torsion/banded'
import { decayOf, memberRelations, type Member, type MemberEnds, type Relations } from '#shared/torsion/warping/member'

/** What holds a node: nothing, everything, or a spring in N·mm/rad (twist) or N·mm³/rad (warping). */
export type Restraint = 'free' | 'fixed' | number
export interface Support { readonly node: number, readonly twist: Restraint, readonly warping: Restraint }

/** What acts on a bar, gathered by node and by member. */
export interface GatheredLoad { readonly T: Float64Array, readonly B: Float64Array, readonly m1: Float64Array, readonly m2: Float64Array }

/** A member with what its equations are made of. */
export interface Prepared { readonly member: Member, readonly u: number, /** 1/mm */ readonly k: number, readonly relations: Relations }

export interface BarEquations {
  readonly members: readonly Prepared[]
  readonly supports: readonly Support[]
  readonly factor: FactorisedBand
  readonly rowScale: Float64Array
  readonly unknownScale: Float64Array
}

/** Unknowns of a node, in their order. */
const [T_LEFT, B_LEFT, PHI, RATE, T_RIGHT, B_RIGHT] = [0, 1, 2, 3, 4, 5]
const PER_NODE = 6
const REACH = 5

const prepare = (member: Member): Prepared => {
  const u = decayOf(member)
  return { member, u, k: u / member.length, relations: memberRelations(Math.min(u, 1e300)) }
}

/** Exact factors: scaling by powers of two rounds nothing, and equal entries still cancel. */
const powerOfTwo = (value: number): number => 2 ** Math.round(Math.log2(value))

/** Twist 1; rate, torque and bimoment of the size that goes with it. */
function unknownScales(members: readonly Prepared[]): Float64Array {
  const length = powerOfTwo(members.reduce((sum, { member }) => sum + member.length, 0) / members.length)
  const bimoment = powerOfTwo(members.reduce((high, { member: { GJ, EG } }) => Math.max(high, GJ, EG / length ** 2), 0))
  return Float64Array.from([bimoment / length, bimoment, 1, 1 / length, bimoment / length, bimoment])
}

/** Null where the equations have no solution. */
export function barEquations(list: readonly Member[], supports: readonly Support[]): BarEquations | null {
  const members = list.map(prepare)
  const n = PER_NODE * (members.length + 1)
  const matrix = bandedMatrix(n, REACH, REACH)
  const scale = unknownScales(members)
  const rowScale = new Float64Array(n).fill(1)
  const put = (row: number, entries: readonly (readonly [number, number])[]) => {
    const scaled = entries.map(([column, value]) => [column, value * (scale[column % PER_NODE] as number)] as const)
    rowScale[row] = 1 / powerOfTwo(scaled.reduce((high, [, value]) => Math.max(high, Math.abs(value)), 0))
    for (const [column, value] of scaled) add(matrix, row, column, value * (rowScale[row] as number))
  }
  put(0, [[T_LEFT, 1]])
  put(1, [[B_LEFT, 1]])
  for (let node = 0; node <= members.length; node += 1) putNode(put, node, supports.find(one => one.node === node), warps(members, node))
  members.forEach((one, e) => {
    putMember(put, PER_NODE * e, one)
  })
  put(n - 2, [[n - 2, 1]])
  put(n - 1, [[n - 1, 1]])
  const factor = factoriseBand(matrix)
  return factor.ok ? { members, supports, factor, rowScale, unknownScale: scale } : null
}

type Put = (row: number, entries: readonly (readonly [number, number])[]) => void

function add({ stride, offset, entries }: Banded, row: number, column: number, value: number): void {
  entries[column * stride + offset + row - column] = value
}

/** Whether a member that warps meets this node: else φ′ has no meaning there. */
export const warps = (members: readonly Prepared[], node: number): boolean => [members[node - 1], members[node]].some(one => one !== undefined && one.u !== Infinity)

/** T on the left less T on the right is what is applied and what the support gives; so it is with B. */
function putNode(put: Put, node: number, support: Support | undefined, warping: boolean): void {
  const o = PER_NODE * node
  const [twist, held] = [support?.twist ?? 'free', support?.warping ?? 'free']
  if (twist === 'fixed') put(o + 2, [[o + PHI, 1]])
  else put(o + 2, [[o + T_LEFT, 1], [o + T_RIGHT, -1], ...(twist === 'free' ? [] : [[o + PHI, twist] as const])])
  if (held === 'fixed' || !warping) put(o + 3, [[o + RATE, 1]])
  else put(o + 3, [[o + B_LEFT, 1], [o + B_RIGHT, -1], ...(held === 'free' ? [] : [[o + RATE, -held] as const])])
}

function putMember(put: Put, o: number, { member: { length, GJ }, u, k, relations }: Prepared): void {
  const next = o + PER_NODE
  const [phi1, rate1, T1, B1, T2, B2, phi2, rate2] = [o + PHI, o + RATE, o + T_RIGHT, o + B_RIGHT, next + T_LEFT, next + B_LEFT, next + PHI, next + RATE]
  if (u === Infinity) {
    put(o + 4, [[B1, 1]])
    put(o + 5, [[B2, 1]])
  } else {
    const { even, odd } = relations
    put(o + 4, [[rate1, -1], [rate2, 1], [B1, even * k / GJ], [B2, even * k / GJ]])
    put(o + 5, [[phi1, -1], [phi2, 1], [rate1, -length / 2], [rate2, -length / 2], [B1, odd / GJ], [B2, -odd / GJ]])
  }
  // The torque over the length, with φ₂ − φ₁ put in from the second relation: a small change of twist is not taken between large twists.
  if (u === Infinity) put(o + 6, [[T1, length], [phi1, GJ], [phi2, -GJ]])
  else put(o + 6, [[T1, length], [rate1, -GJ * length / 2], [rate2, -GJ * length / 2], [B1, 1 + relations.odd], [B2, -1 - relations.odd]])
  put(o + 7, [[T1, 1], [T2, -1]])
}

export interface BarSolution {
  readonly ends: readonly MemberEnds[]
  readonly phi: Float64Array
  readonly rate: Float64Array
  /** What each node takes from its support, N·mm and N·mm², on the bar; the bimoment in the sense of P·ω. */
  readonly torque: Float64Array
  readonly bimoment: Float64Array
}

/** One load case. */
export function solveBar({ members, supports, factor, rowScale, unknownScale }: BarEquations, load: GatheredLoad): BarSolution {
  const nodes = members.length + 1
  const b = new Float64Array(PER_NODE * nodes)
  const put = (row: number, value: number) => {
    b[row] = value * (rowScale[row] as number)
  }
  members.forEach(({ member: { length, GJ }, u, k, relations }, e) => {
    const [m1, m2] = [load.m1[e] as number, load.m2[e] as number]
    if (m1 === 0 && m2 === 0) return
    const o = PER_NODE * e
    if (u !== Infinity) {
      put(o + 4, -relations.evenLoad * (m1 + m2) / (k * GJ))
      put(o + 5, -relations.oddLoad * (m1 - m2) / (k * k * GJ))
    }
    put(o + 6, length * length * (2 * m1 + m2) / 6 - (u === Infinity ? 0 : relations.oddLoad * (m1 - m2) / (k * k)))
    put(o + 7, length * (m1 + m2) / 2)
  })
  load.T.forEach((torque, node) => {
    put(PER_NODE * node + 2, torque)
    put(PER_NODE * node + 3, load.B[node] as number)
  })
  // What acts where a node is held goes into the support and moves nothing.
  for (const { node, twist, warping } of supports) {
    if (twist === 'fixed') put(PER_NODE * node + 2, 0)
    if (warping === 'fixed') put(PER_NODE * node + 3, 0)
  }
  return read(members, solveBand(factor, b), unknownScale, load)
}

function read(members: readonly Prepared[], x: Float64Array, scale: Float64Array, { T, B, m1, m2 }: GatheredLoad): BarSolution {
  const of = (node: number, what: number) => (x[PER_NODE * node + what] as number) * (scale[what] as number)
  const all = (value: (node: number) => number) => {
    const list = new Float64Array(members.length + 1)
    for (let node = 0; node < list.length; node += 1) list[node] = value(node)
    return list
  }
  return {
    ends: members.map(({ member, u }, e) => {
      const torque = of(e, T_RIGHT)
      return { phi: of(e, PHI), rate: u === Infinity ? torque / member.GJ : of(e, RATE), T: torque, B1: of(e, B_RIGHT), B2: of(e + 1, B_LEFT), m1: m1[e] as number, m2: m2[e] as number }
    }),
    phi: all(node => of(node, PHI)), rate: all(node => of(node, RATE)),
    torque: all(node => of(node, T_LEFT) - of(node, T_RIGHT) - (T[node] as number)),
    bimoment: all(node => of(node, B_LEFT) - of(node, B_RIGHT) - (B[node] as number)),
  }
}
