/**
 * What a drawing does to a placed section: pure, mm and rad. Nodes that an edit does not name stay where they
 * are. A refusal is a sentence that says what to do instead.
 */
import type { WallInput } from '#shared/calc/parts/wall-fields'
import { nextLetters, nextNumbered } from '#shared/calc/walls/names'
import type { Arc, PlacedSection, PlacedWall } from '#shared/calc/walls/placed'
import { samePlace, sizeOf } from '#shared/calc/walls/written'
import type { TypedQuantity } from '#shared/calc/types'
import type { Point } from '#shared/torsion/section'

export type Edited = { ok: true, section: PlacedSection, /** The node or wall that is new or was changed. */ node?: string, wall?: string } | { ok: false, reason: string }

const refused = (reason: string): Edited => ({ ok: false, reason })
const nothing: TypedQuantity = { text: '', unit: 'mm' }
/** Beyond this sweep the two ends of an arc lie together, and the chord between them says nothing about the circle. */
export const RING = 2 * Math.PI - 0.01

export const nodeNames = (section: PlacedSection): string[] => [...section.nodes.keys(), ...section.loose.flatMap(wall => [wall.from, wall.to])]
export const wallNames = (section: PlacedSection): string[] => [...section.walls, ...section.loose].map(wall => wall.id)
export const wallsAt = (section: PlacedSection, node: string): PlacedWall[] => section.walls.filter(wall => wall.from === node || wall.to === node)

/** The arc of a given sweep over a chord. */
export function arcOver(a: Point, b: Point, sweep: number): Arc {
  const chord = Math.hypot(b.x - a.x, b.y - a.y)
  return { radius: chord / (2 * Math.sin(Math.abs(sweep) / 2)), sweep, direction: Math.atan2(b.y - a.y, b.x - a.x) - sweep / 2 }
}

/** The arc of a given radius over a chord, no more than half a circle, on the side it lay before. */
export function arcOfRadius(a: Point, b: Point, radius: number, side: 1 | -1): Arc | null {
  const ratio = Math.hypot(b.x - a.x, b.y - a.y) / (2 * radius)
  return ratio > 0 && ratio <= 1 ? arcOver(a, b, side * 2 * Math.asin(ratio)) : null
}

/** Arcs keep their sweep when an end moves. */
function refitted(wall: PlacedWall, nodes: ReadonlyMap<string, Point>): PlacedWall {
  const [a, b] = [nodes.get(wall.from), nodes.get(wall.to)]
  return wall.arc && a && b && Math.abs(wall.arc.sweep) < RING ? { ...wall, arc: arcOver(a, b, wall.arc.sweep) } : wall
}

/** Moves one node; every other stays. Refused where a wall would lose its length, or a ring its circle. */
export function moveNode(section: PlacedSection, id: string, to: Point): Edited {
  const size = sizeOf([...section.nodes.values(), to])
  const here = wallsAt(section, id)
  if (!section.nodes.has(id)) return refused(`There is no node ${id}.`)
  if (here.some(wall => wall.arc && Math.abs(wall.arc.sweep) >= RING)) return refused('The ends of a full circle lie together. Give it a smaller swept angle, and then move its end.')
  const other = here.map(wall => section.nodes.get(wall.from === id ? wall.to : wall.from))
  if (other.some(end => end && samePlace(end, to, size))) return refused('A wall would have no length there. Remove the wall, or move the node elsewhere.')
  const nodes = new Map([...section.nodes, [id, to] as const])
  return { ok: true, node: id, section: { ...section, nodes, walls: section.walls.map(wall => (wall.from === id || wall.to === id ? refitted(wall, nodes) : wall)) } }
}

/** An end of a new wall: a node that is there, or a free place. */
export type DrawnEnd = { node: string } | { at: Point }
/** What a new wall takes from the one drawn before it. */
export type WallLike = Pick<WallInput, 't' | 'material'>

/** A straight wall. Joined to what is there at one end at least, unless it is the first. */
export function addWall(section: PlacedSection, ends: readonly [DrawnEnd, DrawnEnd], like: WallLike): Edited {
  const nodes = new Map(section.nodes)
  const names = nodeNames(section)
  const ids = ends.map((end) => {
    if ('node' in end) return end.node
    const id = nextNumbered('', names)
    names.push(id)
    nodes.set(id, end.at)
    return id
  })
  const [from = '', to = ''] = ids
  const [a, b] = [nodes.get(from), nodes.get(to)]
  if (!a || !b) return refused('There is no such node.')
  if (from === to || samePlace(a, b, sizeOf(nodes.values()))) return refused('The wall has no length. Place its other end elsewhere.')
  if (section.walls.length > 0 && ends.every(end => 'at' in end)) return refused('One end of a new wall is at a node of the section. Begin or end it there.')
  if (wallsAt(section, from).some(wall => !wall.arc && (wall.from === to || wall.to === to))) return refused(`A wall already runs from node ${from} to node ${to}.`)
  const id = nextLetters(wallNames(section))
  const input: WallInput = { id, name: '', from, to, end: { by: 'point', x: nothing, y: nothing }, t: { ...like.t }, material: like.material }
  return { ok: true, wall: id, node: to, section: { ...section, nodes, walls: [...section.walls, { id, from, to, arc: null, input }] } }
}

const between = (a: Point, b: Point, part: number): Point => ({ x: a.x + (b.x - a.x) * part, y: a.y + (b.y - a.y) * part })

/** The place after a part (0…1) of a wall. */
export function placeOn(wall: PlacedWall, a: Point, b: Point, part: number): Point {
  if (!wall.arc) return between(a, b, part)
  const { radius, sweep, direction } = wall.arc
  const side = Math.sign(sweep)
  const normal = direction + side * Math.PI / 2
  const centre = { x: a.x + radius * Math.cos(normal), y: a.y + radius * Math.sin(normal) }
  const out = normal + Math.PI + sweep * part
  return { x: centre.x + radius * Math.cos(out), y: centre.y + radius * Math.sin(out) }
}

/** A thickness between two, at figures that can be read. */
function thicknessBetween(t: TypedQuantity, tEnd: TypedQuantity, part: number): TypedQuantity {
  const [one, other] = [Number(t.text), Number(tEnd.text)]
  return t.unit === tEnd.unit && Number.isFinite(one + other) ? { text: String(Number((one + (other - one) * part).toPrecision(10))), unit: t.unit } : { ...t }
}

/** Two walls for one, with a node between them; the second takes the next free letter. */
export function splitWall(section: PlacedSection, id: string, part = 0.5): Edited {
  const wall = section.walls.find(one => one.id === id)
  const [a, b] = [wall && section.nodes.get(wall.from), wall && section.nodes.get(wall.to)]
  if (!wall || !a || !b) return refused('Choose the wall to split.')
  const [node, letter] = [nextNumbered('', nodeNames(section)), nextLetters(wallNames(section))]
  const { input, arc } = wall
  const tMiddle = input.tEnd ? thicknessBetween(input.t, input.tEnd, part) : null
  const first: PlacedWall = { ...wall, to: node, arc: arc && { ...arc, sweep: arc.sweep * part }, input: { ...input, to: node, ...(tMiddle ? { tEnd: tMiddle } : {}) } }
  const second: PlacedWall = {
    id: letter, from: node, to: wall.to, arc: arc && { ...arc, sweep: arc.sweep * (1 - part), direction: arc.direction + arc.sweep * part },
    input: { ...input, id: letter, from: node, ...(tMiddle ? { t: tMiddle } : {}) },
  }
  return {
    ok: true, node, wall: id,
    section: { ...section, nodes: new Map([...section.nodes, [node, placeOn(wall, a, b, part)]]), walls: section.walls.flatMap(one => (one === wall ? [first, second] : [one])) },
  }
}

/** Bends a wall into an arc of this sweep between its ends (+ counter-clockwise), or straightens it with zero. */
export function curveWall(section: PlacedSection, id: string, sweep: number): Edited {
  const wall = section.walls.find(one => one.id === id)
  const [a, b] = [wall && section.nodes.get(wall.from), wall && section.nodes.get(wall.to)]
  if (!wall || !a || !b) return refused('Choose the wall to curve.')
  if (Math.abs(sweep) >= RING) return refused('Between two ends an arc sweeps less than a full circle.')
  if (samePlace(a, b, sizeOf(section.nodes.values()))) return refused('The ends of this arc lie together. Move one of them first.')
  const arc = sweep === 0 ? null : arcOver(a, b, sweep)
  return { ok: true, wall: id, section: { ...section, walls: section.walls.map(one => (one === wall ? { ...one, arc } : one)) } }
}

/** Whether every wall can be reached from the first. */
export function isJoined(walls: readonly Pick<PlacedWall, 'from' | 'to'>[]): boolean {
  const reached = new Set(walls.slice(0, 1).flatMap(wall => [wall.from, wall.to]))
  for (let before = 0; before < reached.size;) {
    before = reached.size
    for (const { from, to } of walls) if (reached.has(from) || reached.has(to)) reached.add(from).add(to)
  }
  return walls.every(wall => reached.has(wall.from))
}

/** Takes a wall out, with the nodes and corners that only it had. */
export function removeWall(section: PlacedSection, id: string): Edited {
  const walls = section.walls.filter(wall => wall.id !== id)
  if (walls.length === section.walls.length) return refused('Choose the wall to remove.')
  if (walls.length === 0) return refused('A section keeps one wall at least. Draw another before removing this one.')
  if (!isJoined(walls)) return refused(`Wall ${id} holds the section together. Remove the walls beyond it first, or join them elsewhere.`)
  const meeting = (node: string) => walls.filter(wall => wall.from === node || wall.to === node).length
  return {
    ok: true,
    section: { ...section, walls, nodes: new Map([...section.nodes].filter(([node]) => meeting(node) > 0)), junctions: section.junctions.filter(({ node }) => meeting(node) > 1) },
  }
}
