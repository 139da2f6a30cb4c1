/**
 * What a section does under a torque, or what torque an imposed rate of twist
 * calls up in it (methods reference §1.9, §6). N·mm, rad/mm, MPa.
 */
import type { OpenTorsion } from '#shared/torsion/open-section'
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'
import { faceStress } from '#shared/torsion/wall-stiffness'

export interface WallResponse {
  readonly id: string
  /** Signed as the torque. */
  readonly torque: number
  /** Face stress on the flat, G·t·|θ′|, ≥ 0; it acts on both faces with opposite sense. */
  readonly tau: number
}

export interface SectionResponse {
  readonly ok: true
  readonly torque: number
  readonly rate: number
  readonly perWall: readonly WallResponse[]
  readonly tauMax: number
  /** The first wall that has it. */
  readonly tauMaxWall: string
}

/** θ′ = T/(GJ) */
export function respondToTorque(torsion: OpenTorsion, torque: number): SectionResponse | Refusal {
  if (!Number.isFinite(torque)) return refusal('The torque is not a finite number.')
  return respond(torsion, torque, torque / torsion.GJ)
}

/** T = GJ·θ′ for a part that follows the structure it is attached to (§6). */
export function respondToRate(torsion: OpenTorsion, rate: number): SectionResponse | Refusal {
  if (!Number.isFinite(rate)) return refusal('The rate of twist is not a finite number.')
  return respond(torsion, torsion.GJ * rate, rate)
}

function respond(torsion: OpenTorsion, torque: number, rate: number): SectionResponse | Refusal {
  const perWall = torsion.perWall.map(({ id, t, G, share }) => ({ id, torque: torque * share, tau: faceStress(G, t, rate) }))
  const peak = perWall.reduce((best, one) => (one.tau > best.tau ? one : best))
  if (![torque, rate, peak.tau].every(value => Number.isFinite(value))) return refusal('The load is too large to compute with. Check its unit.')
  return { ok: true, torque, rate, perWall, tauMax: peak.tau, tauMaxWall: peak.id }
}
