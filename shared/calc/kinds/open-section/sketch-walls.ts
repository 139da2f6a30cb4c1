/** Outlines of the walls: faces at half the thickness either side of the mid-line, bends round, corners mitred, fillets filled. */
import type { Shape } from '#shared/calc/types'
import { thicknessAlong, thicknessAtNode, type ModelWall } from '#shared/calc/parts/wall-model'
import type { CornerSolution, Solution } from '#shared/calc/kinds/open-section/solution'

export type Pt = [number, number]
/** A point of the mid-line with the direction in which the wall runs there. */
interface Station { at: Pt, direction: number }
interface End { node: string, atStart: boolean }

const STEP = Math.PI / 36
const PARALLEL = 1e-3

export const polar = ([x, y]: Pt, direction: number, length: number): Pt => [x + length * Math.cos(direction), y + length * Math.sin(direction)]

/** The mid-line of a wall without regard to bends: two points, or an arc in short chords. */
export function midLine(s: Solution, wall: ModelWall): Station[] {
  const from = s.model.nodes.find(n => n.id === wall.from)
  const to = s.model.nodes.find(n => n.id === wall.to)
  if (!from || !to) return []
  if (!wall.arc) return [{ at: [from.x, from.y], direction: wall.startDirection }, { at: [to.x, to.y], direction: wall.endDirection }]
  const { radius, sweep, direction } = wall.arc
  const side = Math.sign(sweep) * Math.PI / 2
  const centre = polar([from.x, from.y], direction + side, radius)
  const count = Math.max(4, Math.ceil(Math.abs(sweep) / STEP))
  return Array.from({ length: count + 1 }, (_, i) => {
    const now = direction + sweep * i / count
    return { at: polar(centre, now - side, radius), direction: now }
  })
}

/** One closed outline per wall; the first half of the points is one face, the second half the other, back. */
export function wallShapes(s: Solution, level: (wall: string) => number): Shape[] {
  return s.walls.map(({ wall }) => {
    const stations = bendEnds(s, wall, midLine(s, wall))
    const half = (i: number) => thicknessAlong(wall, i / (stations.length - 1)) / 2
    const left = stations.map(({ at, direction }, i) => polar(at, direction + Math.PI / 2, half(i)))
    const right = stations.map(({ at, direction }, i) => polar(at, direction - Math.PI / 2, half(i)))
    closeEnd(s, wall, { node: wall.from, atStart: true }, left, right)
    closeEnd(s, wall, { node: wall.to, atStart: false }, left, right)
    return { type: 'path', points: [...left, ...right.reverse()], closed: true, role: 'wall', level: level(wall.id), wall: wall.id }
  })
}

const isBent = (c: CornerSolution | undefined): c is CornerSolution => c?.junction?.make === 'bent' && c.junction.radius.value > 0 && c.walls.length === 2 && c.walls.every(w => !w.arc)

/** Where a bend replaces the corner, the wall stops at the tangent point and takes half of the bend. */
function bendEnds(s: Solution, wall: ModelWall, stations: Station[]): Station[] {
  const first = stations[0]
  const last = stations.at(-1)
  if (!first || !last || stations.length !== 2) return stations
  const start = halfBend(s, wall, wall.from, { at: first.at, direction: first.direction + Math.PI })
  const end = halfBend(s, wall, wall.to, last)
  const back = start?.map(({ at, direction }) => ({ at, direction: direction + Math.PI })).reverse()
  return [...(back ?? [first]), ...(end ?? [last])]
}

/** From the tangent point to the middle of the bend, for a wall that arrives at the node. */
function halfBend(s: Solution, wall: ModelWall, node: string, arriving: Station): Station[] | null {
  const corner = s.corners.find(c => c.node === node)
  if (!isBent(corner)) return null
  const other = corner.walls.find(w => w !== wall)
  if (!other) return null
  const turn = wrap(leavingDirection(other, node) - arriving.direction)
  const side = Math.sign(turn) * Math.PI / 2
  const radius = (corner.junction?.radius.value ?? 0) + wall.t.value / 2
  const tangent = polar(arriving.at, arriving.direction + Math.PI, radius * Math.tan(Math.abs(turn) / 2))
  const centre = polar(tangent, arriving.direction + side, radius)
  const count = Math.max(2, Math.ceil(Math.abs(turn) / 2 / STEP))
  return Array.from({ length: count + 1 }, (_, i) => {
    const direction = arriving.direction + turn / 2 * i / count
    return { at: polar(centre, direction - side, radius), direction }
  })
}

export const leavingDirection = (wall: ModelWall, node: string): number => wall.from === node ? wall.startDirection : wall.endDirection + Math.PI

function wrap(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI))
}

/** At an unbent node both faces run on to those of the neighbours, and the outline ends in the node itself. */
function closeEnd(s: Solution, wall: ModelWall, end: End, left: Pt[], right: Pt[]) {
  const corner = s.corners.find(c => c.node === end.node)
  const meeting = s.model.walls.filter(w => w.from === end.node || w.to === end.node)
  const at = s.model.nodes.find(n => n.id === end.node)
  if (meeting.length < 2 || isBent(corner) || !at) return
  const node: Pt = [at.x, at.y]
  const [ccw, cw] = facesAtNode(wall, meeting, end.node, node)
  // Seen along the wall, what lies counter-clockwise of the leaving direction is left at its start and right at its end.
  if (end.atStart) {
    left.splice(0, 1, node, ccw)
    right.splice(0, 1, node, cw)
  } else {
    left.splice(-1, 1, cw, node)
    right.splice(-1, 1, ccw, node)
  }
}

/** Where the faces of a wall meet those of its neighbours, counter-clockwise and clockwise of its leaving direction. */
function facesAtNode(wall: ModelWall, meeting: ModelWall[], node: string, at: Pt): [Pt, Pt] {
  const own = leavingDirection(wall, node)
  const half = thicknessAtNode(wall, node) / 2
  const others = meeting.filter(w => w !== wall).map(w => ({ half: thicknessAtNode(w, node) / 2, angle: positive(leavingDirection(w, node) - own) }))
  const next = others.reduce((a, b) => b.angle < a.angle ? b : a)
  const previous = others.reduce((a, b) => b.angle > a.angle ? b : a)
  const corner = (angle: number, theirs: number, side: 1 | -1): Pt => polar(polar(at, own, reach(angle, half, theirs)), own + side * Math.PI / 2, half)
  return [corner(next.angle, next.half, 1), corner(2 * Math.PI - previous.angle, previous.half, -1)]
}

/** How far along the wall its face meets a neighbour's face at that angle; negative runs past the node (a mitre). */
function reach(angle: number, half: number, theirs: number): number {
  const sine = Math.sin(angle)
  if (Math.abs(sine) < PARALLEL) return 0
  const limit = 3 * Math.max(half, theirs)
  return Math.min(Math.max((theirs + half * Math.cos(angle)) / sine, -limit), limit)
}

function positive(angle: number): number {
  const full = 2 * Math.PI
  const turned = ((angle % full) + full) % full
  return turned < 1e-9 ? full : turned
}

/** The material of machined fillets, drawn at the stress level of the wall it joins. */
export function filletShapes(s: Solution, level: (wall: string) => number): Shape[] {
  return s.corners.flatMap((c): Shape[] => {
    const r = c.junction?.radius.value ?? 0
    const at = s.model.nodes.find(n => n.id === c.node)
    if (c.junction?.make !== 'machined' || r <= 0 || !at) return []
    const ring = c.walls.map(w => ({ wall: w, angle: leavingDirection(w, c.node) })).sort((a, b) => positive(a.angle) - positive(b.angle))
    return ring.flatMap(({ wall, angle }, i): Shape[] => {
      const next = ring[(i + 1) % ring.length]
      if (!next || next.wall === wall) return []
      const between = positive(next.angle - angle)
      if (between > 175 * Math.PI / 180) return []
      return [fillet([at.x, at.y], angle, thicknessAtNode(wall, c.node) / 2, thicknessAtNode(next.wall, c.node) / 2, between, r, Math.max(level(wall.id), level(next.wall.id)))]
    })
  })
}

function fillet(node: Pt, angle: number, half: number, theirs: number, between: number, r: number, level: number): Shape {
  const inner = polar(polar(node, angle, reach(between, half, theirs)), angle + Math.PI / 2, half)
  const tangent = r / Math.tan(between / 2)
  const centre = polar(inner, angle + between / 2, r / Math.sin(between / 2))
  const start = angle - Math.PI / 2
  const sweep = -(Math.PI - between)
  const count = Math.max(3, Math.ceil(Math.abs(sweep) / STEP))
  const arc = Array.from({ length: count + 1 }, (_, i) => polar(centre, start + sweep * i / count, r))
  return { type: 'path', points: [inner, polar(inner, angle, tangent), ...arc, polar(inner, angle + between, tangent)], closed: true, role: 'wall', level }
}
