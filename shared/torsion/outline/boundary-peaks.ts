/**
 * Where the shear along the boundary is greatest. The greatest shear of a
 * section lies on its boundary (§4.1). Every edge gives its greatest value,
 * unless the shear goes on rising beyond the edge's end; equal ones are told
 * in the order of the outline.
 */
import type { PlanePoint } from '#shared/torsion/outline/outline'
import type { Panel, PanelMesh } from '#shared/torsion/outline/panels'
import { edgePoint } from '#shared/torsion/outline/outline'
import { panelPolynomials } from '#shared/torsion/outline/panel-polynomials'

/** A greatest value on one edge: |τ|/(G·θ′) in mm, its place, its edge. */
export interface BoundaryPeak { readonly tau: number, readonly at: PlanePoint, readonly edge: string, readonly loop: number }

/** A disc left out of the search. mm */
export interface Disc { readonly at: PlanePoint, readonly radius: number }

/** Values closer than this part count as equal: symmetric places differ by rounding. */
const equalWithin = 1e-5
/** Maxima closer than this part of the section are one place. */
const onePlace = 1e-3

/** `u`: place on its panel, −1…1. */
interface Best { tau: number, at: PlanePoint, u: number }

/** Offset −½…½ of the top of a parabola through three values one step apart, and its height. */
function parabolaTop(before: number, top: number, after: number): { offset: number, height: number } {
  const bend = before - 2 * top + after
  if (bend >= 0) return { offset: 0, height: top }
  const offset = Math.max(-0.5, Math.min(0.5, (before - after) / (2 * bend)))
  return { offset, height: top + offset * (after - before) / 2 + offset * offset * bend / 2 }
}

const outside = (at: PlanePoint, discs: readonly Disc[]): boolean => discs.every(disc => Math.hypot(at.x - disc.at.x, at.y - disc.at.y) >= disc.radius)

/** Greatest value on one panel, in lengths of the mesh. Its place is read off the exact edge. */
function panelBest(panel: Panel, tau: Float64Array, order: number, discs: readonly Disc[], values: Float64Array): Best | null {
  const { places, valueAt } = panelPolynomials(order)
  const { first, edge, from, to } = panel
  const placeAt = (u: number): PlanePoint => edgePoint(edge, from + (to - from) * (u + 1) / 2)
  let top = -1
  for (let m = 0; m < places.length; m += 1) {
    let sum = 0
    for (let k = 0; k < order; k += 1) sum += (valueAt[m * order + k] as number) * (tau[first + k] as number)
    values[m] = Math.abs(sum)
    const lower = top >= 0 && (values[m] as number) <= (values[top] as number)
    if (!lower && (discs.length === 0 || outside(placeAt(places[m] as number), discs))) top = m
  }
  if (top < 0) return null
  const here = values[top] as number
  const inside = top > 0 && top < places.length - 1
  const { offset, height } = inside ? parabolaTop(values[top - 1] as number, here, values[top + 1] as number) : { offset: 0, height: here }
  const u = (places[top] as number) + offset * ((places[1] as number) - (places[0] as number))
  const refined = placeAt(u)
  return outside(refined, discs) ? { tau: height, at: refined, u } : { tau: here, at: placeAt(places[top] as number), u: places[top] as number }
}

interface EdgePeak { readonly peak: BoundaryPeak, readonly index: number, /** At the end of its edge: −1 or +1; 0 between. */ readonly end: -1 | 0 | 1 }

/** The greatest value of each edge, in the order of the outline. */
function edgePeaks(mesh: PanelMesh, tau: Float64Array, scale: number, discs: readonly Disc[]): EdgePeak[] {
  const values = new Float64Array(panelPolynomials(mesh.order).places.length)
  const perEdge = new Map<string, EdgePeak>()
  for (const panel of mesh.panels) {
    const { edge, from, to } = panel
    const best = panelBest(panel, tau, mesh.order, discs, values)
    const key = `${edge.loop}/${edge.index}`
    const known = perEdge.get(key)
    if (!best || (known && best.tau * scale <= known.peak.tau)) continue
    if (known && best.tau * scale <= known.peak.tau * (1 + equalWithin)) {
      // Equal but for rounding: the place met first stays, with the greatest value.
      perEdge.set(key, { ...known, peak: { ...known.peak, tau: best.tau * scale } })
      continue
    }
    const end = from === 0 && best.u === -1 ? -1 : to === 1 && best.u === 1 ? 1 : 0
    perEdge.set(key, { peak: { tau: best.tau * scale, at: best.at, edge: edge.name, loop: edge.loop }, index: edge.index, end })
  }
  return [...perEdge.values()]
}

/** Whether the shear falls off on both sides: at the end of an edge, the next edge must have its greatest value there too. */
function isMaximum({ peak, index, end }: EdgePeak, all: readonly EdgePeak[]): boolean {
  if (end === 0) return true
  const loop = all.filter(one => one.peak.loop === peak.loop)
  const next = loop.find(one => one.index === (index + end + loop.length) % loop.length)
  return !next || next.peak.tau <= peak.tau * (1 + equalWithin)
}

/** The greatest values outside the discs, the greatest first; neighbouring edges that share their greatest value count once. */
export function boundaryPeaks(mesh: PanelMesh, tau: Float64Array, scale: number, size: number, discs: readonly Disc[] = []): BoundaryPeak[] {
  const all = edgePeaks(mesh, tau, scale, discs)
  const maxima = all.filter(one => isMaximum(one, all)).map(({ peak }) => peak)
  const sorted = [...maxima].sort((p, q) => q.tau - p.tau)
  const first = maxima.find(peak => peak.tau >= (sorted[0]?.tau ?? 0) * (1 - equalWithin))
  const inOrder = first ? [{ ...first, tau: sorted[0]?.tau ?? first.tau }, ...sorted.filter(peak => peak !== first)] : []
  return inOrder.filter((peak, index) => inOrder.slice(0, index).every(before => Math.hypot(before.at.x - peak.at.x, before.at.y - peak.at.y) > onePlace * size))
}
