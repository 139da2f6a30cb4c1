/**
 * An open thin-walled section as the engine takes it, and what it gives back.
 * Plain numbers: mm, rad, MPa, N·mm. Axes right-handed, angles counter-clockwise.
 */

export interface Point { readonly x: number, readonly y: number }

export interface SectionNode extends Point { readonly id: string }

/** A circular wall from one node to the other on its mid-line. */
export interface WallArc {
  /** Of the mid-line, mm, > 0. */
  readonly radius: number
  /** Angle swept from → to, rad, + counter-clockwise, 0 < |sweep| ≤ 2π. */
  readonly sweep: number
  /** Direction of the tangent at `from`, rad. Needed only where both ends nearly coincide (a slit tube), since the nodes do not fix the centre then. */
  readonly startDirection?: number
}

export interface OpenWall {
  readonly id: string
  readonly from: string
  readonly to: string
  /** Thickness, mm: at `from`, where `tEnd` gives another at `to`. */
  readonly t: number
  /** Thickness at `to` of a wall that tapers linearly along its mid-line, mm. */
  readonly tEnd?: number
  /** Shear modulus, MPa. */
  readonly G: number
  /** Modulus of elasticity, MPa. Where walls differ in it, sectorial properties are weighted by it. */
  readonly E?: number
  readonly arc?: WallArc
}

/** What the drawing shows at a node where walls meet: the inside fillet of a machined corner, or the inside radius of a bend. */
export interface Junction {
  readonly node: string
  /** mm, ≥ 0 */
  readonly radius: number
  readonly make: 'machined' | 'bent'
}

export interface OpenSection {
  readonly nodes: readonly SectionNode[]
  readonly walls: readonly OpenWall[]
  readonly junctions: readonly Junction[]
}

/** Why something cannot be given: a sentence for the analyst, never a guessed number. */
export interface Refusal {
  readonly ok: false
  readonly reason: string
  /** Symbol of the dimension of a profile that stands in the way, or `make`. */
  readonly at?: string
}

export const refusal = (reason: string, at?: string): Refusal => ({ ok: false, reason, ...(at === undefined ? {} : { at }) })

export type FaultCode
  = | 'no-walls' | 'bad-number' | 'duplicate-id' | 'unknown-node' | 'zero-length' | 'arc-mismatch' | 'loop' | 'not-connected'
    | 'crossing' | 'bend' | 'junction'

/** Why a section cannot be computed. */
export interface SectionFault {
  readonly code: FaultCode
  readonly message: string
  readonly walls: readonly string[]
  readonly nodes: readonly string[]
}

/** Two nodes at one place that are not joined: a slit, if that is what is meant (G-07, G-12). */
export interface OpenSeam { readonly nodes: readonly [string, string], readonly gap: number }

export type SectionCheck
  = | { readonly ok: true, readonly seams: readonly OpenSeam[] }
    | { readonly ok: false, readonly reason: string, readonly faults: readonly SectionFault[] }
