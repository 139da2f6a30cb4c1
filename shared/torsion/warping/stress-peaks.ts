/**
 * The largest stresses of each wall along the whole bar: normal and shear at the same fibre and the same station
 * (methods §3.3, §7.4), found between stations as well. MPa.
 */
import { placeOf, stateWithin, type BarRun, type Place } from '#shared/torsion/warping/bar-run'
import type { MemberEnds } from '#shared/torsion/warping/member'
import { fibreStress, type Fibre } from '#shared/torsion/warping/sectorial-run'

/** Fibres judged together, mostly those of one wall, with the strengths of their material for the circle rule. */
export interface FibreGroup { readonly fibres: readonly Fibre[], /** MPa; null where there is none. */ readonly normal: number | null, readonly shear: number | null }

/** Largest |σ|; largest shear stress at a face; √(σ² + 3τ²); √((σ/F_n)² + (τ/F_s)²), zero without strengths. */
export type Measure = 'sigma' | 'tau' | 'mises' | 'circle'
export const measures: readonly Measure[] = ['sigma', 'tau', 'mises', 'circle']

export interface StressPeak { readonly value: number, readonly place: Place, readonly fibre: Fibre }
export type StressPeaks = Readonly<Record<Measure, StressPeak>>

/** Squares of the measures are a·σ² + b·τ²: a and b of each measure in turn. */
type Weights = Float64Array
const weightsOf = ({ normal, shear }: FibreGroup): Weights =>
  Float64Array.from([1, 0, 0, 1, 1, 3, ...(normal === null || shear === null ? [0, 0] : [normal ** -2, shear ** -2])])

/** A group as flat numbers: σ = |ω·B/Γ + axial|·w + across·|B/Γ|, τ = G t|φ′| + |T_ω/Γ|·s. */
interface Flat { readonly omega: Float64Array, readonly across: Float64Array, readonly weight: Float64Array, readonly twist: Float64Array, readonly flow: Float64Array, readonly most: readonly [omega: number, weight: number, twist: number, flow: number] }

function flatten(fibres: readonly Fibre[]): Flat {
  const list = (value: (fibre: Fibre) => number) => Float64Array.from(fibres, value)
  const top = (values: Float64Array) => values.reduce((high, value) => Math.max(high, Math.abs(value)), 0)
  const [omega, across, weight, twist, flow] = [list(f => f.weight * f.omega), list(f => f.weight * f.across), list(f => f.weight), list(f => f.G * f.t), list(f => Math.abs(f.S) / f.t)]
  return { omega, across, weight, twist, flow, most: [top(Float64Array.from(fibres, f => f.weight * (Math.abs(f.omega) + f.across))), top(weight), top(twist), top(flow)] }
}

export interface StressCase { readonly run: BarRun, readonly ends: readonly MemberEnds[], readonly gamma: number, /** Mean stress of an axial force on the reference modulus, MPa. */ readonly axial: number }

/** Prepared once for a section, asked for each case. */
export function stressPeaks(groups: readonly FibreGroup[]): (inCase: StressCase) => StressPeaks[] {
  const prepared = groups.map(group => ({ group, flat: flatten(group.fibres), weights: weightsOf(group) }))
  return inCase => prepared.map(({ group, flat, weights }) => peaksOfGroup(inCase, group, flat, weights))
}

/** Squares, with the station and fibre they stand at. */
interface Found { readonly square: number[], readonly station: number[], readonly fibre: number[] }

function peaksOfGroup(inCase: StressCase, group: FibreGroup, flat: Flat, weights: Weights): StressPeaks {
  const found: Found = { square: [-1, -1, -1, -1], station: [0, 0, 0, 0], fibre: [0, 0, 0, 0] }
  const { run: { B, Tw, rate }, gamma, axial } = inCase
  const per = gamma === 0 ? 0 : 1 / gamma
  const look = (i: number) => {
    const stretch = (B[i] as number) * per
    const slip = Math.abs(Tw[i] as number) * per
    const turn = Math.abs(rate[i] as number)
    if (canExceed(flat.most, weights, found.square, Math.abs(stretch), slip, turn, Math.abs(axial))) scan(flat, weights, found, i, stretch, slip, turn, axial)
  }
  // The worst station of each of three actions first: what stands elsewhere then seldom exceeds what is known.
  for (const i of [largestOf(B), largestOf(rate), largestOf(Tw)]) look(i)
  for (let i = 0; i < B.length; i += 1) look(i)
  const peak = (m: number): StressPeak => refined(inCase, group.fibres[found.fibre[m] as number] as Fibre, weights, m, found.station[m] as number)
  return { sigma: peak(0), tau: peak(1), mises: peak(2), circle: peak(3) }
}

function largestOf(values: Float64Array): number {
  let top = 0
  for (let i = 1; i < values.length; i += 1) if (Math.abs(values[i] as number) > Math.abs(values[top] as number)) top = i
  return top
}

/** Whether any fibre of the group could be worse here than the worst so far: most stations need no closer look. */
function canExceed(most: Flat['most'], weights: Weights, square: readonly number[], stretch: number, slip: number, turn: number, axial: number): boolean {
  const sigma = most[0] * stretch + most[1] * axial
  const tau = most[2] * turn + most[3] * slip
  for (let m = 0; m < 4; m += 1) {
    if ((weights[2 * m] as number) * sigma * sigma + (weights[2 * m + 1] as number) * tau * tau > (square[m] as number)) return true
  }
  return false
}

function scan({ omega, across, weight, twist, flow }: Flat, weights: Weights, { square, station, fibre }: Found, i: number, stretch: number, slip: number, turn: number, axial: number): void {
  for (let f = 0; f < omega.length; f += 1) {
    const sigma = Math.abs((omega[f] as number) * stretch + (weight[f] as number) * axial) + (across[f] as number) * Math.abs(stretch)
    const tau = (twist[f] as number) * turn + (flow[f] as number) * slip
    for (let m = 0; m < 4; m += 1) {
      const value = (weights[2 * m] as number) * sigma * sigma + (weights[2 * m + 1] as number) * tau * tau
      if (value <= (square[m] as number)) continue
      square[m] = value
      station[m] = i
      fibre[m] = f
    }
  }
}

/** Three steps along parabolas leave an error far below the scatter of anything measured. */
const STEPS = 3

/** The measure at a place of the bar. */
function measured({ gamma, axial }: StressCase, fibre: Fibre, weights: Weights, m: number, { B, Tw, rate }: Place): number {
  const { sigma, tauSv, tauOmega } = fibreStress(fibre, gamma, { B, Tw, rate, axial })
  return Math.sqrt((weights[2 * m] as number) * sigma ** 2 + (weights[2 * m + 1] as number) * (tauSv + tauOmega) ** 2)
}

/** The largest between the neighbours of a station inside a member; a station at a node stands as it is. */
function refined(inCase: StressCase, fibre: Fibre, weights: Weights, m: number, i: number): StressPeak {
  const { run, ends } = inCase
  const { plan: { member, z } } = run
  const value = (place: Place) => measured(inCase, fibre, weights, m, place)
  let place = placeOf(run, i)
  let best = value(place)
  if (member[i - 1] !== member[i] || member[i + 1] !== member[i]) return { value: best, place, fibre }
  let points = [i - 1, i, i + 1].map(j => ({ z: z[j] as number, value: value(placeOf(run, j)) }))
  for (let step = 0; step < STEPS; step += 1) {
    const turn = vertex(points)
    if (turn === null) break
    const at = stateWithin(run.plan, ends, member[i] as number, turn)
    const found = value(at)
    if (found > best) [best, place] = [found, at]
    points = [...points, { z: turn, value: found }].sort((p, q) => q.value - p.value).slice(0, 3)
  }
  return { value: best, place, fibre }
}

/** Top of the parabola through three points; null where it has none between them. */
function vertex(points: readonly { z: number, value: number }[]): number | null {
  const [p, q, r] = [...points].sort((a, b) => a.z - b.z)
  if (!p || !q || !r) return null
  const [left, right] = [(q.z - p.z) * (q.value - r.value), (q.z - r.z) * (q.value - p.value)]
  const z = q.z - ((q.z - p.z) * left - (q.z - r.z) * right) / (2 * (left - right))
  return z > p.z && z < r.z && z !== q.z ? z : null
}
