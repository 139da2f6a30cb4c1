/** The outline to scale: its loops as one area, overall dimensions, centroid, shear centre, torque and peak. */
import type { Drawing, Shape } from '#shared/calc/types'
import type { CaseSolution, Solution } from '#shared/calc/kinds/general-outline/solution'
import { centres } from '#shared/calc/kinds/general-outline/outputs'
import { decisiveCases } from '#shared/calc/kinds/general-outline/working'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { edgeDirection, edgePoint, type OutlineEdge } from '#shared/torsion/outline/outline'
import { nearestOnEdge } from '#shared/torsion/outline/edge-distance'
import { showQuantity, significant } from '#shared/units/display'
import { fromEngine } from '#shared/units/units'

type Pt = [number, number]

/** Pixels of the picture at its nominal size, and of the section inside it. */
const PICTURE = 470
const SECTION = { width: 290, height: 190 }
const ARC_STEP = Math.PI / 36

interface Extent { min: Pt, max: Pt }

export function generalOutlineSketch(s: Solution): Drawing {
  const loops = loopsOf(s.edges)
  const points = loops.flat()
  const extent: Extent = { min: [least(points, 0), least(points, 1)], max: [most(points, 0), most(points, 1)] }
  const [width, height] = [extent.max[0] - extent.min[0], extent.max[1] - extent.min[1]]
  const pixel = Math.max(width / SECTION.width, height / SECTION.height)
  const shown = decisiveCases(s)[0] ?? null
  const shapes: Shape[] = [
    { type: 'path', points: oneArea(loops), closed: true, role: 'wall', level: 0 },
    ...overall(s, extent, pixel), ...centreMarks(s, pixel), ...shown ? [...peak(s, shown), ...torque(s, shown, extent, pixel)] : [],
  ]
  return { shapes, box: boxOf(widened(extent, s.torsion.shearCentre), pixel), alt: altText(s, shown) }
}

const least = (points: Pt[], axis: 0 | 1): number => points.reduce((low, p) => Math.min(low, p[axis]), Infinity)
const most = (points: Pt[], axis: 0 | 1): number => points.reduce((high, p) => Math.max(high, p[axis]), -Infinity)

/** Points along every loop; arcs in short chords. */
function loopsOf(edges: readonly OutlineEdge[]): Pt[][] {
  const loops: Pt[][] = []
  for (const edge of edges) {
    const count = edge.arc ? Math.max(2, Math.ceil(Math.abs(edge.arc.sweep) / ARC_STEP)) : 1
    const stretch = Array.from({ length: count }, (_, k): Pt => {
      const { x, y } = edgePoint(edge, k / count)
      return [x, y]
    })
    loops[edge.loop] = [...loops[edge.loop] ?? [], ...stretch]
  }
  return loops
}

/** Outer loop and holes as one closed line: each hole is joined, the nearest first, by a cut that has no width and crosses nothing. */
function oneArea([outer = [], ...holes]: Pt[][]): Pt[] {
  let area = outer
  let left = holes
  while (left.length > 0) {
    const cuts = left.map(hole => nearestPoints(area, hole))
    const nearest = cuts.reduce((best, cut, k) => (cut.distance < (cuts[best]?.distance ?? Infinity) ? k : best), 0)
    const [cut, hole] = [cuts[nearest], left[nearest]]
    if (!cut || !hole) break
    area = [...area.slice(0, cut.i + 1), ...hole.slice(cut.j), ...hole.slice(0, cut.j + 1), ...area.slice(cut.i)]
    left = left.filter(one => one !== hole)
  }
  return area
}

function nearestPoints(p: Pt[], q: Pt[]): { i: number, j: number, distance: number } {
  let best = { i: 0, j: 0, distance: Infinity }
  for (const [i, [px, py]] of p.entries()) {
    for (const [j, [qx, qy]] of q.entries()) {
      const distance = (px - qx) ** 2 + (py - qy) ** 2
      if (distance < best.distance) best = { i, j, distance }
    }
  }
  return best
}

function overall(s: Solution, { min, max }: Extent, pixel: number): Shape[] {
  const unit = shownUnits(s.model).length
  const text = (mm: number) => significant(fromEngine(mm, unit), 4).replace(/(\.\d*?)0+(?=$|×)/u, '$1').replace(/\.(?=$|×)/u, '')
  return [
    { type: 'dimension', from: [min[0], min[1]], to: [max[0], min[1]], offset: -52 * pixel, text: text(max[0] - min[0]) },
    { type: 'dimension', from: [min[0], min[1]], to: [min[0], max[1]], offset: 30 * pixel, text: text(max[1] - min[1]) },
  ]
}

function centreMarks(s: Solution, p: number): Shape[] {
  const { centroid: { x, y }, shearCentre } = centres(s)
  return [
    { type: 'line', from: [x + 9 * p, y], to: [x + 36 * p, y], role: 'axis' }, { type: 'label', at: [x + 29 * p, y + 5 * p], text: 'x', role: 'axis' },
    { type: 'line', from: [x, y + 9 * p], to: [x, y + 36 * p], role: 'axis' }, { type: 'label', at: [x + 5 * p, y + 27 * p], text: 'y', role: 'axis' },
    { type: 'centroid', at: [x, y] }, { type: 'shear-centre', at: [shearCentre.x, shearCentre.y], side: [-1, -1] },
  ]
}

/** The flag stands off the material. */
function peak(s: Solution, c: CaseSolution): Shape[] {
  if (!s.peaks || c.tau === null || !(c.tau > 0)) return []
  const { at, edge: name, loop } = s.peaks.first
  const unit = shownUnits(s.model).stress
  const near = s.edges.filter(edge => edge.loop === loop && edge.name === name).map(edge => ({ edge, ...nearestOnEdge(at, edge) })).sort((p, q) => p.distance - q.distance)[0]
  const normal = near ? edgeDirection(near.edge, near.part) - Math.PI / 2 : Math.PI / 2
  return [{ type: 'peak', at: [at.x, at.y], text: `${significant(fromEngine(c.tau, unit), 3)}\u2009${unit} peak`, away: [Math.cos(normal), Math.sin(normal)] }]
}

function torque(s: Solution, c: CaseSolution, { min, max }: Extent, pixel: number): Shape[] {
  const unit = c.model.torque?.unit ?? shownUnits(s.model).torque
  const x = Math.min(Math.max(s.torsion.shearCentre.x, min[0]), max[0])
  return [{ type: 'torque', at: [x, max[1] + 16 * pixel], radius: 40 * pixel, text: `T ${showQuantity(c.torque, 'torque', unit)}` }]
}

/** So far that the shear centre, which may lie outside the section, is in the picture. */
const widened = ({ min, max }: Extent, { x, y }: { x: number, y: number }): Extent =>
  ({ min: [Math.min(min[0], x), Math.min(min[1], y)], max: [Math.max(max[0], x), Math.max(max[1], y)] })

/** Room for dimensions on the left and below, for the torque above, for a flag on every side. */
function boxOf({ min, max }: Extent, pixel: number): Drawing['box'] {
  const [side, below, above] = [70 * pixel, 82 * pixel, 100 * pixel]
  const width = Math.max(max[0] - min[0] + 2 * side, PICTURE * pixel)
  return { x: (min[0] + max[0] - width) / 2, y: min[1] - below, width, height: max[1] - min[1] + below + above }
}

function altText(s: Solution, c: CaseSolution | null): string {
  const unit = shownUnits(s.model)
  const at = ({ x, y }: { x: number, y: number }) => `x ${showQuantity(x, 'length', unit.length)}, y ${showQuantity(y, 'length', unit.length)}`
  const { centroid, shearCentre } = centres(s)
  const holes = s.model.holes.length
  const section = `Section to scale by its outline of ${s.edges.length} edges${holes === 0 ? '' : `, with ${holes} ${holes === 1 ? 'hole' : 'holes'}`}. Centroid at ${at(centroid)}; shear centre at ${at(shearCentre)}.`
  if (!s.peaks) return `${section} The shear is unbounded at sharp re-entrant vertices.`
  const stress = c?.tau ? ` of ${showQuantity(c.tau, 'stress', unit.stress)} in case ${c.model.id}` : ''
  return `${section} Peak shear${stress} on ${s.peaks.first.edge}, at ${at(s.peaks.first.at)}.`
}
