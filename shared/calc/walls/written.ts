/**
 * A placed section as a typed wall table again. What was typed stays where it still leads to the same place;
 * anything else is written new, at figures that a person would type.
 */
import type { WallEndInput, WallInput, WallTable } from '#shared/calc/parts/wall-fields'
import { added, leadOf, taken, type Arc, type PlacedSection, type PlacedWall, type ReadTyped } from '#shared/calc/walls/placed'
import type { TypedQuantity } from '#shared/calc/types'
import type { Point } from '#shared/torsion/section'
import { fromEngine, type UnitId } from '#shared/units/units'

/** Two places are one within this share of the size of the section. */
export const SAME_PLACE = 1e-9
/** Figures of a number that is written; a grid value needs few of them. */
const FIGURES = 10
/** A length of more letters than this was not meant as a round one. */
const SHORT = 8

/** How a table is written: the unit of new lengths, and how typed text is read. */
export interface Writing { readonly unit: UnitId, readonly read: ReadTyped }

export function sizeOf(nodes: Iterable<Point>): number {
  const points = [...nodes]
  const spread = (values: number[]) => (values.length === 0 ? 0 : Math.max(...values) - Math.min(...values))
  return Math.max(spread(points.map(p => p.x)), spread(points.map(p => p.y)), 1e-6)
}

export const samePlace = (a: Point, b: Point, size: number): boolean => Math.hypot(a.x - b.x, a.y - b.y) <= SAME_PLACE * size

/** A number as it is written: ten figures at most, and zero where nothing but the writing of binary numbers is left. */
function figuresOf(value: number, size: number): string {
  return Math.abs(value) < SAME_PLACE * size ? '0' : String(Number(value.toPrecision(FIGURES)))
}

export const lengthText = (mm: number, unit: UnitId, size: number): TypedQuantity => ({ text: figuresOf(fromEngine(mm, unit), fromEngine(size, unit)), unit })
export const angleText = (rad: number): TypedQuantity => ({ text: figuresOf(rad * 180 / Math.PI, 1), unit: '°' })

/** Directions are written between −180° and 180°. */
const within = (rad: number): number => {
  const turned = Math.atan2(Math.sin(rad), Math.cos(rad))
  return Math.abs(turned + Math.PI) < 1e-12 ? Math.PI : turned
}

export const straightEnd = (a: Point, b: Point, unit: UnitId, size: number): WallEndInput =>
  ({ by: 'length', length: lengthText(Math.hypot(b.x - a.x, b.y - a.y), unit, size), direction: angleText(within(Math.atan2(b.y - a.y, b.x - a.x))) })

export const pointEnd = (b: Point, unit: UnitId, size: number): WallEndInput => ({ by: 'point', x: lengthText(b.x, unit, size), y: lengthText(b.y, unit, size) })

export const arcEnd = (arc: Arc, unit: UnitId, size: number): WallEndInput =>
  ({ by: 'arc', radius: lengthText(arc.radius, unit, size), sweep: angleText(arc.sweep), direction: angleText(within(arc.direction)) })

/** By length and direction where both are round, by its end otherwise. */
function freshEnd(a: Point, b: Point, arc: Arc | null, { unit, read }: Writing, size: number): WallEndInput {
  if (arc) return arcEnd(arc, unit, size)
  const end = straightEnd(a, b, unit, size)
  const round = end.by === 'length' && end.length.text.length <= SHORT && /^-?\d+$/.test(end.direction.text)
  const lead = round ? leadOf(end, read) : null
  return lead?.step && samePlace(added(a, lead.step), b, size) ? end : pointEnd(b, unit, size)
}

/** What was typed, if it still leads from the one place to the other along the same line. */
function keptEnd({ input, arc }: PlacedWall, a: Point, b: Point, { read }: Writing, size: number): WallEndInput | null {
  const lead = leadOf(input.end, read)
  if (!lead) return null
  if ((lead.arc === null) !== (arc === null)) return null
  if (lead.arc && arc && (Math.abs(lead.arc.radius - arc.radius) > SAME_PLACE * size || Math.abs(lead.arc.sweep - arc.sweep) > SAME_PLACE)) return null
  const end = lead.end ?? added(a, lead.step ?? { x: 0, y: 0 })
  return samePlace(end, b, size) ? input.end : null
}

/** The same wall from its last node to its first. */
export function turnedRound(wall: PlacedWall): PlacedWall {
  const { input } = wall
  return {
    id: wall.id, from: wall.to, to: wall.from,
    arc: wall.arc && { radius: wall.arc.radius, sweep: -wall.arc.sweep, direction: wall.arc.direction + wall.arc.sweep + Math.PI },
    input: input.tEnd ? { ...input, t: input.tEnd, tEnd: input.t } : input,
  }
}

/** Backwards from a placed last node only a length or an arc leads; a wall given by its end is turned round. */
function writtenWall(wall: PlacedWall, section: PlacedSection, here: ReadonlyMap<string, Point>, how: Writing, size: number): WallInput | null {
  const [a, b] = [section.nodes.get(wall.from), section.nodes.get(wall.to)]
  if (!a || !b) return null
  const entry = (one: PlacedWall, end: WallEndInput): WallInput => ({ ...one.input, id: one.id, from: one.from, to: one.to, end })
  const [start, target] = [here.get(wall.from), here.get(wall.to)]
  if (start) return entry(wall, keptEnd(wall, start, b, how, size) ?? freshEnd(start, b, wall.arc, how, size))
  if (!target) return null
  const end = keptEnd(wall, a, b, how, size) ?? freshEnd(a, b, wall.arc, how, size)
  if (end.by !== 'point') return entry(wall, end)
  const turned = turnedRound(wall)
  return entry(turned, freshEnd(target, a, turned.arc, how, size))
}

/**
 * Order, names and thicknesses stay. Nodes are placed as the evaluation will place them, so that what the
 * writing of one wall leaves off is made good by the next.
 */
export function writtenTable(section: PlacedSection, before: Pick<WallTable, 'start'>, how: Writing): WallTable {
  const size = sizeOf(section.nodes.values())
  const root = section.walls[0]?.from ?? ''
  const origin = section.nodes.get(root) ?? { x: 0, y: 0 }
  const [x, y] = [how.read(before.start.x, 'length'), how.read(before.start.y, 'length')]
  const stays = x !== null && y !== null && samePlace({ x, y }, origin, size)
  const start = stays ? before.start : { x: lengthText(origin.x, how.unit, size), y: lengthText(origin.y, how.unit, size) }
  const here = new Map<string, Point>([[root, origin]])
  const written = new Map<PlacedWall, WallInput>()
  for (let moved = true; moved;) {
    moved = false
    for (const wall of section.walls) {
      const entry = written.has(wall) ? null : writtenWall(wall, section, here, how, size)
      if (!entry) continue
      written.set(wall, entry)
      settle(entry, here, how)
      moved = true
    }
  }
  return { start, walls: [...section.walls.flatMap(wall => written.get(wall) ?? []), ...section.loose], junctions: [...section.junctions] }
}

function settle({ from, to, end }: WallInput, here: Map<string, Point>, { read }: Writing) {
  const lead = leadOf(end, read)
  const [a, b] = [here.get(from), here.get(to)]
  if (a && !b && lead) here.set(to, lead.end ?? added(a, lead.step ?? { x: 0, y: 0 }))
  else if (!a && b && lead?.step) here.set(from, taken(b, lead.step))
}
