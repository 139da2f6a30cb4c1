/**
 * The outline of a section as the two-dimensional method takes it: one outer
 * loop, any number of holes, straight and circular edges. mm. This type is all
 * that the method shares with the thin-walled theories (methods reference §4).
 */

/** A corner of a loop, and the edge that runs from it to the next. */
export interface OutlineVertex {
  readonly x: number
  readonly y: number
  /** Edge from here to the next vertex as an arc: tangent of a quarter of the swept angle, + counter-clockwise; 0 or absent: straight. */
  readonly bulge?: number
  /** Name of the edge that starts here. */
  readonly name?: string
}

/** A boundary loop: vertices in order; each edge runs to the next vertex, the last to the first. Either winding is accepted. */
export type OutlineLoop = readonly OutlineVertex[]

export interface Outline { readonly outer: OutlineLoop, readonly holes: readonly OutlineLoop[] }

/** Why an outline or its solution cannot be given: a sentence for the analyst, never a guessed number. */
export interface OutlineRefusal { readonly ok: false, readonly reason: string }
export const outlineRefusal = (reason: string): OutlineRefusal => ({ ok: false, reason })

export interface PlanePoint { readonly x: number, readonly y: number }

/** The circle an arc edge lies on. Angles in rad; the edge runs from `startAngle` through `sweep`. */
export interface EdgeArc { readonly cx: number, readonly cy: number, readonly radius: number, readonly startAngle: number, readonly sweep: number }

/** One edge with its geometry worked out. */
export interface OutlineEdge {
  /** 0: outer loop; 1, 2, …: holes in order. */
  readonly loop: number
  /** Position in its loop. */
  readonly index: number
  readonly name: string
  readonly a: PlanePoint
  readonly b: PlanePoint
  readonly length: number
  readonly arc: EdgeArc | null
}

/** A bulge below this is straight: the arc leaves its chord by 5e-8 of it at most. */
const straightBulge = 1e-7

/** The arc over a chord by its bulge; null for a straight edge. */
export function edgeArc(a: PlanePoint, b: PlanePoint, bulge = 0): EdgeArc | null {
  if (Math.abs(bulge) < straightBulge) return null
  const [dx, dy] = [b.x - a.x, b.y - a.y]
  const chord = Math.hypot(dx, dy)
  const off = (1 - bulge * bulge) / (4 * bulge)
  const [cx, cy] = [(a.x + b.x) / 2 - dy * off, (a.y + b.y) / 2 + dx * off]
  const radius = chord * (1 + bulge * bulge) / (4 * Math.abs(bulge))
  return { cx, cy, radius, startAngle: Math.atan2(a.y - cy, a.x - cx), sweep: 4 * Math.atan(bulge) }
}

const edgeName = (loop: number, index: number): string => (loop === 0 ? `edge ${index + 1}` : `hole ${loop} edge ${index + 1}`)

/** The edges of a loop; an edge without a name is called by its place. */
export function loopEdges(vertices: OutlineLoop, loop = 0): OutlineEdge[] {
  return vertices.map((a, index) => {
    const b = vertices[(index + 1) % vertices.length] ?? a
    const arc = edgeArc(a, b, a.bulge)
    const length = arc ? arc.radius * Math.abs(arc.sweep) : Math.hypot(b.x - a.x, b.y - a.y)
    return { loop, index, name: a.name ?? edgeName(loop, index), a: { x: a.x, y: a.y }, b: { x: b.x, y: b.y }, length, arc }
  })
}

/** Every edge, the outer loop first. */
export const outlineEdges = ({ outer, holes }: Outline): OutlineEdge[] =>
  [outer, ...holes].flatMap((loop, index) => loopEdges(loop, index))

/** The point after `part` (0…1) of an edge. */
export function edgePoint({ a, b, arc }: OutlineEdge, part: number): PlanePoint {
  if (!arc) return { x: a.x + part * (b.x - a.x), y: a.y + part * (b.y - a.y) }
  const angle = arc.startAngle + part * arc.sweep
  return { x: arc.cx + arc.radius * Math.cos(angle), y: arc.cy + arc.radius * Math.sin(angle) }
}

/** Direction of travel after `part` (0…1) of an edge, rad from +x. */
export function edgeDirection({ a, b, arc }: OutlineEdge, part: number): number {
  if (!arc) return Math.atan2(b.y - a.y, b.x - a.x)
  return arc.startAngle + part * arc.sweep + Math.sign(arc.sweep) * Math.PI / 2
}

/** The same loop walked the other way: each edge keeps its name and its shape. */
export function reversedLoop(vertices: OutlineLoop): OutlineVertex[] {
  const count = vertices.length
  return vertices.map((_, index) => {
    const [from, edge] = [vertices[(count - index) % count], vertices[count - 1 - index]]
    return { x: from?.x ?? 0, y: from?.y ?? 0, bulge: -(edge?.bulge ?? 0), ...(edge?.name === undefined ? {} : { name: edge.name }) }
  })
}

/** The loop of a full circle, as two arcs. */
export const circleLoop = (x: number, y: number, radius: number, name?: string): OutlineVertex[] =>
  [-1, 1].map(side => ({ x: x + side * radius, y, bulge: 1, ...(name === undefined ? {} : { name }) }))
