/**
 * The curve on which one side of a wall lies: a whole line or a whole circle with a sense of travel. Offsets to the
 * left, where curves meet, and the nearest point of a curve. mm, rad.
 */
import type { PlanePoint } from '#shared/torsion/outline/outline'

export interface SideLine { readonly kind: 'line', readonly at: PlanePoint, readonly direction: number }
export interface SideCircle { readonly kind: 'circle', readonly centre: PlanePoint, readonly radius: number, /** + counter-clockwise. */ readonly sense: 1 | -1 }
export type SideCurve = SideLine | SideCircle

const apart = (p: PlanePoint, q: PlanePoint): number => Math.hypot(p.x - q.x, p.y - q.y)
const ahead = (from: PlanePoint, direction: number, length: number): PlanePoint => ({ x: from.x + length * Math.cos(direction), y: from.y + length * Math.sin(direction) })

/** The curve moved to the left of its travel; null where a circle would shrink to nothing. */
export function movedLeft(curve: SideCurve, by: number): SideCurve | null {
  if (curve.kind === 'line') return { ...curve, at: ahead(curve.at, curve.direction + Math.PI / 2, by) }
  const radius = curve.radius - curve.sense * by
  return radius > 1e-9 * curve.radius ? { ...curve, radius } : null
}

/** The point of the curve nearest to a point. */
export function footOn(curve: SideCurve, point: PlanePoint): PlanePoint {
  if (curve.kind === 'circle') return ahead(curve.centre, Math.atan2(point.y - curve.centre.y, point.x - curve.centre.x), curve.radius)
  const [ux, uy] = [Math.cos(curve.direction), Math.sin(curve.direction)]
  return ahead(curve.at, curve.direction, (point.x - curve.at.x) * ux + (point.y - curve.at.y) * uy)
}

/** Direction of travel at a point of the curve. */
export const directionAt = (curve: SideCurve, point: PlanePoint): number =>
  (curve.kind === 'line' ? curve.direction : Math.atan2(point.y - curve.centre.y, point.x - curve.centre.x) + curve.sense * Math.PI / 2)

function lineWithLine(p: SideLine, q: SideLine): PlanePoint[] {
  const area = Math.sin(q.direction - p.direction)
  if (Math.abs(area) < 1e-9) return []
  const along = ((q.at.x - p.at.x) * Math.sin(q.direction) - (q.at.y - p.at.y) * Math.cos(q.direction)) / area
  return [ahead(p.at, p.direction, along)]
}

/** On either side of the foot of the centre. Curves that only just miss each other are taken to touch. */
function eitherSide(foot: PlanePoint, direction: number, square: number, size: number): PlanePoint[] {
  if (square < -1e-9 * size * size) return []
  const half = Math.sqrt(Math.max(square, 0))
  return [ahead(foot, direction, half), ahead(foot, direction, -half)]
}

function lineWithCircle(line: SideLine, circle: SideCircle): PlanePoint[] {
  const foot = footOn(line, circle.centre)
  return eitherSide(foot, line.direction, circle.radius ** 2 - apart(foot, circle.centre) ** 2, circle.radius)
}

function circleWithCircle(p: SideCircle, q: SideCircle): PlanePoint[] {
  const between = apart(p.centre, q.centre)
  if (between < 1e-9 * p.radius) return []
  const axis = Math.atan2(q.centre.y - p.centre.y, q.centre.x - p.centre.x)
  const along = (between ** 2 + p.radius ** 2 - q.radius ** 2) / (2 * between)
  return eitherSide(ahead(p.centre, axis, along), axis + Math.PI / 2, p.radius ** 2 - along ** 2, p.radius)
}

function meetings(p: SideCurve, q: SideCurve): PlanePoint[] {
  if (p.kind === 'line') return q.kind === 'line' ? lineWithLine(p, q) : lineWithCircle(p, q)
  return q.kind === 'line' ? lineWithCircle(q, p) : circleWithCircle(p, q)
}

/** Where two curves meet nearest to a point; null where they do not. */
export function meetingNear(p: SideCurve, q: SideCurve, near: PlanePoint): PlanePoint | null {
  return meetings(p, q).reduce<PlanePoint | null>((best, one) => (best && apart(best, near) <= apart(one, near) ? best : one), null)
}
