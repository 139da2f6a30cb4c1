/** The solved bar, in N, mm, MPa, rad: what margins, guards, outputs and working all read. */
import type { MarginRow } from '#shared/calc/types'
import type { RestrainedWarpingModel, WarpingCaseModel } from '#shared/calc/kinds/restrained-warping/parse'
import type { Solution as SectionSolution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import type { MaterialModel } from '#shared/calc/parts/model'
import type { CutBar } from '#shared/torsion/warping/cut-bar'
import type { SectorialRun } from '#shared/torsion/warping/sectorial-run'
import type { StressPeaks } from '#shared/torsion/warping/stress-peaks'
import type { BarCase, BarResponse, BarRun, Peaks } from '#shared/torsion/warping/warping-bar'

/** Walls and bends at which stresses are judged. */
export interface StressGroup { id: string, wall?: string, place: string, materials: MaterialModel[] }
/** Corners with a factor: what φ′ and T_ω give there. */
export interface CornerPlace { node: string, wall: string, place: string, materials: MaterialModel[], perRate: number, perTorque: number }

export interface WarpingCase {
  model: WarpingCaseModel
  load: BarCase
  response: BarResponse
  run: BarRun
  peaks: Peaks
  /** By group, at the level given. */
  stress: StressPeaks[]
  /** MPa, by corner. */
  corner: number[]
  /** Mean stress of the axial force on the reference modulus, MPa, tension positive. */
  axialStress: number
  /** What compression at ultimate takes off GJ, as a share of it; and the stiffness left, N·mm². */
  compression: number
  GJ: number
  toLimit: number
  toUltimate: number
  wagnerLimit: WagnerState | null
  wagnerUltimate: WagnerState | null
}

export interface WarpingSolution {
  model: RestrainedWarpingModel
  section: SectionSolution
  run: SectorialRun
  cut: CutBar
  groups: StressGroup[]
  corners: CornerPlace[]
  EG: number
  E: number
  /** 1/mm, of the stiffness without compression. */
  k: number
  kL: number
  cases: WarpingCase[]
  margins: MarginRow[]
  governing: MarginRow | null
}
