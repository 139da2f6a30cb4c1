/** Plane geometry of walls: end points, arcs, directions. mm and rad, angles counter-clockwise from +x. */
import type { OpenWall, Point, Refusal, WallArc } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

export const distance = (a: Point, b: Point): number => Math.hypot(b.x - a.x, b.y - a.y)
export const along = (from: Point, direction: number, length: number): Point => ({ x: from.x + length * Math.cos(direction), y: from.y + length * Math.sin(direction) })
export const directionOf = (from: Point, to: Point): number => Math.atan2(to.y - from.y, to.x - from.x)

/** An angle brought into (−π, π]. */
export function turn(angle: number): number {
  const once = angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI))
  return once <= -Math.PI ? once + 2 * Math.PI : once
}

/** End of a straight wall given by its length and direction. */
export const wallEnd = (from: Point, length: number, direction: number): Point => along(from, direction, length)

export interface ArcPath {
  readonly kind: 'arc'
  readonly start: Point
  /** Tangent at the start. */
  readonly startDirection: number
  readonly centre: Point
  readonly radius: number
  /** Angle of the radius to the start. */
  readonly startAngle: number
  readonly sweep: number
}
export interface LinePath { readonly kind: 'line', readonly start: Point, readonly end: Point }
export type WallPath = ArcPath | LinePath

/**
 * The point of an arc after `part` (0…1) of its sweep. Taken from the start and
 * not from the centre, which lies far off when a wall is curved only slightly.
 */
export function arcPoint({ start, startDirection, radius, sweep }: ArcPath, part: number): Point {
  const half = part * sweep / 2
  return along(start, startDirection + half, 2 * radius * Math.abs(Math.sin(half)))
}

/** An arc that leaves `from` with a given tangent; it turns left for a positive sweep. */
export function arcFromTangent(from: Point, startDirection: number, radius: number, sweep: number): ArcPath {
  const left = Math.sign(sweep) * Math.PI / 2
  const start = { x: from.x, y: from.y }
  return { kind: 'arc', start, startDirection, centre: along(from, startDirection + left, radius), radius, startAngle: startDirection - left, sweep }
}

/** End of an arc wall given by its start tangent, mid-line radius and swept angle, with the tangent there. */
export function arcEnd(from: Point, startDirection: number, radius: number, sweep: number): { end: Point, direction: number } {
  return { end: arcPoint(arcFromTangent(from, startDirection, radius, sweep), 1), direction: turn(startDirection + sweep) }
}

/** Largest mismatch between an arc's chord and the distance of its nodes, as a part of the radius. */
const chordTolerance = 1e-6

/**
 * The arc between two nodes. The tangent at its start lies half the sweep
 * before the chord, for any sweep below a full circle. Refused, with
 * the reason, where radius and sweep do not reach from one node to the other.
 */
export function arcBetween(from: Point, to: Point, arc: WallArc): ArcPath | Refusal {
  const { radius, sweep, startDirection } = arc
  const chord = 2 * radius * Math.abs(Math.sin(sweep / 2))
  const slack = chordTolerance * radius
  if (startDirection === undefined && chord <= slack) return refusal('Its ends coincide, so the direction in which it starts is needed.')
  const tangent = startDirection ?? directionOf(from, to) - sweep / 2
  const path = arcFromTangent(from, tangent, radius, sweep)
  const missed = distance(arcPoint(path, 1), to)
  if (missed > Math.max(slack, chordTolerance * chord)) return refusal(`Its radius and swept angle miss the end node by ${missed.toPrecision(3)} mm.`)
  return path
}

/** The path of a wall between its nodes. */
export function wallPath(wall: OpenWall, from: Point, to: Point): WallPath | Refusal {
  return wall.arc ? arcBetween(from, to, wall.arc) : { kind: 'line', start: { x: from.x, y: from.y }, end: { x: to.x, y: to.y } }
}

export function pathLength(path: WallPath): number {
  return path.kind === 'line' ? distance(path.start, path.end) : path.radius * Math.abs(path.sweep)
}

export const pathStart = (path: WallPath): Point => path.start
export const pathEnd = (path: WallPath): Point => (path.kind === 'line' ? path.end : arcPoint(path, 1))

/** The point after `part` (0…1) of the length. */
export function pathPoint(path: WallPath, part: number): Point {
  if (path.kind === 'arc') return arcPoint(path, part)
  return { x: path.start.x + part * (path.end.x - path.start.x), y: path.start.y + part * (path.end.y - path.start.y) }
}

/** Direction of the tangent after `part` (0…1) of the length. */
export const tangentAt = (path: WallPath, part: number): number =>
  (path.kind === 'line' ? directionOf(path.start, path.end) : path.startDirection + part * path.sweep)

/** Direction in which the path leaves its start, or leaves its end when walked backwards. */
export function leavingDirection(path: WallPath, end: 'start' | 'end'): number {
  if (path.kind === 'line') return end === 'start' ? directionOf(path.start, path.end) : directionOf(path.end, path.start)
  return end === 'start' ? path.startDirection : path.startDirection + path.sweep + Math.PI
}

/** A path drawn as points: the ends of a line, an arc in chords of at most `step` rad. */
export function pathPoints(path: WallPath, step = Math.PI / 36): Point[] {
  if (path.kind === 'line') return [path.start, path.end]
  const count = Math.max(2, Math.ceil(Math.abs(path.sweep) / step))
  return Array.from({ length: count + 1 }, (_, index) => arcPoint(path, index / count))
}
