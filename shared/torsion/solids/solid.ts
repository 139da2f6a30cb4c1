/** Solid and hollow bars whose torsion is known in closed form or as a series, and what is given for each. Lengths in mm, angles in rad. */
import type { Point } from '#shared/torsion/section'

export type Solid
  /** Ri = 0 is the solid circle. */
  = | { readonly shape: 'circle', readonly outerRadius: number, readonly innerRadius: number }
    /** `ratio` is inner over outer of the similar hole, 0 for none. */
    | { readonly shape: 'ellipse', readonly semiMajor: number, readonly semiMinor: number, readonly ratio: number }
    /** Full sides, in either order. */
    | { readonly shape: 'rectangle', readonly width: number, readonly height: number }
    | { readonly shape: 'equilateral triangle', readonly side: number }
    | { readonly shape: 'right isosceles triangle', readonly leg: number }
    /** Included angle, 0 < angle ≤ 2π. */
    | { readonly shape: 'sector', readonly radius: number, readonly angle: number }
    | { readonly shape: 'semicircle', readonly radius: number }
    /** A circle with one flat; `depth` is what the flat takes off, 0 ≤ depth ≤ radius. */
    | { readonly shape: 'segment', readonly radius: number, readonly depth: number }
    /** `flats` is twice the apothem: across flats where the number of sides is even. */
    | { readonly shape: 'pentagon' | 'hexagon' | 'octagon', readonly flats: number }

/** Shear at one place for Gθ′ = 1, mm: τ = G θ′ · perRate = T · perRate / J. */
export interface ShearPlace {
  readonly perRate: number
  /** In words, e.g. `middle of the long sides`. */
  readonly place: string
  /** One such point; axes as the shape is described, origin at its centre, centroid or apex. */
  readonly at: Point
}

/** A remembered formula for the same quantity. */
export interface Remembered {
  readonly of: 'J' | 'peak'
  /** mm⁴ of J, mm of the peak per Gθ′. */
  readonly value: number
  readonly source: string
}

export interface SolidTorsion {
  readonly ok: true
  /** mm² */
  readonly A: number
  /** mm⁴ */
  readonly J: number
  readonly peak: ShearPlace
  /** Further places worth knowing, largest first. */
  readonly secondary: readonly ShearPlace[]
  /** Torsional modulus T/τ_max, mm³. */
  readonly WT: number
  /** Fully plastic torque over the yield shear stress, mm³, by the sand heap; null where none is known. Information only (§7.5). */
  readonly plastic: number | null
  readonly remembered: readonly Remembered[]
  /** Section of the methods reference. */
  readonly method: string
  /** A corner at which the stress is unbounded in linear elasticity, and why no peak is given there. */
  readonly unbounded: string | null
}

/** The parts a family gives; `WT` follows from them. */
export function solidTorsion(parts: Omit<SolidTorsion, 'ok' | 'WT' | 'secondary' | 'remembered' | 'plastic' | 'unbounded'> & Partial<SolidTorsion>): SolidTorsion {
  return { secondary: [], remembered: [], plastic: null, unbounded: null, ...parts, ok: true, WT: parts.J / parts.peak.perRate }
}
