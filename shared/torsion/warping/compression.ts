/** Torsional stiffness under axial compression (methods §7.7, G-41). N, mm, MPa. */
import { refusal, type Refusal } from '#shared/torsion/section'

/** From here on the reduced stiffness has to be shown; at 1 the bar buckles in torsion. */
export const compressionCaution = 0.1

export interface CompressedStiffness { readonly ok: true, /** σ̄·I_ps / GJ */ readonly ratio: number, /** GJ − σ̄·I_ps, N·mm²; not above zero once the bar buckles. */ readonly GJ: number }

/**
 * GJ less what a mean compressive stress takes off it: fibres inclined by the twist push it further.
 * Tension (negative) is taken as zero: the stiffness it would add is not counted on.
 * @param Ips ∫ρ²dA about the shear centre, mm⁴
 */
export function compressedStiffness({ GJ, Ips, compression }: { readonly GJ: number, readonly Ips: number, /** MPa, compressive positive */ readonly compression: number }): CompressedStiffness | Refusal {
  if (!(Number.isFinite(GJ) && GJ > 0 && Number.isFinite(Ips) && Ips >= 0 && Number.isFinite(compression))) return refusal('The stiffness under compression needs finite numbers, with GJ greater than zero.')
  const taken = Math.max(0, compression) * Ips
  const result: CompressedStiffness = { ok: true, ratio: taken / GJ, GJ: GJ - taken }
  return Number.isFinite(result.ratio) && Number.isFinite(result.GJ) ? result : refusal('The compression is too large for the stiffness to be computed. Check it.')
}
