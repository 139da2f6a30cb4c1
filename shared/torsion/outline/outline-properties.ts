/**
 * Area, centroid and second moments of an outline, exact to rounding: polygon
 * formulas for the vertices, and for every arc the segment between it and its
 * chord (methods reference §13a: compared with the boundary elements at every
 * run). Loops must be walked with the material on the left.
 */
import type { Outline, OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import { edgeDirection, edgePoint, outlineEdges } from '#shared/torsion/outline/outline'
import { gaussLegendre } from '#shared/torsion/outline/gauss-legendre'

/** mm², mm, mm⁴; second moments about the centroid, Ixx = ∫y² dA, Iyy = ∫x² dA, Ixy = ∫xy dA. */
export interface AreaProperties {
  readonly A: number
  readonly centroid: PlanePoint
  readonly Ixx: number
  readonly Iyy: number
  readonly Ixy: number
  /** Ixx + Iyy. */
  readonly Ip: number
}

/** ∫1, ∫x, ∫y, ∫x², ∫y², ∫xy. */
type Moments = [number, number, number, number, number, number]

const add = (sum: Moments, more: Moments): void => more.forEach((value, index) => {
  sum[index] = (sum[index] ?? 0) + value
})

/** Triangle from the origin over an edge, signed. */
function triangle({ a, b }: OutlineEdge): Moments {
  const c = (a.x * b.y - b.x * a.y)
  return [
    c / 2, c * (a.x + b.x) / 6, c * (a.y + b.y) / 6,
    c * (a.x * a.x + a.x * b.x + b.x * b.x) / 12, c * (a.y * a.y + a.y * b.y + b.y * b.y) / 12,
    c * (2 * a.x * a.y + a.x * b.y + b.x * a.y + 2 * b.x * b.y) / 24,
  ]
}

/** 24 nodes integrate the powers of sine and cosine met here to rounding for any sweep up to a full circle. */
const segmentNodes = 24

/** Segment between an arc and its chord, about the chord's middle: u towards the arc, v along the chord. */
function segmentAboutChord(radius: number, half: number): { A: number, u: number, uu: number, vv: number } {
  const { nodes, weights } = gaussLegendre(segmentNodes)
  let [A, u, uu, vv] = [0, 0, 0, 0]
  for (const [index, node] of nodes.entries()) {
    const angle = half * node
    // The difference of the cosines as a product: nothing cancels on a flat arc.
    const height = 2 * radius * Math.sin((half + angle) / 2) * Math.sin((half - angle) / 2)
    const v = radius * Math.sin(angle)
    const dv = (weights[index] ?? 0) * half * radius * Math.cos(angle)
    A += height * dv
    u += height * height / 2 * dv
    uu += height ** 3 / 3 * dv
    vv += v * v * height * dv
  }
  return { A, u, uu, vv }
}

function segment(edge: OutlineEdge): Moments {
  const { a, b, arc } = edge
  if (!arc) return [0, 0, 0, 0, 0, 0]
  const sign = Math.sign(arc.sweep)
  const { A, u, uu, vv } = segmentAboutChord(arc.radius, Math.abs(arc.sweep) / 2)
  const [mx, my] = [(a.x + b.x) / 2, (a.y + b.y) / 2]
  const middle = edgePoint(edge, 0.5)
  const axis = Math.atan2(middle.y - arc.cy, middle.x - arc.cx)
  const [ex, ey] = [Math.cos(axis), Math.sin(axis)]
  return [
    A, A * mx + u * ex, A * my + u * ey,
    A * mx * mx + 2 * mx * u * ex + uu * ex * ex + vv * ey * ey,
    A * my * my + 2 * my * u * ey + uu * ey * ey + vv * ex * ex,
    A * mx * my + u * (mx * ey + my * ex) + (uu - vv) * ex * ey,
  ].map(value => sign * value) as Moments
}

function momentsOf(edges: readonly OutlineEdge[], shift: PlanePoint): Moments {
  const sum: Moments = [0, 0, 0, 0, 0, 0]
  for (const edge of edges) {
    const { a, b, arc } = edge
    const moved: OutlineEdge = {
      ...edge, a: { x: a.x - shift.x, y: a.y - shift.y }, b: { x: b.x - shift.x, y: b.y - shift.y },
      arc: arc && { ...arc, cx: arc.cx - shift.x, cy: arc.cy - shift.y },
    }
    add(sum, triangle(moved))
    add(sum, segment(moved))
  }
  return sum
}

/** Signed area of edges: positive where they are walked counter-clockwise. */
export const signedArea = (edges: readonly OutlineEdge[]): number => momentsOf(edges, edges[0]?.a ?? { x: 0, y: 0 })[0]

/** Properties by edges with the material on their left. Taken about a vertex first, so that a far-off origin costs no digits. */
export function propertiesOfEdges(edges: readonly OutlineEdge[]): AreaProperties {
  const start = edges[0]?.a ?? { x: 0, y: 0 }
  const rough = momentsOf(edges, start)
  const centroid = { x: start.x + rough[1] / rough[0], y: start.y + rough[2] / rough[0] }
  const [A, , , Iyy, Ixx, Ixy] = momentsOf(edges, centroid)
  return { A, centroid, Ixx, Iyy, Ixy, Ip: Ixx + Iyy }
}

/** Properties of an outline whose outer loop runs counter-clockwise and whose holes run clockwise (`checkOutline` gives such a one). */
export const outlineProperties = (outline: Outline): AreaProperties => propertiesOfEdges(outlineEdges(outline))

/** ∫ρ² dA and ∫ρ⁴ dA about a point, mm⁴ and mm⁶, what large twist needs (§7.7). */
export interface PolarMoments { readonly second: number, readonly fourth: number }

/** By ∇·(ρ² r⃗) = 4ρ² and ∇·(ρ⁴ r⃗) = 6ρ⁴ along edges with the material on their left. */
export function polarMoments(edges: readonly OutlineEdge[], about: PlanePoint): PolarMoments {
  const { nodes, weights } = gaussLegendre(segmentNodes)
  let [second, fourth] = [0, 0]
  for (const edge of edges) {
    for (const [index, node] of nodes.entries()) {
      const part = (node + 1) / 2
      const at = edgePoint(edge, part)
      const [x, y] = [at.x - about.x, at.y - about.y]
      const direction = edgeDirection(edge, part)
      const reach = (x * Math.sin(direction) - y * Math.cos(direction)) * (weights[index] ?? 0) * edge.length / 2
      const square = x * x + y * y
      second += square * reach / 4
      fourth += square * square * reach / 6
    }
  }
  return { second, fourth }
}
