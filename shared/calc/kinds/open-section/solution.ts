/** The solved section, in N, mm, MPa, rad: what margins, guards, outputs, working and sketch all read. */
import type { MarginRow } from '#shared/calc/types'
import type { CaseModel } from '#shared/calc/parts/model'
import type { PlaceValues } from '#shared/calc/parts/place-values'
import type { ModelJunction, ModelWall } from '#shared/calc/parts/wall-model'
import type { OpenSectionModel } from '#shared/calc/kinds/open-section/model'

export interface WallSolution {
  wall: ModelWall
  /** Ends that meet no other wall: 0, 1 or 2. */
  freeEnds: number
  /** End at an L junction counted as free beside its bulge: 0, 1 or 2. */
  cornerEnds: number
  /** Developed mid-line length, and the length used in Lt³/3 where a junction bulge is added. */
  developed: number
  effective: number
  /** mm⁴ before and after end corrections and junction bulges. */
  Jplain: number
  J: number
  GJ: number
  share: number
  /** Length between mid-line intersections over thickness. */
  slenderness: number
  /** What its free ends take off J, mm⁴. */
  ends: number
  /** Stress at the worse face over G t θ′: 1 for a straight wall, more on the inside of an arc. */
  faceFactor: number
}

export interface CornerSolution {
  node: string
  junction: ModelJunction | null
  walls: ModelWall[]
  /** Largest angle of the material at this node, rad: more than π at every inner corner. */
  interior: number
  /** Kc, or the reason why the tables give none. */
  factor: { ok: true, K: number, source: string } | { ok: false, reason: string }
  /** No inside radius at a re-entrant corner: the stress is unbounded in linear elasticity. */
  sharp: boolean
  /** r / t of the thickest wall that meets here. */
  ratio: number
  /** Wall with the largest G t among those that meet. */
  worst: ModelWall
}

export interface Sectorial {
  A: number
  centroid: { x: number, y: number }
  Ixx: number, Iyy: number, Ixy: number
  shearCentre: { x: number, y: number }
  /** Γ about the shear centre: primary plus, where all walls meet in one point, secondary. */
  Gamma: number
  GammaPrimary: number
  GammaSecondary: number
  omegaMax: number
  /** The modulus that the warping constant is referred to, where moduli are given. */
  E: number | null
  In: number
}

export interface WagnerState { In: number, ratio: number, torque: number, stress: number | null }

export interface CaseSolution {
  model: CaseModel
  /** As given, at the level given. */
  torque: number
  rate: number
  twist: number | null
  /** What the given load is multiplied by to reach limit and ultimate. */
  toLimit: number
  toUltimate: number
  tau: PlaceValues
  corner: PlaceValues
  /** Worst face stress with its wall, and worst stress with corners and its node. */
  tauMax: number
  tauMaxWall: string
  tauCorner: number | null
  tauCornerNode: string | null
  /** Knock-down on strength per material at the temperature of the case. */
  knockdown: Map<string, number>
  wagnerLimit: WagnerState | null
  wagnerUltimate: WagnerState | null
}

export interface Solution {
  model: OpenSectionModel
  /** Shear modulus common to all walls, or null where they differ. */
  G: number | null
  GJ: number
  J: number
  Jplain: number
  /** Sum of junction bulges and of free-end terms on J, mm⁴. */
  bulge: number
  ends: number
  /** What is taken off per t⁴ at each free end. */
  endLoss: number
  bulges: { node: string, form: 'L' | 'T', alpha: number, D: number, J: number, r: number, t1: number, t2: number }[]
  /** Machined corners whose bulge is not added, and why. */
  noBulge: { node: string, reason: string }[]
  developed: number
  walls: WallSolution[]
  corners: CornerSolution[]
  sectorial: Sectorial | null
  /** kL of the bar, where its length and the moduli are known. */
  kL: number | null
  cases: CaseSolution[]
  /** Stress per rate of twist, MPa·mm: at the worse face of every wall, and at every corner that has a factor. */
  perRate: { face: ReadonlyMap<string, number>, corner: ReadonlyMap<string, number> }
  /** Ids of the cases whose values by wall and corner are given: all, or where they are too many the decisive ones. */
  detailed: ReadonlySet<string>
  margins: MarginRow[]
  governing: MarginRow | null
}
