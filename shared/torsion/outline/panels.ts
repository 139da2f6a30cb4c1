/**
 * The boundary in panels: stretches of one edge that carry a polynomial
 * shear, with Gauss nodes on the exact line or circle. Lengths are in units
 * of the solution (mm over the scale), about the centroid.
 */
import type { OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import { edgePoint } from '#shared/torsion/outline/outline'
import { gaussLegendre } from '#shared/torsion/outline/gauss-legendre'

export interface Panel {
  readonly edge: OutlineEdge
  readonly loop: number
  /** Parts of the edge at its two ends. */
  readonly from: number
  readonly to: number
  /** First of its nodes. */
  readonly first: number
  /** Half its length along the boundary. */
  readonly half: number
  /** Middle of the panel. */
  readonly mx: number
  readonly my: number
  /** Unit tangent in the middle. */
  readonly tx: number
  readonly ty: number
  readonly arc: { readonly cx: number, readonly cy: number, readonly radius: number, /** Angle of the middle. */ readonly middle: number, /** Half the swept angle, signed. */ readonly halfSweep: number } | null
}

export interface PanelMesh {
  readonly order: number
  readonly panels: readonly Panel[]
  readonly count: number
  readonly x: Float64Array
  readonly y: Float64Array
  /** Outward normal: away from the material. */
  readonly nx: Float64Array
  readonly ny: Float64Array
  /** Share of the boundary's length. */
  readonly w: Float64Array
  readonly loopOf: Int32Array
  readonly loops: number
}

/** A stretch of an edge. */
export interface Stretch { readonly edge: OutlineEdge, readonly from: number, readonly to: number }

function panelOf({ edge, from, to }: Stretch, first: number, origin: PlanePoint, scale: number): Panel {
  const middle = edgePoint(edge, (from + to) / 2)
  const base = { edge, loop: edge.loop, from, to, first, half: edge.length * (to - from) / 2 / scale, mx: (middle.x - origin.x) / scale, my: (middle.y - origin.y) / scale }
  if (!edge.arc) {
    return { ...base, tx: (edge.b.x - edge.a.x) / edge.length, ty: (edge.b.y - edge.a.y) / edge.length, arc: null }
  }
  const { cx, cy, radius, startAngle, sweep } = edge.arc
  const [angle, sense] = [startAngle + sweep * (from + to) / 2, Math.sign(sweep)]
  const arc = { cx: (cx - origin.x) / scale, cy: (cy - origin.y) / scale, radius: radius / scale, middle: angle, halfSweep: sweep * (to - from) / 2 }
  return { ...base, tx: -sense * Math.sin(angle), ty: sense * Math.cos(angle), arc }
}

/** Panels with `order` Gauss nodes each, in the order of the stretches. */
export function panelMesh(stretches: readonly Stretch[], order: number, origin: PlanePoint, scale: number): PanelMesh {
  const { nodes, weights } = gaussLegendre(order)
  const panels = stretches.map((stretch, index) => panelOf(stretch, index * order, origin, scale))
  const count = panels.length * order
  const [x, y, nx, ny, w] = [new Float64Array(count), new Float64Array(count), new Float64Array(count), new Float64Array(count), new Float64Array(count)]
  const loopOf = new Int32Array(count)
  for (const { first, half, mx, my, tx, ty, arc, loop } of panels) {
    for (let k = 0; k < order; k += 1) {
      const [at, u] = [first + k, nodes[k] ?? 0]
      w[at] = (weights[k] ?? 0) * half
      loopOf[at] = loop
      if (arc) {
        const angle = arc.middle + arc.halfSweep * u
        const [c, s, sense] = [Math.cos(angle), Math.sin(angle), Math.sign(arc.halfSweep)]
        x[at] = arc.cx + arc.radius * c
        y[at] = arc.cy + arc.radius * s
        nx[at] = sense * c
        ny[at] = sense * s
      } else {
        x[at] = mx + half * u * tx
        y[at] = my + half * u * ty
        nx[at] = ty
        ny[at] = -tx
      }
    }
  }
  return { order, panels, count, x, y, nx, ny, w, loopOf, loops: 1 + Math.max(0, ...panels.map(({ loop }) => loop)) }
}
