/** Reads a wall table and places its nodes. */
import type { JunctionInput, WallEndInput, WallInput, WallTable } from '#shared/calc/parts/wall-fields'
import type { ModelJunction, ModelNode, ModelWall, Seam } from '#shared/calc/parts/wall-model'
import type { MaterialModel } from '#shared/calc/parts/model'
import type { TypedReader } from '#shared/calc/parts/typed-reader'

export interface Geometry { nodes: ModelNode[], walls: ModelWall[], junctions: ModelJunction[], seams: Seam[] }
interface Point { x: number, y: number }
/** A wall as read, before its ends have a place: either an end point, or a step from its start. */
interface Reach { end: Point | null, step: Point | null, arc?: { radius: number, sweep: number, direction: number }, lengthTyped: string | null }

const FULL_TURN = 2 * Math.PI
/** Two ends are one when they are closer than this share of the section's size (G-07). */
export const SEAM_TOLERANCE = 1e-6

/**
 * Numbers, places and materials of every wall; null where a fault was noted. A wall that ends on a node
 * placed elsewhere is a seam: its end stands at a node of its own, and the gap is told.
 */
export function parseWalls(inputs: WallTable & { materials: readonly { id: string }[] }, materials: MaterialModel[], read: TypedReader): Geometry | null {
  checkNames(inputs, read)
  const x = read.number(inputs.start.x, 'start.x', { label: 'the x of the first node', dimension: 'length' })
  const y = read.number(inputs.start.y, 'start.y', { label: 'the y of the first node', dimension: 'length' })
  const reaches = inputs.walls.map((wall, i) => readReach(wall.end, `walls.${i}.end`, read))
  const thicknesses = inputs.walls.map((wall, i) =>
    read.positive(wall.t, `walls.${i}.t`, { label: `the thickness of wall ${wall.id}`, dimension: 'length', typical: 'thickness' }))
  const endThicknesses = inputs.walls.map((wall, i) => wall.tEnd
    ? read.positive(wall.tEnd, `walls.${i}.tEnd`, { label: `the thickness at the end of wall ${wall.id}`, dimension: 'length', typical: 'thickness' })
    : null)
  const junctions = inputs.junctions.flatMap((junction, i) => readJunction(junction, i, inputs.walls, read))
  const walls = inputs.walls.map((wall, i) => {
    const material = materials.find(m => m.id === wall.material)
    if (!inputs.materials.some(m => m.id === wall.material)) read.fault(`walls.${i}.material`, `Choose the material of wall ${wall.id}.`)
    return { wall, reach: reaches[i] ?? null, t: thicknesses[i] ?? null, tEnd: endThicknesses[i] ?? null, material }
  })
  if (inputs.walls.length === 0) read.fault('walls', 'Add at least one wall.')
  if (read.faults.length > 0 || !x || !y) return null

  const places = placeNodes(inputs.walls, reaches, { x: x.value, y: y.value }, read)
  if (!places) return null
  const model: ModelWall[] = []
  walls.forEach(({ wall, reach, t, tEnd, material }, i) => {
    const to = places.ends[i]
    const from = places.nodes.get(wall.from)
    if (!reach || !t || !material || !to || !from) return
    const target = places.nodes.get(to)
    const length = reach.arc ? reach.arc.radius * Math.abs(reach.arc.sweep) : target ? Math.hypot(target.x - from.x, target.y - from.y) : 0
    const tMax = Math.max(t.value, tEnd?.value ?? 0)
    if (reach.arc && reach.arc.radius <= tMax / 2) read.fault(`walls.${i}.end.radius`, `The mid-line radius of arc ${wall.id} must be more than half its thickness.`)
    if (!(length > 0)) read.fault(`walls.${i}.end`, `G-06: wall ${wall.id} has no length; move its end or remove it.`)
    model.push({
      id: wall.id, name: wall.name, from: wall.from, to, t, tEnd, tMax, material, length,
      ...directionsOf(reach, from, target ?? from), G: material.G, E: material.E, lengthTyped: reach.lengthTyped, ...(reach.arc ? { arc: reach.arc } : {}),
    })
  })
  if (read.faults.length > 0) return null
  return { nodes: [...places.nodes].map(([id, p]) => ({ id, ...p })), walls: model, junctions, seams: places.seams }
}

function directionsOf({ arc }: Reach, from: Point, to: Point): { startDirection: number, endDirection: number } {
  const straight = Math.atan2(to.y - from.y, to.x - from.x)
  return arc ? { startDirection: arc.direction, endDirection: arc.direction + arc.sweep } : { startDirection: straight, endDirection: straight }
}

function checkNames(inputs: WallTable, read: TypedReader) {
  const ids = new Set<string>()
  inputs.walls.forEach((wall, i) => {
    if (ids.has(wall.id)) read.fault(`walls.${i}.id`, `Wall ${wall.id} is named twice; give each wall its own letter.`)
    ids.add(wall.id)
    if (wall.from === wall.to) read.fault(`walls.${i}.to`, `Wall ${wall.id} ends where it starts; name another node.`)
  })
  const nodes = new Set<string>()
  inputs.junctions.forEach((junction, i) => {
    if (nodes.has(junction.node)) read.fault(`junctions.${i}.node`, `Node ${junction.node} has two corner entries; keep one.`)
    nodes.add(junction.node)
  })
}

function readReach(end: WallEndInput, path: string, read: TypedReader): Reach | null {
  if (end.by === 'point') {
    const x = read.number(end.x, `${path}.x`, { label: 'the x of the end', dimension: 'length' })
    const y = read.number(end.y, `${path}.y`, { label: 'the y of the end', dimension: 'length' })
    return x && y ? { end: { x: x.value, y: y.value }, step: null, lengthTyped: null } : null
  }
  const direction = read.number(end.direction, `${path}.direction`, { label: 'the direction', dimension: 'angle' })
  if (end.by === 'length') {
    const length = read.positive(end.length, `${path}.length`, { label: 'the length', dimension: 'length', typical: 'wall length' })
    if (!length || !direction) return null
    return { end: null, step: stepAlong(direction.value, length.value), lengthTyped: shownAsTyped(length) }
  }
  const radius = read.positive(end.radius, `${path}.radius`, { label: 'the radius', dimension: 'length', typical: 'wall length' })
  const sweep = read.number(end.sweep, `${path}.sweep`, { label: 'the swept angle', dimension: 'angle' })
  if (!radius || !sweep || !direction) return null
  if (Math.abs(sweep.value) < 1e-6 || Math.abs(sweep.value) > FULL_TURN * (1 + 1e-12)) {
    read.fault(`${path}.sweep`, 'Give a swept angle of at most 360°, either way round, and not zero.')
    return null
  }
  return { end: null, step: arcStep(radius.value, sweep.value, direction.value), arc: { radius: radius.value, sweep: sweep.value, direction: direction.value }, lengthTyped: `R ${shownAsTyped(radius)}` }
}

const shownAsTyped = (q: { typed: string, unit: string }) => q.typed.includes(q.unit) ? q.typed.replace(q.unit, '').trim() : q.typed

/** A step in a direction, mm and rad. */
export const stepAlong = (direction: number, length: number): Point => ({ x: length * exact(Math.cos(direction)), y: length * exact(Math.sin(direction)) })

/** Right angles typed in degrees stay right angles: cos(90°) is zero, not 6e-17. */
function exact(value: number): number {
  const rounded = Math.round(value * 2) / 2
  return Math.abs(value - rounded) < 1e-15 ? rounded : value
}

/** From the start along an arc whose tangent at the start has the given direction. */
export function arcStep(radius: number, sweep: number, direction: number): Point {
  const side = Math.sign(sweep)
  const normal = direction + side * Math.PI / 2
  const centre = stepAlong(normal, radius)
  const out = stepAlong(normal + Math.PI + sweep, radius)
  return { x: centre.x + out.x, y: centre.y + out.y }
}

function readJunction(junction: JunctionInput, i: number, walls: WallInput[], read: TypedReader): ModelJunction[] {
  const radius = read.number(junction.radius, `junctions.${i}.radius`, { label: `the radius at node ${junction.node}`, dimension: 'length', typical: 'radius' })
  const meeting = walls.filter(w => w.from === junction.node || w.to === junction.node).length
  if (meeting < 2) {
    read.fault(`junctions.${i}.node`, `Fewer than two walls meet at node ${junction.node}; remove its corner or name another node.`)
    return []
  }
  if (radius && radius.value < 0) {
    read.fault(`junctions.${i}.radius`, `G-01: the radius at node ${junction.node} must not be negative.`)
    return []
  }
  return radius ? [{ node: junction.node, radius, make: junction.make }] : []
}

/** Walks the wall table until every node has a place. A wall that ends on a placed node closes a loop: its end is split off. */
function placeNodes(walls: WallInput[], reaches: (Reach | null)[], start: Point, read: TypedReader) {
  const nodes = new Map<string, Point>()
  const ends: string[] = []
  const open: { wall: string, node: string, split: string, index: number }[] = []
  const first = walls[0]
  if (!first) return null
  nodes.set(first.from, start)
  let waiting = walls.map((_, i) => i)
  for (let moved = true; moved && waiting.length > 0;) {
    const left: number[] = []
    for (const i of waiting) {
      const wall = walls[i]
      const reach = reaches[i]
      if (!wall || !reach || !placeWall(wall, reach, i, nodes, ends, open)) left.push(i)
    }
    moved = left.length < waiting.length
    waiting = left
  }
  for (const i of waiting) read.fault(`walls.${i}.from`, `Wall ${walls[i]?.id ?? ''} is joined to no other wall; start it at a node that another wall reaches.`)
  if (waiting.length > 0) return null
  const points = [...nodes.values()]
  const size = Math.max(spread(points.map(p => p.x)), spread(points.map(p => p.y)))
  return { nodes, ends, seams: open.map(o => seamOf(o, nodes, size)) }
}

function placeWall(wall: WallInput, reach: Reach, i: number, nodes: Map<string, Point>, ends: string[], open: { wall: string, node: string, split: string, index: number }[]): boolean {
  const from = nodes.get(wall.from)
  const to = nodes.get(wall.to)
  if (from) {
    const end = reach.end ?? { x: from.x + (reach.step?.x ?? 0), y: from.y + (reach.step?.y ?? 0) }
    if (!to) nodes.set(wall.to, end)
    const name = to ? `${wall.to}'${i}` : wall.to
    if (to) {
      nodes.set(name, end)
      open.push({ wall: wall.id, node: wall.to, split: name, index: i })
    }
    ends[i] = name
    return true
  }
  // A wall drawn towards a known node by length or arc: its start is found backwards.
  if (to && reach.step) {
    nodes.set(wall.from, { x: to.x - reach.step.x, y: to.y - reach.step.y })
    ends[i] = wall.to
    return true
  }
  return false
}

function seamOf(seam: { wall: string, node: string, split: string }, nodes: Map<string, Point>, size: number): Seam {
  const a = nodes.get(seam.node)
  const b = nodes.get(seam.split)
  return { wall: seam.wall, node: seam.node, gap: a && b ? Math.hypot(a.x - b.x, a.y - b.y) : 0, size }
}

function spread(values: number[]): number {
  return values.length === 0 ? 0 : Math.max(...values) - Math.min(...values)
}
