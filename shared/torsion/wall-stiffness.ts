/** One thin wall of an open section: its stiffness and its stress (methods reference §1.9, §1.10). N·mm², MPa. */
import { freeEndLoss, junctionEndLoss } from '#shared/torsion/published'

export interface WallStiffnessInput {
  readonly G: number
  readonly t: number
  /** Mid-line length, mm, and the length the junction formula takes instead. */
  readonly developed: number
  readonly effective: number
  /** Ends counted as free. */
  readonly ends: number
  /** Whether junction bulges are added in this section: the published end loss goes with them. */
  readonly junctions: boolean
}

export interface WallStiffness {
  /** G·L·t³/3 */
  readonly plainGJ: number
  readonly lengthTerm: number
  /** ≤ 0 */
  readonly endTerm: number
}

/** What is taken off per t⁴ at a free end. */
export const endLossOf = (junctions: boolean): number => (junctions ? junctionEndLoss : freeEndLoss)

/** G·L·t³/3 and what its ends take off. */
export function wallStiffness({ G, t, developed, effective, ends, junctions }: WallStiffnessInput): WallStiffness {
  const perLength = G * t ** 3 / 3
  return { plainGJ: perLength * developed, lengthTerm: perLength * (effective - developed), endTerm: -G * endLossOf(junctions) * t ** 4 * ends }
}

/** Stress on both faces of a flat wall, G·t·|θ′|. */
export const faceStress = (G: number, t: number, rate: number): number => G * t * Math.abs(rate)
