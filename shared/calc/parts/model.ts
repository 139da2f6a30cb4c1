/** Materials, cases and factors as numbers: N, mm, MPa, rad, °C. Made by the parsers of this folder. */
import type { LoadLevel } from '#shared/calc/types'
import type { Dimension, UnitId } from '#shared/units/units'

/** A number with the unit it was typed in, so that results may be shown the way their input was. */
export interface Measured { value: number, unit: UnitId, typed: string }

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

/** What every load case says of itself. */
export interface CaseHead { id: string, title: string, source: string, level: LoadLevel, temperature: Measured | null }

export interface CaseModel extends CaseHead {
  /** Exactly one of the two is given. */
  torque: Measured | null
  rate: Measured | null
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
