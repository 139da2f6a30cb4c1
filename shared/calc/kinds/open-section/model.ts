/** The section as numbers: N, mm, MPa, rad, °C. Made by `parse`, read by everything after it. */
import type { CaseModel, FactorModel, MaterialModel, Measured, Refused, Unusual } from '#shared/calc/parts/model'
import type { ProfileModel } from '#shared/calc/parts/parse-profile'
import type { ModelJunction, ModelNode, ModelWall, Seam } from '#shared/calc/parts/wall-model'

export interface OpenSectionModel {
  units: 'SI' | 'US'
  nodes: ModelNode[]
  walls: ModelWall[]
  junctions: ModelJunction[]
  seams: Seam[]
  /** What the walls were made of, where they follow from a profile. */
  profile: ProfileModel | null
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
