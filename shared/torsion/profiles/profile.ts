/**
 * Profiles as drawings give them, and what becomes of them on the mid-line
 * (methods reference §1.9, §1.10). mm, rad.
 */
import type { OpenSection } from '#shared/torsion/section'

/**
 * How the drawing measures a wall between others: over the far faces of the
 * walls at its ends, clear between their near faces, or between mid-lines.
 * A free end is measured to its edge in all three.
 */
export type MeasuredOn = 'outside' | 'inside' | 'mid-line'

interface Made {
  readonly measured: MeasuredOn
  /** Bent from one sheet with concentric radii, or machined (extruded, rolled) with fillets and sharp outer corners. */
  readonly make: 'bent' | 'machined'
  /** Inside radius of every corner, mm, ≥ 0. */
  readonly radius: number
}

/** Wall lengths as the drawing gives them; the t beside each is its thickness. */
export type Profile
  = | Made & { readonly shape: 'angle', readonly width: number, readonly height: number, readonly tWidth: number, readonly tHeight: number }
    /** The stem's height is taken to the flange: over it, from it, or from its mid-line. */
    | Made & { readonly shape: 'tee', readonly flange: number, readonly height: number, readonly tFlange: number, readonly tStem: number }
    /** Flanges to one side of the web, and to both. */
    | Made & { readonly shape: 'channel' | 'zed', readonly lower: number, readonly height: number, readonly upper: number, readonly tLower: number, readonly tWeb: number, readonly tUpper: number }
    /** `lean` is the angle of each web to the upright; the feet stand wider than the crown, 0 ≤ lean < 75°. */
    | Made & { readonly shape: 'hat', readonly brim: number, readonly height: number, readonly crown: number, readonly lean: number, readonly tBrim: number, readonly tWeb: number, readonly tCrown: number }
    | Made & { readonly shape: 'lipped channel', readonly lip: number, readonly flange: number, readonly height: number, readonly tLip: number, readonly tFlange: number, readonly tWeb: number }
    | Made & { readonly shape: 'I', readonly lower: number, readonly height: number, readonly upper: number, readonly tLower: number, readonly tWeb: number, readonly tUpper: number }
    /** A base on both sides of the web, and a cap to one side. */
    | Made & { readonly shape: 'J', readonly base: number, readonly height: number, readonly cap: number, readonly tBase: number, readonly tWeb: number, readonly tCap: number }
    /** Radius to the outer face, the inner face or the mid-line. */
    | { readonly shape: 'arc', readonly measured: MeasuredOn, readonly radius: number, readonly angle: number, readonly t: number }
    | { readonly shape: 'slit tube', readonly measured: MeasuredOn, readonly diameter: number, readonly t: number }

/** A part of a sum: factor × value; the symbol is TeX. */
export interface ConversionTerm { readonly symbol: string, readonly factor: number, readonly value: number }

/** One line of the conversion: `h_m = h − ½·t_u − ½·t_l`. */
export interface ConversionLine {
  /** In words: `web`. */
  readonly of: string
  readonly symbol: string
  readonly terms: readonly ConversionTerm[]
  /** mm: the sum of the terms. */
  readonly value: number
}

export interface ProfileSection {
  readonly ok: true
  /** Nodes `1`, `2`, …; walls `a`, `b`, … in order. */
  readonly section: OpenSection
  /** What each wall is called. */
  readonly names: Readonly<Record<string, string>>
  readonly lines: readonly ConversionLine[]
}

export interface Moduli { readonly G: number, readonly E?: number }
