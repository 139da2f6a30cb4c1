/** Corner radii of a drawing put into a loop: an arc in place of the vertex, tangent to both of its straight edges. */
import type { OutlineLoop, OutlineRefusal, OutlineVertex, PlanePoint } from '#shared/torsion/outline/outline'
import { outlineRefusal } from '#shared/torsion/outline/outline'

/** A vertex with the radius its corner is rounded by; 0 or absent: sharp. mm */
export interface DrawnVertex extends OutlineVertex { readonly radius?: number, /** Name of the arc that rounds the corner. */ readonly cornerName?: string }

interface Corner { readonly vertex: DrawnVertex, /** From the vertex to the ends of the arc. */ readonly cut: number, readonly bulge: number, readonly into: PlanePoint, readonly outOf: PlanePoint }

const unit = (from: PlanePoint, to: PlanePoint): PlanePoint & { length: number } => {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  return { x: (to.x - from.x) / length, y: (to.y - from.y) / length, length }
}

/** Rounds to the drawing: edges may be used up to the last part in a million. */
const slack = 1e-9

function cornerOf(vertices: readonly DrawnVertex[], index: number): Corner | OutlineRefusal {
  const vertex = vertices[index]
  const before = vertices[(index + vertices.length - 1) % vertices.length]
  const after = vertices[(index + 1) % vertices.length]
  if (!vertex || !before || !after) return outlineRefusal('The loop needs at least two vertices.')
  const [into, outOf] = [unit(before, vertex), unit(vertex, after)]
  const radius = vertex.radius ?? 0
  if (radius === 0) return { vertex, cut: 0, bulge: 0, into, outOf }
  if (!(radius > 0)) return outlineRefusal(`The corner radius at vertex ${index + 1} must not be negative.`)
  if (before.bulge || vertex.bulge) return outlineRefusal(`Vertex ${index + 1} joins an arc; only corners between straight edges are rounded. Draw the arc as an edge of its own.`)
  const turn = Math.atan2(into.x * outOf.y - into.y * outOf.x, into.x * outOf.x + into.y * outOf.y)
  if (Math.abs(turn) < 1e-6) return outlineRefusal(`Vertex ${index + 1} is no corner; remove its radius.`)
  return { vertex, cut: radius * Math.abs(Math.tan(turn / 2)), bulge: Math.tan(turn / 4), into, outOf }
}

/**
 * The loop with its corners rounded. Refused where a radius does not fit on
 * the edges, or stands at an arc, with the vertex counted from one.
 */
export function roundedLoop(vertices: readonly DrawnVertex[]): { readonly ok: true, readonly loop: OutlineLoop } | OutlineRefusal {
  const corners: Corner[] = []
  for (const [index] of vertices.entries()) {
    const corner = cornerOf(vertices, index)
    if ('ok' in corner) return corner
    corners.push(corner)
  }
  for (const [index, corner] of corners.entries()) {
    const next = corners[(index + 1) % corners.length]
    const length = next ? Math.hypot(next.vertex.x - corner.vertex.x, next.vertex.y - corner.vertex.y) : 0
    if (next && corner.cut + next.cut > length * (1 + slack)) {
      return outlineRefusal(`The corner radii at vertices ${index + 1} and ${(index + 1) % corners.length + 1} take ${Number((corner.cut + next.cut).toPrecision(4))} mm of an edge of ${Number(length.toPrecision(4))} mm; make them smaller.`)
    }
  }
  return { ok: true, loop: corners.flatMap((corner, index) => roundedVertices(corner, corners[(index + 1) % corners.length])) }
}

/** The start of the arc, and its end where the straight edge goes on from there. */
function roundedVertices({ vertex, cut, bulge, into, outOf }: Corner, next: Corner | undefined): OutlineVertex[] {
  const edge = { bulge: vertex.bulge ?? 0, ...(vertex.name === undefined ? {} : { name: vertex.name }) }
  if (cut === 0) return [{ x: vertex.x, y: vertex.y, ...edge }]
  const length = next ? Math.hypot(next.vertex.x - vertex.x, next.vertex.y - vertex.y) : 0
  const start: OutlineVertex = { x: vertex.x - cut * into.x, y: vertex.y - cut * into.y, bulge, ...(vertex.cornerName === undefined ? {} : { name: vertex.cornerName }) }
  // Where two arcs use the whole edge, nothing straight is left between them.
  if (next && cut + next.cut > length * (1 - slack)) return [start]
  return [start, { x: vertex.x + cut * outOf.x, y: vertex.y + cut * outOf.y, ...edge }]
}
