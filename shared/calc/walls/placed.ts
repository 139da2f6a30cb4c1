/**
 * A wall table with its nodes in place, mm and rad: what a drawing shows and changes. Walls whose typed text
 * cannot be read yet, or that nothing reaches, are kept aside as they stand.
 */
import type { JunctionInput, WallEndInput, WallInput, WallTable } from '#shared/calc/parts/wall-fields'
import { arcStep, stepAlong } from '#shared/calc/parts/parse-walls'
import { noLinks, type Links } from '#shared/calc/links'
import { typedReader } from '#shared/calc/parts/typed-reader'
import type { TypedQuantity } from '#shared/calc/types'
import type { Point } from '#shared/torsion/section'
import type { Dimension } from '#shared/units/units'

/** Radius of the mid-line, angle swept (+ counter-clockwise) and direction of the tangent at the first node. */
export interface Arc { readonly radius: number, readonly sweep: number, readonly direction: number }

/** `input` has the name, thickness and material, and the end as it was typed last. */
export interface PlacedWall { readonly id: string, readonly from: string, readonly to: string, readonly arc: Arc | null, readonly input: WallInput }

export interface PlacedSection {
  readonly nodes: ReadonlyMap<string, Point>
  readonly walls: readonly PlacedWall[]
  readonly junctions: readonly JunctionInput[]
  readonly loose: readonly WallInput[]
}

/** The value of a typed field in engine units, or null where there is none. */
export type ReadTyped = (typed: TypedQuantity, dimension: Dimension) => number | null

/** Reads typed fields without a word about what cannot be read. */
export function readTyped(links: Links = noLinks): ReadTyped {
  return (typed, dimension) => typedReader(links).number(typed, '', { label: '', dimension })?.value ?? null
}

/** Where a typed end leads: to a point, or a step from the first node. */
export interface Lead { readonly end: Point | null, readonly step: Point | null, readonly arc: Arc | null }

export function leadOf(end: WallEndInput, read: ReadTyped): Lead | null {
  if (end.by === 'point') {
    const [x, y] = [read(end.x, 'length'), read(end.y, 'length')]
    return x === null || y === null ? null : { end: { x, y }, step: null, arc: null }
  }
  const direction = read(end.direction, 'angle')
  if (direction === null) return null
  if (end.by === 'length') {
    const length = read(end.length, 'length')
    return length === null || !(length > 0) ? null : { end: null, step: stepAlong(direction, length), arc: null }
  }
  const [radius, sweep] = [read(end.radius, 'length'), read(end.sweep, 'angle')]
  if (radius === null || sweep === null || !(radius > 0) || sweep === 0 || Math.abs(sweep) > 2 * Math.PI + 1e-9) return null
  return { end: null, step: arcStep(radius, sweep, direction), arc: { radius, sweep, direction } }
}

export const added = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y })
export const taken = (a: Point, b: Point): Point => ({ x: a.x - b.x, y: a.y - b.y })

/** Places what can be placed, as the evaluation does: from the first node, wall after wall, until nothing moves. */
export function placedSection(table: WallTable, read: ReadTyped): PlacedSection {
  const nodes = new Map<string, Point>()
  const placed = new Map<WallInput, PlacedWall>()
  const [x, y] = [read(table.start.x, 'length'), read(table.start.y, 'length')]
  const leads = new Map(table.walls.map(wall => [wall, leadOf(wall.end, read)]))
  const [first] = table.walls
  if (first && x !== null && y !== null) nodes.set(first.from, { x, y })
  for (let moved = true; moved;) {
    moved = false
    for (const wall of table.walls) {
      const lead = leads.get(wall)
      if (placed.has(wall) || !lead || !reach(wall, lead, nodes)) continue
      placed.set(wall, { id: wall.id, from: wall.from, to: wall.to, arc: lead.arc, input: wall })
      moved = true
    }
  }
  return {
    nodes, walls: table.walls.flatMap(wall => placed.get(wall) ?? []), junctions: table.junctions,
    loose: table.walls.filter(wall => !placed.has(wall)),
  }
}

/** Places the node that a wall leads to, or backwards the one it comes from. */
function reach(wall: WallInput, { end, step }: Lead, nodes: Map<string, Point>): boolean {
  const [from, to] = [nodes.get(wall.from), nodes.get(wall.to)]
  if (from) {
    if (!to) nodes.set(wall.to, end ?? added(from, step ?? { x: 0, y: 0 }))
    return true
  }
  if (!to || !step) return false
  nodes.set(wall.from, taken(to, step))
  return true
}
