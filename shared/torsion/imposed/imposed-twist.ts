/** A part that follows the twist of its structure: rate of twist is given, torque and stress are results (methods §6). N, mm, MPa, rad. */
import { finiteOrRefused } from '#shared/torsion/finite'
import { refusal, type Refusal } from '#shared/torsion/section'

/** The part as its section was solved: stress per torque is the shape's own, open walls take G t θ′. */
export interface FollowingPart {
  /** N·mm² */
  readonly GJ: number
  /** Peak shear per rate of twist, N/mm: G·t_max of open walls, G·J/W_T of others. */
  readonly shearPerRate: number
  /** EΓ in N·mm⁴ and the largest |ω| in mm², where the section warps and a change of rate is given. */
  readonly warping: { readonly EG: number, readonly E: number, readonly omega: number } | null
}

export interface ImposedTwist {
  /** rad/mm */
  readonly rate: number
  /** φ″, rad/mm² */
  readonly gradient: number
  /** Distance of the line of attachment from the shear centre, and of the outermost fibre from the bending axis, mm. */
  readonly offset: number
  readonly fibre: number
  readonly E: number
}

export interface FollowingResponse {
  readonly ok: true
  readonly torque: number
  readonly tau: number
  /** B = −EΓ φ″ and σ_ω = −E ω φ″. */
  readonly bimoment: number
  readonly sigmaWarping: number
  /** Curvature e φ″ of a part attached off its shear centre, 1/mm, and its stress E κ c. */
  readonly curvature: number
  readonly sigmaBending: number
}

export function followTwist(part: FollowingPart, { rate, gradient, offset, fibre, E }: ImposedTwist): FollowingResponse | Refusal {
  if (![rate, gradient, offset, fibre].every(Number.isFinite)) return refusal('Rate of twist, its change, offset and fibre must be finite numbers.')
  if (!(Number.isFinite(part.GJ) && part.GJ > 0)) return refusal('The part needs a torsional stiffness greater than zero.')
  if (!(Number.isFinite(E) && E > 0)) return refusal('The part needs a modulus of elasticity greater than zero.')
  if (part.warping && !(part.warping.EG >= 0 && part.warping.E > 0 && Number.isFinite(part.warping.omega))) return refusal('The warping stiffness must be zero or more, and its modulus of elasticity greater than zero.')
  const curvature = offset * gradient
  return finiteOrRefused({
    ok: true as const, torque: part.GJ * rate, tau: part.shearPerRate * Math.abs(rate),
    bimoment: part.warping ? -part.warping.EG * gradient : 0, sigmaWarping: part.warping ? -part.warping.E * part.warping.omega * gradient : 0,
    curvature, sigmaBending: E * curvature * fibre,
  })
}

export interface SharedTwist { readonly ok: true, /** GJ of the part over that of the structure. */ readonly ratio: number, /** Torque carried by the part when both are turned together by the given torque. */ readonly share: number, /** Factor on the rate of twist found without the part. */ readonly reduction: number }

/** Part and structure turned together: torques as their GJ, and the structure's own twist lessened by what the part takes (G-42). */
export function shareTwist(partGJ: number, structureGJ: number): SharedTwist | Refusal {
  if (!(Number.isFinite(partGJ) && partGJ >= 0 && Number.isFinite(structureGJ) && structureGJ > 0)) return refusal('The torsional stiffness of the structure must be greater than zero.')
  return finiteOrRefused({ ok: true as const, ratio: partGJ / structureGJ, share: partGJ / (partGJ + structureGJ), reduction: structureGJ / (partGJ + structureGJ) })
}
