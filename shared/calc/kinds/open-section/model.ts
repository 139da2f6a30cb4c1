/** The section as numbers: N, mm, MPa, rad, °C. Made by `parse`, read by everything after it. */
import type { LoadLevel } from '#shared/calc/types'
import type { Dimension, UnitId } from '#shared/units/units'

/** A number with the unit it was typed in, so that results may be shown the way their input was. */
export interface Measured { value: number, unit: UnitId, typed: string }

export interface ModelNode { id: string, x: number, y: number }
export interface ModelWall {
  id: string, name: string, from: string, to: string
  t: Measured, G: number, E: number | null, material: MaterialModel
  /** Radius, sweep (positive counter-clockwise from `from` to `to`) and start tangent of an arc. */
  arc?: { radius: number, sweep: number, direction: number }
  /** Directions of the mid-line as it leaves `from` and as it arrives at `to`, rad. */
  startDirection: number
  endDirection: number
  /** Mid-line length between nodes. */
  length: number
  /** What was typed for the length or radius, for the dimension on the sketch. */
  lengthTyped: string | null
}
export interface ModelJunction { node: string, radius: Measured, make: 'machined' | 'bent' }

/** A wall end declared to meet a node that stands elsewhere, or closing a loop (gap within tolerance). */
export interface Seam { wall: string, node: string, gap: number, size: number }

export interface KnockdownPoint { temperature: number, factor: number }
export interface MaterialModel {
  id: string, name: string, family: 'aluminium' | 'other'
  specification: string, form: string, basis: 'A' | 'B' | 'S' | 'none', loadPath: 'single' | 'redundant', source: string, edition: string
  E: number | null, G: number, nu: number | null
  Ftu: number | null, Fty: number | null, Fsu: number | null
  /** Shear yield: given, or Fty/√3; null where neither exists. */
  Fsy: number | null
  FsyGiven: boolean
  temperatureFrom: number | null, temperatureTo: number | null
  knockdown: KnockdownPoint[]
  knockdownSource: string
  units: { E: UnitId, G: UnitId, strength: UnitId }
}

export interface CaseModel {
  id: string, title: string, source: string, level: LoadLevel
  /** Exactly one of the two is given. */
  torque: Measured | null
  rate: Measured | null
  temperature: Measured | null
}

export interface FactorModel {
  ultimate: number
  specials: { name: 'fitting' | 'casting' | 'bearing', value: number }[]
  /** Highest special factor, at least one. */
  special: number
  specialAtLimit: number
  onLimit: boolean
  divideUltimate: boolean
  partial: boolean
  reason: string
}

/** An input that must be positive or finite and is not, and without which the rest can still be given. */
export interface Refused { path: string, label: string, typed: string, value: number }
/** An input whose size is far from what is usual for its kind. */
export interface Unusual { path: string, label: string, value: number, dimension: Dimension, unit: UnitId, typical: number }

export interface OpenSectionModel {
  units: 'SI' | 'US'
  nodes: ModelNode[]
  walls: ModelWall[]
  junctions: ModelJunction[]
  seams: Seam[]
  materials: MaterialModel[]
  by: 'torque' | 'rate'
  cases: CaseModel[]
  length: Measured | null
  twistAllowed: Measured | null
  twistOrigin: string
  factors: FactorModel
  ends: 'free' | 'restrained' | 'unknown'
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean, builtIn: boolean }
  refused: Refused[]
  unusual: Unusual[]
}
