/** Draws the mid-line of a profile: a chain of walls from corner to corner, or walls between named points. */
import type { Junction, OpenSection, OpenWall, Point, Refusal } from '#shared/torsion/section'
import type { ConversionLine, Moduli } from '#shared/torsion/profiles/profile'
import { refusal } from '#shared/torsion/section'

/** A wall of a profile: what it is called, its mid-line length and thickness. */
export interface ProfileWall { readonly name: string, readonly length: number, readonly t: number }

export interface Corners { readonly make: 'bent' | 'machined', readonly radius: number }

export interface Drawn { readonly ok: true, readonly section: OpenSection, readonly names: Readonly<Record<string, string>> }

/** `a`, `b`, … */
export const wallLetter = (index: number): string => String.fromCharCode(97 + index)

/** Sine or cosine of a right angle is nought or one, not 6e-17. */
function exact(value: number): number {
  return Math.abs(value) < 1e-15 ? 0 : value
}
const step = ({ x, y }: Point, direction: number, length: number): Point =>
  ({ x: x + length * exact(Math.cos(direction)), y: y + length * exact(Math.sin(direction)) })

/**
 * Walls one after another. `turns` has the angle from each wall to the next,
 * + counter-clockwise; the node `anchor` (counted from nought) lies at the origin.
 */
export function chainOfWalls(walls: readonly ProfileWall[], start: number, turns: readonly number[], anchor: number, corners: Corners, moduli: Moduli): Drawn {
  const points: Point[] = [{ x: 0, y: 0 }]
  let direction = start
  for (const [index, { length }] of walls.entries()) {
    points.push(step(points[index] ?? { x: 0, y: 0 }, direction, length))
    direction += turns[index] ?? 0
  }
  const origin = points[anchor] ?? { x: 0, y: 0 }
  const placed = points.map(({ x, y }) => ({ x: x - origin.x, y: y - origin.y }))
  const nodes = placed.slice(1, -1).map((_, index) => String(index + 2))
  return drawn(placed, walls.map(({ name, t }, index) => ({ name, t, from: index, to: index + 1 })), nodes, corners, moduli)
}

export interface Link { readonly name: string, readonly t: number, /** Indices of its end points. */ readonly from: number, readonly to: number }

/** Walls between points; `nodes` are those with a corner. */
export function drawn(points: readonly Point[], links: readonly Link[], nodes: readonly string[], { make, radius }: Corners, moduli: Moduli): Drawn {
  const walls = links.map(({ t, from, to }, index): OpenWall => ({ id: wallLetter(index), from: String(from + 1), to: String(to + 1), t, ...moduli }))
  return {
    ok: true,
    section: { nodes: points.map(({ x, y }, index) => ({ id: String(index + 1), x, y })), walls, junctions: nodes.map((node): Junction => ({ node, radius, make })) },
    names: Object.fromEntries(links.map(({ name }, index) => [wallLetter(index), name])),
  }
}

/** A figure in a sentence. */
export const mm = (value: number): string => `${Number(value.toPrecision(4))} mm`

/** A wall of which the adjoining thicknesses leave nothing. */
export function nothingLeft(lines: readonly ConversionLine[]): Refusal | null {
  const gone = lines.find(({ value }) => !(value > 0))
  if (!gone) return null
  const [given] = gone.terms
  return refusal(`The ${gone.of} of ${mm(given?.value ?? 0)} is no longer than the walls beside it are thick, so that ${mm(gone.value)} is left on its mid-line. Give a greater length, or say how it is measured.`, given?.symbol)
}
