/** How near edges come to each other and to a point, and where they cross. */
import type { OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import { edgePoint } from '#shared/torsion/outline/outline'

export interface NearPoint { readonly distance: number, /** 0…1 along the edge. */ readonly part: number }

const fullTurn = 2 * Math.PI
const separation = (p: PlanePoint, q: PlanePoint): number => Math.hypot(p.x - q.x, p.y - q.y)

/** Where along an arc a direction from its centre lies: 0…1 on it, more than 1 beyond it. */
function arcPart({ arc }: OutlineEdge, angle: number): number {
  if (!arc) return 0
  const sense = Math.sign(arc.sweep)
  const swept = ((sense * (angle - arc.startAngle)) % fullTurn + fullTurn) % fullTurn
  return swept / Math.abs(arc.sweep)
}

const nearerEnd = (point: PlanePoint, { a, b }: OutlineEdge): NearPoint => {
  const [toA, toB] = [separation(point, a), separation(point, b)]
  return toA <= toB ? { distance: toA, part: 0 } : { distance: toB, part: 1 }
}

/** The point of an edge nearest to a point. */
export function nearestOnEdge(point: PlanePoint, edge: OutlineEdge): NearPoint {
  const { a, b, arc } = edge
  if (arc) {
    const [dx, dy] = [point.x - arc.cx, point.y - arc.cy]
    const part = arcPart(edge, Math.atan2(dy, dx))
    return part <= 1 ? { distance: Math.abs(Math.hypot(dx, dy) - arc.radius), part } : nearerEnd(point, edge)
  }
  const [dx, dy] = [b.x - a.x, b.y - a.y]
  const part = ((point.x - a.x) * dx + (point.y - a.y) * dy) / (dx * dx + dy * dy)
  return part > 0 && part < 1 ? { distance: Math.abs((point.x - a.x) * dy - (point.y - a.y) * dx) / Math.hypot(dx, dy), part } : nearerEnd(point, edge)
}

/** A point given as parts of two edges. */
export interface EdgePair { readonly p: number, readonly q: number, readonly distance: number }

/** Feet of the common normals of two edges in their interiors, crossings (distance 0) among them. */
function innerPairs(p: OutlineEdge, q: OutlineEdge): PlanePoint[] {
  if (!p.arc && !q.arc) {
    const [px, py, qx, qy] = [p.b.x - p.a.x, p.b.y - p.a.y, q.b.x - q.a.x, q.b.y - q.a.y]
    const area = px * qy - py * qx
    if (area === 0) return []
    const s = ((q.a.x - p.a.x) * qy - (q.a.y - p.a.y) * qx) / area
    return s >= 0 && s <= 1 ? [edgePoint(p, s)] : []
  }
  if (p.arc && q.arc) return circleWithCircle(p, q)
  return p.arc ? lineWithCircle(q, p) : lineWithCircle(p, q)
}

function lineWithCircle({ a, b }: OutlineEdge, { arc }: OutlineEdge): PlanePoint[] {
  if (!arc) return []
  const length = separation(a, b)
  const [ux, uy] = [(b.x - a.x) / length, (b.y - a.y) / length]
  const foot = (arc.cx - a.x) * ux + (arc.cy - a.y) * uy
  const off = (arc.cx - a.x) * uy - (arc.cy - a.y) * ux
  // The common normal is told by its points on the circle: from a centre that lies on the line every way is as near.
  const feet = [1, -1].map(side => ({ x: arc.cx - side * arc.radius * uy, y: arc.cy + side * arc.radius * ux }))
  const half = Math.abs(off) < arc.radius ? Math.sqrt(arc.radius ** 2 - off ** 2) : 0
  return [...feet, ...(half === 0 ? [] : [foot - half, foot + half]).map(at => ({ x: a.x + at * ux, y: a.y + at * uy }))]
}

function circleWithCircle({ arc: p }: OutlineEdge, { arc: q }: OutlineEdge): PlanePoint[] {
  if (!p || !q) return []
  const apart = Math.hypot(q.cx - p.cx, q.cy - p.cy)
  if (apart === 0) return []
  const [ux, uy] = [(q.cx - p.cx) / apart, (q.cy - p.cy) / apart]
  const feet = [1, -1].map(side => ({ x: p.cx + side * p.radius * ux, y: p.cy + side * p.radius * uy }))
  if (apart > p.radius + q.radius || apart < Math.abs(p.radius - q.radius)) return feet
  const along = (apart ** 2 + p.radius ** 2 - q.radius ** 2) / (2 * apart)
  const half = Math.sqrt(Math.max(0, p.radius ** 2 - along ** 2))
  return [...feet, ...[half, -half].map(side => ({ x: p.cx + along * ux - side * uy, y: p.cy + along * uy + side * ux }))]
}

/** Every local nearness of two edges: their ends against the other edge, and common normals between. The least distance is exact. */
export function nearPairs(p: OutlineEdge, q: OutlineEdge): EdgePair[] {
  const fromEnds = [
    ...[0, 1].map((part) => {
      const { distance, part: other } = nearestOnEdge(part === 0 ? p.a : p.b, q)
      return { p: part, q: other, distance }
    }),
    ...[0, 1].map((part) => {
      const { distance, part: other } = nearestOnEdge(part === 0 ? q.a : q.b, p)
      return { p: other, q: part, distance }
    }),
  ]
  const between = innerPairs(p, q).map((point) => {
    const [onP, onQ] = [nearestOnEdge(point, p).part, nearestOnEdge(point, q).part]
    return { p: onP, q: onQ, distance: separation(edgePoint(p, onP), edgePoint(q, onQ)) }
  })
  return [...fromEnds, ...between]
}

export interface Box { readonly left: number, readonly right: number, readonly low: number, readonly high: number }

/** A box round an edge: for an arc the box of its circle where it passes an axis, else of its ends and middle widened by nothing lost. */
export function edgeBox(edge: OutlineEdge): Box {
  const { a, b, arc } = edge
  const points = [a, b]
  if (arc) {
    for (const quarter of [0, 1, 2, 3]) {
      const angle = quarter * Math.PI / 2
      const part = arcPart(edge, angle)
      if (part <= 1) points.push(edgePoint(edge, part))
    }
  }
  const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)]
  return { left: Math.min(...xs), right: Math.max(...xs), low: Math.min(...ys), high: Math.max(...ys) }
}

/** Distance of two boxes; 0 where they overlap. */
export const boxDistance = (p: Box, q: Box): number =>
  Math.hypot(Math.max(0, p.left - q.right, q.left - p.right), Math.max(0, p.low - q.high, q.low - p.high))
