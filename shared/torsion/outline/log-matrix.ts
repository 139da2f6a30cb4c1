/**
 * ∫ ℓ_j ln r ds from every node to every panel: plain Gauss weights where the
 * panel is far, exact product weights where it is near, the panel of the node
 * itself among them.
 */
import type { Panel, PanelMesh } from '#shared/torsion/outline/panels'
import { logRule } from '#shared/torsion/outline/legendre-log'

/** Panels nearer than this many half lengths get exact weights; farther off the recurrence of the exact weights would lose what Gauss weights keep. */
const nearWithin = 4

interface Frame { readonly re: number, readonly im: number }

/** The node in the complex plane of the panel, where the panel is −1…1. On an arc by the logarithm of the plane about its centre. */
function inPanel({ mx, my, tx, ty, half, arc }: Panel, x: number, y: number): Frame {
  if (!arc) {
    const [dx, dy] = [(x - mx) / half, (y - my) / half]
    return { re: dx * tx + dy * ty, im: dy * tx - dx * ty }
  }
  const [dx, dy] = [x - arc.cx, y - arc.cy]
  const [c, s] = [Math.cos(arc.middle), Math.sin(arc.middle)]
  return { re: Math.atan2(dy * c - dx * s, dx * c + dy * s) / arc.halfSweep, im: -0.5 * Math.log((dx * dx + dy * dy) / (arc.radius * arc.radius)) / arc.halfSweep }
}

/** Row by row, with room for further equations: entry i·stride + j is ∫ ℓ_j(s) ln|P_i − Q(s)| ds. */
export function logMatrix(mesh: PanelMesh, stride: number): Float64Array {
  const { order, count, panels, x, y, w } = mesh
  const rule = logRule(order)
  const matrix = new Float64Array(stride * stride)
  const exact = new Float64Array(order)
  for (const panel of panels) {
    const { first, half, mx, my } = panel
    const reach = (nearWithin * half) ** 2
    for (let i = 0; i < count; i += 1) {
      const px = x[i] as number
      const py = y[i] as number
      const row = i * stride + first
      if ((px - mx) * (px - mx) + (py - my) * (py - my) > reach) {
        for (let k = 0; k < order; k += 1) {
          const dx = px - (x[first + k] as number)
          const dy = py - (y[first + k] as number)
          matrix[row + k] = 0.5 * (w[first + k] as number) * Math.log(dx * dx + dy * dy)
        }
      } else {
        nearWeights(panel, mesh, i, exact, rule)
        for (let k = 0; k < order; k += 1) matrix[row + k] = exact[k] as number
      }
    }
  }
  return matrix
}

function nearWeights(panel: Panel, { x, y, w }: PanelMesh, i: number, out: Float64Array, rule: ReturnType<typeof logRule>): void {
  const { re, im } = inPanel(panel, x[i] as number, y[i] as number)
  const { order, nodes } = rule
  // About the middle of a circle the plane of an arc panel is far off, however near the panel itself.
  if (!(re * re + im * im <= nearWithin * nearWithin)) {
    for (let k = 0; k < order; k += 1) {
      const j = panel.first + k
      out[k] = (w[j] as number) * Math.log(Math.hypot((x[i] as number) - (x[j] as number), (y[i] as number) - (y[j] as number)))
    }
    return
  }
  rule.weightsAt(re, im, out)
  const own = i - panel.first
  const logHalf = Math.log(panel.half)
  for (let k = 0; k < order; k += 1) {
    const j = panel.first + k
    let smooth = logHalf
    if (panel.arc && k !== own) {
      // What the circle adds to ln|ζ − u| is smooth along the panel.
      const dx = (x[i] as number) - (x[j] as number)
      const dy = (y[i] as number) - (y[j] as number)
      const du = re - (nodes[k] as number)
      smooth = 0.5 * Math.log((dx * dx + dy * dy) / (du * du + im * im))
    }
    out[k] = panel.half * (out[k] as number) + (w[j] as number) * smooth
  }
}
