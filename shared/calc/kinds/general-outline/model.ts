/** A general outline as numbers: N, mm, MPa, rad, °C. Made by `parse`, read by everything after it. */
import type { CaseModel, FactorModel, MaterialModel, Measured, Refused, Unusual } from '#shared/calc/parts/model'
import type { FirstMethod } from '#shared/torsion/outline/agreement'
import type { Outline } from '#shared/torsion/outline/outline'

/** What the first method gave; only what was given is there. */
export interface FirstResult { method: FirstMethod, J: Measured | null, W: Measured | null, Gamma: Measured | null, source: string }

export interface GeneralOutlineModel {
  units: 'SI' | 'US'
  outline: Outline
  /** Names of the holes, in the order of the outline. */
  holes: string[]
  material: MaterialModel
  by: 'torque' | 'rate'
  cases: CaseModel[]
  length: Measured | null
  twistAllowed: Measured | null
  twistOrigin: string
  factors: FactorModel
  ends: 'free' | 'restrained' | 'unknown'
  first: FirstResult | null
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean, builtIn: boolean }
  refused: Refused[]
  unusual: Unusual[]
}
