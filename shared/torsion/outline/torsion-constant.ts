/**
 * The torsion constant from the shear along the boundary, two ways that share
 * no weakness, and what the shear must satisfy whatever the section.
 */
import type { PanelMesh } from '#shared/torsion/outline/panels'

/**
 * J = ¼ ∮ (x·n) τ² ds (Rellich's identity with ∇²Φ = −2, Φ constant on each
 * loop): hardly anything cancels in thin walls. A sharp re-entrant vertex
 * spoils it, as τ² is barely integrable there.
 */
export function constantFromSquares({ count, x, y, nx, ny, w }: PanelMesh, tau: Float64Array): number {
  let sum = 0
  for (let i = 0; i < count; i += 1) sum += (w[i] as number) * ((x[i] as number) * (nx[i] as number) + (y[i] as number) * (ny[i] as number)) * (tau[i] as number) ** 2
  return sum / 4
}

/** J = ½ ∮ r² τ ds − I_p (Green's identity with r²/2): linear in the shear, indifferent to vertices, with cancellation in thin open walls. */
export function constantFromMoment({ count, x, y, w }: PanelMesh, tau: Float64Array, Ip: number): number {
  let sum = 0
  for (let i = 0; i < count; i += 1) sum += (w[i] as number) * ((x[i] as number) ** 2 + (y[i] as number) ** 2) * (tau[i] as number)
  return sum / 2 - Ip
}
