/** Where two stretches of mid-line meet apart from their common node: walls may meet at nodes only (G-06). */
import type { Point } from '#shared/torsion/section'
import type { ArcPath, LinePath } from '#shared/torsion/geometry'
import type { Piece } from '#shared/torsion/mid-line'
import { directionOf, distance, pathEnd, pathPoint, pathStart } from '#shared/torsion/geometry'

/** What two paths have in common: points, or a whole stretch (`overlap`). */
interface Meeting { readonly points: readonly Point[], readonly overlap: boolean }
const apart: Meeting = { points: [], overlap: false }

const dot = (ax: number, ay: number, bx: number, by: number): number => ax * bx + ay * by
const cross = (ax: number, ay: number, bx: number, by: number): number => ax * by - ay * bx

function lineWithLine(p: LinePath, q: LinePath, slack: number): Meeting {
  const [px, py, qx, qy] = [p.end.x - p.start.x, p.end.y - p.start.y, q.end.x - q.start.x, q.end.y - q.start.y]
  const [dx, dy] = [q.start.x - p.start.x, q.start.y - p.start.y]
  const [pl, ql] = [Math.hypot(px, py), Math.hypot(qx, qy)]
  const area = cross(px, py, qx, qy)
  if (Math.abs(area) > 1e-9 * pl * ql) {
    const [s, u] = [cross(dx, dy, qx, qy) / area, cross(dx, dy, px, py) / area]
    const inside = (part: number, length: number): boolean => part * length > -slack && (part - 1) * length < slack
    return inside(s, pl) && inside(u, ql) ? { points: [pathPoint(p, s)], overlap: false } : apart
  }
  if (pl <= slack || ql <= slack || Math.abs(cross(px, py, dx, dy)) > slack * pl) return apart
  const [a, b] = [dot(dx, dy, px, py) / pl, dot(dx + qx, dy + qy, px, py) / pl]
  const [low, high] = [Math.max(0, Math.min(a, b)), Math.min(pl, Math.max(a, b))]
  if (high - low > slack) return { points: [], overlap: true }
  return high - low > -slack ? { points: [pathPoint(p, low / pl)], overlap: false } : apart
}

/** Whether a point on the circle lies within the sweep, ends included; with a negative slack, ends left out. */
function onArc(arc: ArcPath, point: Point, slack: number): boolean {
  const sense = Math.sign(arc.sweep)
  const full = 2 * Math.PI
  const swept = ((sense * (directionOf(arc.centre, point) - arc.startAngle)) % full + full) % full
  const extra = slack / arc.radius
  if (extra < 0) return swept >= -extra && swept <= Math.abs(arc.sweep) + extra
  return swept <= Math.abs(arc.sweep) + extra || swept >= full - extra
}

function lineWithArc(line: LinePath, arc: ArcPath, slack: number): Meeting {
  const length = distance(line.start, line.end)
  if (length <= slack) return apart
  const [ux, uy] = [(line.end.x - line.start.x) / length, (line.end.y - line.start.y) / length]
  const foot = dot(arc.centre.x - line.start.x, arc.centre.y - line.start.y, ux, uy)
  const off = cross(ux, uy, arc.centre.x - line.start.x, arc.centre.y - line.start.y)
  if (Math.abs(off) > arc.radius + slack) return apart
  const half = Math.sqrt(Math.max(0, arc.radius ** 2 - off ** 2))
  const points = [foot - half, foot + half]
    .filter(at => at > -slack && at < length + slack)
    .map(at => ({ x: line.start.x + at * ux, y: line.start.y + at * uy }))
    .filter(point => onArc(arc, point, slack))
  return { points, overlap: false }
}

function arcWithArc(p: ArcPath, q: ArcPath, slack: number): Meeting {
  const apartBy = distance(p.centre, q.centre)
  if (apartBy <= slack) return Math.abs(p.radius - q.radius) <= slack ? sameCircle(p, q, slack) : apart
  if (apartBy > p.radius + q.radius + slack || apartBy < Math.abs(p.radius - q.radius) - slack) return apart
  const along = (apartBy ** 2 + p.radius ** 2 - q.radius ** 2) / (2 * apartBy)
  const half = Math.sqrt(Math.max(0, p.radius ** 2 - along ** 2))
  const [ux, uy] = [(q.centre.x - p.centre.x) / apartBy, (q.centre.y - p.centre.y) / apartBy]
  const points = [half, -half]
    .map(side => ({ x: p.centre.x + along * ux - side * uy, y: p.centre.y + along * uy + side * ux }))
    .filter(point => onArc(p, point, slack) && onArc(q, point, slack))
  return { points, overlap: false }
}

/** Two arcs of one circle overlap when the middle of the stretch from either end lies inside the other. */
function sameCircle(p: ArcPath, q: ArcPath, slack: number): Meeting {
  const inner = (arc: ArcPath, point: Point): boolean => onArc(arc, point, -10 * slack)
  const probes = [0, 0.5, 1]
  const overlap = probes.some(part => inner(p, pathPoint(q, part))) || probes.some(part => inner(q, pathPoint(p, part)))
  return { points: [], overlap }
}

function meet(p: Piece, q: Piece, slack: number): Meeting {
  const [a, b] = [p.path, q.path]
  if (a.kind === 'line') return b.kind === 'line' ? lineWithLine(a, b, slack) : lineWithArc(a, b, slack)
  return b.kind === 'line' ? lineWithArc(b, a, slack) : arcWithArc(a, b, slack)
}

const isEnd = (piece: Piece, point: Point, near: number): boolean =>
  distance(pathStart(piece.path), point) <= near || distance(pathEnd(piece.path), point) <= near

export interface Crossing { readonly a: Piece, readonly b: Piece, readonly at: Point | null }

/**
 * Pairs of pieces that cross, touch or lie on one another away from their ends.
 * Two ends at one place are no crossing: they share a node or form an open seam.
 * Where a line leaves an arc tangentially the common point is known to the root
 * of the rounding error only, hence the wider `near`.
 */
export function crossings(pieces: readonly Piece[], size: number): Crossing[] {
  const [slack, near] = [1e-9 * size, 1e-6 * size]
  const found: Crossing[] = []
  for (const [index, a] of pieces.entries()) {
    for (const b of pieces.slice(index + 1)) {
      const { points, overlap } = meet(a, b, slack)
      const at = points.find(point => !(isEnd(a, point, near) && isEnd(b, point, near)))
      if (overlap || at) found.push({ a, b, at: at ?? null })
    }
  }
  return found
}
