/** Walls as numbers, made by `parse-walls` from a wall table: mm, MPa, rad. */
import type { MaterialModel, Measured } from '#shared/calc/parts/model'

export interface ModelNode { id: string, x: number, y: number }
export interface ModelWall {
  id: string, name: string, from: string, to: string
  t: Measured
  /** Thickness at `to` of a wall that tapers, and the greatest of the two in mm. */
  tEnd: Measured | null, tMax: number
  G: number, E: number | null, material: MaterialModel
  /** Radius, sweep (positive counter-clockwise from `from` to `to`) and start tangent of an arc. */
  arc?: { radius: number, sweep: number, direction: number }
  /** Directions of the mid-line as it leaves `from` and as it arrives at `to`, rad. */
  startDirection: number
  endDirection: number
  /** Mid-line length between nodes. */
  length: number
  /** What was typed for the length or radius, for the dimension on the sketch. */
  lengthTyped: string | null
}
/** Thickness at one of its ends, mm. */
export const thicknessAtNode = ({ from, t, tEnd }: ModelWall, node: string): number => (tEnd === null || from === node ? t.value : tEnd.value)

/** Thickness after `part` (0…1) of its length, mm. */
export const thicknessAlong = ({ t, tEnd }: ModelWall, part: number): number => (tEnd === null ? t.value : t.value + part * (tEnd.value - t.value))

export interface ModelJunction { node: string, radius: Measured, make: 'machined' | 'bent' }

/** A wall end declared to meet a node that stands elsewhere, or closing a loop (gap within tolerance). */
export interface Seam { wall: string, node: string, gap: number, size: number }
