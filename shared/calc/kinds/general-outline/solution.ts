/** The solved outline, in N, mm, MPa, rad: what margins, guards, outputs, working and sketch all read. */
import type { GeneralOutlineModel } from '#shared/calc/kinds/general-outline/model'
import type { CaseModel } from '#shared/calc/parts/model'
import type { MarginRow } from '#shared/calc/types'
import type { Agreement, ComparedQuantity } from '#shared/torsion/outline/agreement'
import type { OutlineEdge } from '#shared/torsion/outline/outline'
import type { OutlineTorsion, ShearPeaks } from '#shared/torsion/outline/outline-torsion'

export interface WagnerState { In: number, ratio: number, torque: number, stress: number | null }

export interface CaseSolution {
  model: CaseModel
  /** As given, at the level given. */
  torque: number
  rate: number
  twist: number | null
  toLimit: number
  toUltimate: number
  /** Peak shear, MPa; null where it is unbounded. */
  tau: number | null
  knockdown: number
  wagnerLimit: WagnerState | null
  wagnerUltimate: WagnerState | null
}

/** One value of the first method beside that of this one. */
export interface Compared { quantity: ComparedQuantity, first: number, second: number, agreement: Agreement }

export interface Solution {
  model: GeneralOutlineModel
  torsion: OutlineTorsion
  edges: readonly OutlineEdge[]
  /** Diagonal of the box round the section, mm. */
  size: number
  /** Peaks where the shear is bounded; null at sharp re-entrant vertices. */
  peaks: ShearPeaks | null
  GJ: number
  /** Torsional modulus T/τ_max, mm³; null where the peak is unbounded. */
  W: number | null
  /** kL of the bar, where its length, E and Γ are known. */
  kL: number | null
  cases: CaseSolution[]
  compared: Compared[]
  margins: MarginRow[]
  governing: MarginRow | null
}
