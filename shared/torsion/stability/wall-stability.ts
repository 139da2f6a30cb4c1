/**
 * Shear buckling of flat and curved walls and of cylinders in torsion (methods §2.5, §2.6). Elastic, thin,
 * perfect but for the knock-down stated. mm, MPa.
 */
import { finiteOrRefused } from '#shared/torsion/finite'
import { refusal, type Refusal } from '#shared/torsion/section'
import { cylinder, fits, flatBelow, longestPlate, longStrip } from '#shared/torsion/stability/published'
import { shearBucklingCoefficient, type PlateEdges } from '#shared/torsion/stability/ritz'

export interface Panel {
  /** Sides in either order, mm; which edges are held how is told by length. */
  readonly length: number
  readonly width: number
  readonly t: number
  readonly E: number
  readonly nu: number
  readonly edges: PlateEdges
  /** Radius of a curved panel, mm; null for a flat one. */
  readonly radius: number | null
}

export interface Buckling {
  readonly ok: true
  /** Elastic critical shear stress, MPa. */
  readonly tau: number
  /** Coefficient used, and the published fit for comparison; null where there is none. */
  readonly ks: number
  readonly fit: number | null
  readonly ratio: number
  /** Curvature parameter Z of a curved panel or cylinder. */
  readonly Z: number | null
  /** What a reader must know of the range of the formula; null where nothing. */
  readonly caution: string | null
}

const positive = (value: number) => Number.isFinite(value) && value > 0
/** π²E/12(1−ν²)·(t/b)² */
export const plateStress = (E: number, nu: number, t: number, b: number): number => Math.PI ** 2 * E / (12 * (1 - nu ** 2)) * (t / b) ** 2

/** k_s of a plate with sides a ≥ b by Ritz's method; beyond the longest computed, the infinite strip. */
export function panelCoefficient(ratio: number, edges: PlateEdges): number {
  return ratio > longestPlate ? longStrip[edges.long] : shearBucklingCoefficient(ratio, edges)
}

/** The published fit of the same coefficient, β = b/a. */
export const fittedCoefficient = (ratio: number, { long, short }: PlateEdges): number =>
  fits[`${long} ${short}`].reduce((sum, [power, c]) => sum + c * ratio ** -power, 0)

function unsound({ length, width, t, E, nu, radius }: Panel): string | null {
  if (![length, width, t, E].every(positive)) return 'The sides, the thickness and the modulus of elasticity must be greater than zero.'
  if (!(Number.isFinite(nu) && nu >= 0 && nu < 0.5)) return 'Poisson’s ratio must be from 0 to below 0.5.'
  if (radius !== null && !positive(radius)) return 'The radius must be greater than zero.'
  if (Math.max(length, width) > 1e6 * Math.min(length, width, t) || t >= Math.min(length, width)) return 'The panel is no thin wall: check its sides and thickness.'
  return null
}

/** Critical shear stress of a flat or slightly curved panel. A curved one is given its flat value, a lower estimate for the perfect panel. */
export function panelBuckling(panel: Panel): Buckling | Refusal {
  const fault = unsound(panel)
  if (fault) return refusal(fault)
  const { length, width, t, E, nu, edges, radius } = panel
  const [a, b] = [Math.max(length, width), Math.min(length, width)]
  const ratio = a / b
  const ks = panelCoefficient(ratio, edges)
  const Z = radius === null ? null : b ** 2 / (radius * t) * Math.sqrt(1 - nu ** 2)
  if (!positive(ks)) return refusal('The buckling coefficient could not be found for this panel. Check its sides.')
  return finiteOrRefused({
    ok: true as const, ks, fit: fittedCoefficient(ratio, edges), ratio, Z, tau: ks * plateStress(E, nu, t, b),
    caution: Z !== null && Z >= flatBelow ? 'The panel is curved: its flat value is a lower estimate for a perfect panel, and imperfections count. Give a coefficient with its source.' : null,
  })
}

export interface Cylinder { readonly radius: number, readonly t: number, readonly length: number, readonly E: number, readonly nu: number }

/** Circular cylinder in torsion; mid-surface radius. The constants are from memory and stand to be confirmed. */
export function cylinderBuckling({ radius, t, length, E, nu }: Cylinder): Buckling | Refusal {
  if (![radius, t, length, E].every(positive)) return refusal('The radius, the thickness, the length and the modulus of elasticity must be greater than zero.')
  if (!(Number.isFinite(nu) && nu >= 0 && nu < 0.5)) return refusal('Poisson’s ratio must be from 0 to below 0.5.')
  if (t >= radius) return refusal('The cylinder is no thin wall: check its radius and thickness.')
  const Z = length ** 2 / (radius * t) * Math.sqrt(1 - nu ** 2)
  const gammaZ = cylinder.knockdown ** (1 / cylinder.power) * Z
  const most = cylinder.mostZ * (radius / t) ** 2 * (1 - nu ** 2)
  const ks = cylinder.c * cylinder.knockdown * Z ** cylinder.power
  if (gammaZ > most) {
    const tau = cylinder.knockdown * E / (3 * Math.SQRT2 * (1 - nu ** 2) ** 0.75) * (t / radius) ** 1.5
    return finiteOrRefused({ ok: true as const, tau, ks, fit: null, ratio: length / radius, Z, caution: `γZ = ${gammaZ.toPrecision(4)} lies above ${most.toPrecision(4)}: the value is that of a long cylinder.` })
  }
  return finiteOrRefused({
    ok: true as const, ks, fit: null, ratio: length / radius, Z, tau: ks * plateStress(E, nu, t, length),
    caution: gammaZ < cylinder.leastZ ? `γZ = ${gammaZ.toPrecision(4)} lies below ${cylinder.leastZ}, where the formula begins: treat the wall as a panel.` : null,
  })
}

/** Elastic values above half of the shear yield are information only: the wall yields first. The stress to judge by is capped at yield. */
export const cappedAtYield = (tau: number, Fsy: number): { tau: number, plastic: boolean } => ({ tau: Math.min(tau, Fsy), plastic: tau > Fsy / 2 })
