/** The run of twist, bimoment and torque along a solved bar, and where they are largest. N, mm, rad. */
import { SHAPE, writeShape, writeState, type MemberEnds, type StateArrays } from '#shared/torsion/warping/member'
import type { Prepared } from '#shared/torsion/warping/bar-equations'

/** Equal steps of every member. */
const STEPS = 20
/** Distances from the ends over 1/k at which a member that is long against 1/k is looked at as well. */
const LAYER = [0.25, 0.5, 1, 1.5, 2, 3, 4, 6, 8]

/** Places of all stations, both ends of every member among them, with what each end and load gives there. */
export interface StationPlan { readonly members: readonly Prepared[], readonly start: Float64Array, readonly member: Int32Array, readonly z: Float64Array, readonly shape: Float64Array, /** Room for the state of one place, used again for each: there are thousands. */ readonly room: { readonly shape: Float64Array, readonly out: StateArrays } }

export interface BarRun extends StateArrays { readonly plan: StationPlan, /** Largest gap of twist between members that meet, over the largest twist: rounding. */ readonly closure: number }

function placesOf({ member: { length }, u, k }: Prepared): number[] {
  const equal = Array.from({ length: STEPS + 1 }, (_, i) => length * i / STEPS)
  if (!(u / STEPS > 0.5 && u < Infinity)) return equal
  const layer = LAYER.map(d => d / k).filter(d => d < length / 2).flatMap(d => [d, length - d])
  return [...new Set([...equal, ...layer])].sort((a, b) => a - b)
}

export function planStations(members: readonly Prepared[]): StationPlan {
  const places = members.map(placesOf)
  const count = places.reduce((sum, one) => sum + one.length, 0)
  const plan = { members, start: new Float64Array(members.length), member: new Int32Array(count), z: new Float64Array(count), shape: new Float64Array(SHAPE * count), room: { shape: new Float64Array(SHAPE), out: states(1) } }
  let [i, start] = [0, 0]
  members.forEach(({ member, u }, e) => {
    plan.start[e] = start
    for (const z of places[e] ?? []) {
      plan.member[i] = e
      plan.z[i] = z
      writeShape(member, u, z, plan.shape, SHAPE * i)
      i += 1
    }
    start += member.length
  })
  return plan
}

/** In one piece of memory: each piece costs as much as it holds. */
function states(count: number): StateArrays {
  const all = new Float64Array(5 * count)
  const part = (i: number) => all.subarray(i * count, (i + 1) * count)
  return { phi: part(0), rate: part(1), B: part(2), T: part(3), Tw: part(4) }
}

/** The states of one load case at all stations. */
export function runOf(plan: StationPlan, ends: readonly MemberEnds[], phi: Float64Array): BarRun {
  const out = states(plan.z.length)
  let [gap, largest] = [0, 0]
  for (let i = 0; i < plan.z.length; i += 1) {
    const e = plan.member[i] as number
    const { member, u } = plan.members[e] as Prepared
    writeState(member, u, ends[e] as MemberEnds, plan.z[i] as number, plan.shape, SHAPE * i, out, i)
    largest = Math.max(largest, Math.abs(out.phi[i] as number))
    if (plan.member[i + 1] !== e) gap = Math.max(gap, Math.abs((out.phi[i] as number) - (phi[e + 1] as number)))
  }
  return { ...out, plan, closure: largest === 0 ? 0 : gap / largest }
}

export interface Place { /** From the start of the bar, mm. */ readonly z: number, readonly member: number, readonly phi: number, readonly rate: number, readonly B: number, readonly T: number, readonly Tsv: number, readonly Tw: number }

/** The state of station i. */
export function placeOf({ plan, phi, rate, B, T, Tw }: BarRun, i: number): Place {
  const e = plan.member[i] as number
  const torque = T[i] as number
  return { z: (plan.start[e] as number) + (plan.z[i] as number), member: e, phi: phi[i] as number, rate: rate[i] as number, B: B[i] as number, T: torque, Tsv: torque - (Tw[i] as number), Tw: Tw[i] as number }
}

/** The state at z of a member. */
export function stateWithin(plan: StationPlan, ends: readonly MemberEnds[], e: number, z: number): Place {
  const { member, u } = plan.members[e] as Prepared
  const { shape, out } = plan.room
  shape.fill(0)
  writeShape(member, u, z, shape, 0)
  writeState(member, u, ends[e] as MemberEnds, z, shape, 0, out, 0)
  const [T, Tw] = [out.T[0] as number, out.Tw[0] as number]
  return { z: (plan.start[e] as number) + z, member: e, phi: out.phi[0] as number, rate: out.rate[0] as number, B: out.B[0] as number, T, Tsv: T - Tw, Tw }
}

export type Quantity = 'phi' | 'rate' | 'B' | 'T' | 'Tw'
export type Peaks = Readonly<Record<Quantity, Place>>

/** What has its zero where the quantity has its extreme, from the state there and the distributed torque m. */
function slopeOf(quantity: Quantity, k: number, m: number, rate: number, B: number, Tw: number): number {
  if (quantity === 'phi') return rate
  if (quantity === 'rate') return B
  if (quantity === 'B') return Tw
  return quantity === 'T' ? m : k * k * B - m
}

const loadAt = ({ member: { length } }: Prepared, { m1, m2 }: MemberEnds, z: number): number => m1 + (m2 - m1) * z / length

function slopeAtStation({ plan, rate, B, Tw }: BarRun, ends: readonly MemberEnds[], quantity: Quantity, i: number): number {
  const e = plan.member[i] as number
  const one = plan.members[e] as Prepared
  return slopeOf(quantity, one.k, loadAt(one, ends[e] as MemberEnds, plan.z[i] as number), rate[i] as number, B[i] as number, Tw[i] as number)
}

/** Within this of the largest station, an extreme between stations may still be the largest. */
const NEARLY = 0.97

/** The largest magnitude of each quantity along the bar; between stations it is found where its slope is zero. */
export function peaksOf(run: BarRun, ends: readonly MemberEnds[]): Peaks {
  const of = (quantity: Quantity) => peakOf(run, ends, quantity)
  return { phi: of('phi'), rate: of('rate'), B: of('B'), T: of('T'), Tw: of('Tw') }
}

function peakOf(run: BarRun, ends: readonly MemberEnds[], quantity: Quantity): Place {
  const values = run[quantity]
  let top = 0
  for (let i = 1; i < values.length; i += 1) if (Math.abs(values[i] as number) > Math.abs(values[top] as number)) top = i
  let best = placeOf(run, top)
  const least = NEARLY * Math.abs(values[top] as number)
  const { member } = run.plan
  for (let i = 0; i + 1 < values.length; i += 1) {
    if (member[i] !== member[i + 1] || Math.max(Math.abs(values[i] as number), Math.abs(values[i + 1] as number)) < least) continue
    const found = turnBetween(run, ends, quantity, i)
    if (found && Math.abs(found[quantity]) > Math.abs(best[quantity])) best = found
  }
  return best
}

/** The place between stations i and i + 1 where the slope changes sign, by Illinois's rule; null where it does not. */
function turnBetween(run: BarRun, ends: readonly MemberEnds[], quantity: Quantity, i: number): Place | null {
  let [below, above] = [slopeAtStation(run, ends, quantity, i), slopeAtStation(run, ends, quantity, i + 1)]
  if (!(below * above < 0)) return null
  const { plan } = run
  const e = plan.member[i] as number
  const [one, own] = [plan.members[e] as Prepared, ends[e] as MemberEnds]
  let [low, high] = [plan.z[i] as number, plan.z[i + 1] as number]
  const size = Math.abs(below - above)
  for (let step = 0; step < 60; step += 1) {
    const z = (low * above - high * below) / (above - below)
    const at = stateWithin(plan, ends, e, z)
    const value = slopeOf(quantity, one.k, loadAt(one, own, z), at.rate, at.B, at.Tw)
    if (Math.abs(value) <= 1e-13 * size || Math.abs(high - low) <= 1e-13 * one.member.length) return at
    // The end that stays twice counts half.
    if (value * above < 0) [low, below] = [high, above]
    else below /= 2
    high = z
    above = value
  }
  return null
}
