/** One thin wall of an open section: its stiffness and its stress (methods reference §1.9, §1.10). N·mm², MPa. */
import { freeEndLoss, junctionEndLoss } from '#shared/torsion/published'

export interface WallStiffnessInput {
  readonly G: number
  /** Thickness at its two ends, mm; linear between them. */
  readonly thickness: readonly [number, number]
  /** Mid-line length, mm, and the length the junction formula takes instead. */
  readonly developed: number
  readonly effective: number
  /** Thickness at each end counted as free, mm. */
  readonly ends: readonly number[]
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

/** ∫t³ds/3 over the length, mm³: t³/3, or (t₁ + t₂)(t₁² + t₂²)/12 of a linear taper. */
export const cubicThickness = ([start, end]: readonly [number, number]): number =>
  (start === end ? start ** 3 / 3 : (start + end) * (start * start + end * end) / 12)

/** G∫t³ds/3 and what its ends take off. */
export function wallStiffness({ G, thickness, developed, effective, ends, junctions }: WallStiffnessInput): WallStiffness {
  const perLength = G * cubicThickness(thickness)
  const fourth = ends.reduce((sum, t) => sum + t ** 4, 0)
  return { plainGJ: perLength * developed, lengthTerm: perLength * (effective - developed), endTerm: -G * endLossOf(junctions) * fourth }
}

/** Stress on both faces of a flat wall, G·t·|θ′|. */
export const faceStress = (G: number, t: number, rate: number): number => G * t * Math.abs(rate)
