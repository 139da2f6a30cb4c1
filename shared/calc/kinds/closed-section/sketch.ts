/** The section to scale: walls at their stress, the direction of the flow, names, size and peak. */
import type { ClosedSectionSolution } from '#shared/calc/kinds/closed-section/solve'
import { decisiveCases } from '#shared/calc/parts/bar-outputs'
import { shownUnits } from '#shared/calc/parts/shown-units'
import type { Drawing, Shape } from '#shared/calc/types'
import { pathPoint, pathPoints, tangentAt, wallPath, type WallPath } from '#shared/torsion/geometry'
import { showQuantity } from '#shared/units/display'

type Pair = [number, number]
const MOST_NAMED = 24
const STEP = Math.PI / 24

/** Off the mid-line to its left, along the normal. */
function aside(path: WallPath, part: number, offset: number): Pair {
  const [{ x, y }, direction] = [pathPoint(path, part), tangentAt(path, part)]
  return [x - offset * Math.sin(direction), y + offset * Math.cos(direction)]
}

function band(path: WallPath, t: number): Pair[] {
  const count = pathPoints(path, STEP).length - 1
  const side = (offset: number) => Array.from({ length: count + 1 }, (_, i) => aside(path, i / count, offset))
  return [...side(t / 2), ...side(-t / 2).reverse()]
}

export function closedSectionSketch(s: ClosedSectionSolution): Drawing {
  const { model, section, torsion, places } = s
  const at = new Map(section.nodes.map(node => [node.id, node]))
  const paths = section.walls.flatMap((wall, i) => {
    const [from, to] = [at.get(wall.from), at.get(wall.to)]
    const path = from && to ? wallPath(wall, from, to) : null
    return path && !('ok' in path) ? [{ path, wall, i }] : []
  })
  const points = paths.flatMap(({ path }) => pathPoints(path, STEP))
  const [xs, ys] = [points.map(p => p.x), points.map(p => p.y)]
  const least = (values: number[]) => values.reduce((low, value) => Math.min(low, value), Infinity)
  const most = (values: number[]) => values.reduce((high, value) => Math.max(high, value), -Infinity)
  const [left, right, low, high] = [least(xs), most(xs), least(ys), most(ys)]
  const size = torsion.size
  const [c] = decisiveCases(s.cases, s.margins, s.governing)
  const peak = places.reduce((top, place) => Math.max(top, place.perTorque), 0)
  const u = shownUnits(model)
  const shapes: Shape[] = [
    ...paths.map(({ path, wall, i }): Shape => ({ type: 'path', points: band(path, wall.t), closed: true, role: 'wall', level: peak > 0 ? (places[i]?.perTorque ?? 0) / peak : 0, wall: wall.id })),
    ...paths.slice(0, MOST_NAMED).flatMap(({ path, wall, i }): Shape[] => [...arrow(path, wall.t, torsion.walls[i]?.flow ?? 0, c?.torque ?? 1, size), balloon(path, wall.id, wall.t, size)]),
    { type: 'dimension', from: [left, low], to: [right, low], offset: -0.2 * size, text: showQuantity(right - left, 'length', u.length) },
    { type: 'dimension', from: [left, low], to: [left, high], offset: 0.2 * size, text: showQuantity(high - low, 'length', u.length) },
    ...peakShape(s, paths, c?.tauMax ?? 0, c?.tauMaxPlace ?? ''),
  ]
  const room = 0.4 * size
  return {
    shapes, box: { x: left - room, y: low - room, width: right - left + 2 * room, height: high - low + 2 * room },
    alt: `Closed section to scale with ${torsion.cells.length} ${torsion.cells.length === 1 ? 'cell' : 'cells'} and ${torsion.walls.length} walls, ${showQuantity(right - left, 'length', u.length)} wide and ${showQuantity(high - low, 'length', u.length)} high${c ? `; case ${c.model.id}: largest shear stress ${showQuantity(c.tauMax, 'stress', u.stress)} in wall ${c.tauMaxPlace}` : ''}.`,
    ...(c && c.tauMax > 0 ? { ramp: { max: c.tauMax, unit: u.stress, label: `Shear stress at the faces, case ${c.model.id}` } } : {}),
  }
}

/** Beside the wall, in the sense of the flow; none where it carries none. */
function arrow(path: WallPath, t: number, flow: number, torque: number, size: number): Shape[] {
  if (path.kind === 'arc' || flow * torque === 0) return []
  const off = t / 2 + 0.02 * size
  const [a, b] = flow * torque > 0 ? [0.3, 0.7] : [0.7, 0.3]
  return [{ type: 'line', from: aside(path, a, off), to: aside(path, b, off), role: 'flow' }]
}

const balloon = (path: WallPath, text: string, t: number, size: number): Shape => ({ type: 'balloon', at: aside(path, 0.5, -(t / 2 + 0.09 * size)), text, leaderTo: aside(path, 0.5, -t / 2) })

function peakShape({ model }: ClosedSectionSolution, paths: readonly { path: WallPath, wall: { id: string, t: number } }[], tau: number, wall: string): Shape[] {
  const found = paths.find(one => one.wall.id === wall)
  if (!found || tau === 0) return []
  const on = aside(found.path, 0.5, found.wall.t / 2)
  const out = aside(found.path, 0.5, found.wall.t)
  return [{ type: 'peak', at: on, text: showQuantity(tau, 'stress', shownUnits(model).stress), away: [out[0] - on[0], out[1] - on[1]] }]
}
