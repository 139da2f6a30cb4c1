/**
 * Shear flow of direct shear in any planar section of thin walls, open or closed, branched, with arcs and
 * differing moduli (methods §5.4): statical moments along a tree of the walls, then circulations of the
 * cells that leave them untwisted. Forces act through the shear centre. N, mm, MPa.
 */
import { factorise, solveFactorised } from '#shared/torsion/cholesky'
import { cellMatrix } from '#shared/torsion/cells/torsion-of-cells'
import { wallGraph, type GraphWall, type WallGraph, type WallSection } from '#shared/torsion/cells/wall-graph'
import { pathPoint, tangentAt } from '#shared/torsion/geometry'
import { refusal, type Point, type Refusal } from '#shared/torsion/section'
import { gatherFromFreeEdges } from '#shared/torsion/shear/gather'
import { rulePoints } from '#shared/torsion/stations'

export interface AreaMoments { readonly A: number, readonly centroid: Point, readonly Ixx: number, readonly Iyy: number, readonly Ixy: number }

/** Flow along one wall, in N/mm along from → to, at parts 0, ⅛ … 1 of its length, for a unit force along x and along y. */
export interface WallFlow { readonly id: string, readonly t: number, readonly perX: readonly number[], readonly perY: readonly number[] }

export interface ShearFlows {
  readonly ok: true
  readonly moments: AreaMoments
  readonly shearCentre: Point
  readonly walls: readonly WallFlow[]
}

/** Where the flow is given along each wall. */
export const flowParts: readonly number[] = [0, 1, 2, 3, 4, 5, 6, 7, 8].map(i => i / 8)

/** First moments gathered at the start of a wall. */
interface Along { readonly x: number, readonly y: number }

/** First moments ∫x t̄ ds and ∫y t̄ ds from the start of a wall to a part of it, about a point. */
function firstMoments({ wall, path, length }: GraphWall, weight: number, about: Point, part: number): { x: number, y: number } {
  const t = wall.t * weight
  if (path.kind === 'line') {
    const s = part * length
    const mid = pathPoint(path, part / 2)
    return { x: (mid.x - about.x) * t * s, y: (mid.y - about.y) * t * s }
  }
  const psi = part * path.sweep
  const sense = Math.sign(path.sweep)
  const r2 = path.radius ** 2 * sense
  const [a, b] = [path.startAngle, path.startAngle + psi]
  const s = path.radius * Math.abs(psi)
  return {
    x: t * ((path.centre.x - about.x) * s + r2 * (Math.sin(b) - Math.sin(a))),
    y: t * ((path.centre.y - about.y) * s - r2 * (Math.cos(b) - Math.cos(a))),
  }
}

function weightsOf(walls: readonly GraphWall[]): ((wall: GraphWall) => number) | Refusal {
  const given = walls.flatMap(({ wall }) => (wall.E === undefined ? [] : [wall.E]))
  if (given.length > 0 && given.length < walls.length) return refusal('Some walls give a modulus of elasticity and some do not. Give it for all walls.')
  if (given.some(E => !(Number.isFinite(E) && E > 0))) return refusal('A modulus of elasticity must be greater than zero.')
  const reference = Math.max(...given)
  return given.length === 0 ? () => 1 : ({ wall }) => (wall.E ?? reference) / reference
}

/** Area, centroid and second moments of the mid-line, weighted by E where it differs. */
export function areaMoments(walls: readonly GraphWall[], weigh: (wall: GraphWall) => number): AreaMoments {
  const points = walls.flatMap((one) => {
    const area = one.length * one.wall.t * weigh(one)
    return rulePoints(one.path).map(({ part, weight }) => ({ ...pathPoint(one.path, part), area: area * weight }))
  })
  const sum = (value: (p: { x: number, y: number }) => number) => points.reduce((total, p) => total + p.area * value(p), 0)
  const A = sum(() => 1)
  const centroid = { x: sum(p => p.x) / A, y: sum(p => p.y) / A }
  return {
    A, centroid, Ixx: sum(p => (p.y - centroid.y) ** 2), Iyy: sum(p => (p.x - centroid.x) ** 2), Ixy: sum(p => (p.x - centroid.x) * (p.y - centroid.y)),
  }
}

/** First moments gathered from the free edges at the start of every wall, so that the flow falls to zero at each. */
function statics(walls: readonly GraphWall[], weigh: (wall: GraphWall) => number, about: Point): Along[] {
  const total = walls.map(one => firstMoments(one, weigh(one), about, 1))
  const edges = walls.map(({ wall }) => wall)
  const [x, y] = [gatherFromFreeEdges(edges, total.map(one => one.x)), gatherFromFreeEdges(edges, total.map(one => one.y))]
  return walls.map((_, i) => ({ x: x[i] ?? 0, y: y[i] ?? 0 }))
}

/** q at a part of a wall for the coefficients of x and y: q = −(kx·Qx + ky·Qy), Q gathered from the free edges. */
function flowAt(wall: GraphWall, start: Along, weight: number, about: Point, part: number, kx: number, ky: number): number {
  const grown = firstMoments(wall, weight, about, part)
  return -(kx * (start.x + grown.x) + ky * (start.y + grown.y))
}

/**
 * Flows of a unit shear force along x and along y through the shear centre, and that centre.
 * @returns a refusal where the graph is unsound, or all walls lie on one line and cannot carry a force across it.
 */
export function shearFlow(section: WallSection): ShearFlows | Refusal {
  const graph = wallGraph(section)
  if (!graph.ok) return graph
  const weigh = weightsOf(graph.walls)
  if (typeof weigh !== 'function') return weigh
  const moments = areaMoments(graph.walls, weigh)
  const { Ixx, Iyy, Ixy } = moments
  const delta = Ixx * Iyy - Ixy ** 2
  if (!(delta > 1e-9 * Ixx * Iyy)) return refusal('The walls lie on one line: they carry no shear force across it. Use the rectangle for a single wall.')
  const start = statics(graph.walls, weigh, moments.centroid)
  // q = −[(Vy Iyy − Vx Ixy) Qx + (Vx Ixx − Vy Ixy) Qy]/Δ with Qx = ∫y t ds and Qy = ∫x t ds.
  const perX = unitFlow(graph, start, weigh, moments.centroid, Ixx / delta, -Ixy / delta)
  const perY = unitFlow(graph, start, weigh, moments.centroid, -Ixy / delta, Iyy / delta)
  if (!perX || !perY) return refusal('The cells differ too much in stiffness to be solved together. Check thicknesses and moduli.')
  const walls = graph.walls.map(({ wall }, i): WallFlow => ({ id: wall.id, t: wall.t, perX: flowParts.map(part => perX.at(i, part)), perY: flowParts.map(part => perY.at(i, part)) }))
  const { centroid } = moments
  const shearCentre = { x: centroid.x + momentOf(graph, perY, centroid), y: centroid.y - momentOf(graph, perX, centroid) }
  return Number.isFinite(shearCentre.x) && Number.isFinite(shearCentre.y) ? { ok: true, moments, shearCentre, walls } : refusal('The shear flow is not finite. Check coordinates and thicknesses.')
}

interface Flow { readonly at: (wall: number, part: number) => number }

/** The flow of the cut section and the circulations that close it: ∮ q ds/(t G) = 0 around every cell. */
function unitFlow(graph: WallGraph, start: readonly Along[], weigh: (wall: GraphWall) => number, about: Point, kx: number, ky: number): Flow | null {
  const open = (i: number, part: number) => {
    const wall = graph.walls[i]
    const begin = start[i]
    return wall && begin ? flowAt(wall, begin, weigh(wall), about, part, kx, ky) : 0
  }
  if (graph.cells.length === 0) return { at: open }
  const Gref = Math.max(...graph.walls.map(({ wall }) => wall.G))
  const matrix = cellMatrix(graph, Gref)
  const factor = factorise(matrix, graph.cells.length)
  if (!factor.ok) return null
  const round = graph.cells.map(cell => -cell.walls.reduce((sum, { index, sense }) => {
    const wall = graph.walls[index]
    if (!wall) return sum
    const mean = rulePoints(wall.path).reduce((total, { part, weight }) => total + weight * open(index, part), 0)
    return sum + sense * mean * wall.length * Gref / (wall.wall.t * wall.wall.G)
  }, 0))
  const circulation = solveFactorised(factor, Float64Array.from(round))
  const of = (cell: number) => (cell < 0 ? 0 : circulation[cell] ?? 0)
  return { at: (i, part) => open(i, part) + of(graph.walls[i]?.left ?? -1) - of(graph.walls[i]?.right ?? -1) }
}

/** Moment of a flow about a point: where the resultant of a unit force must act. */
function momentOf(graph: WallGraph, flow: Flow, about: Point): number {
  return graph.walls.reduce((sum, { path, length }, i) => sum + rulePoints(path).reduce((total, { part, weight }) => {
    const { x, y } = pathPoint(path, part)
    const tangent = tangentAt(path, part)
    return total + weight * length * flow.at(i, part) * ((x - about.x) * Math.sin(tangent) - (y - about.y) * Math.cos(tangent))
  }, 0), 0)
}

export interface SuperposedWall {
  readonly id: string
  /** Largest |τ| along the wall with everything at the worse face, MPa, and the part of the length where it is. */
  readonly tau: number
  readonly part: number
  /** Flow there, N/mm along from → to: direct shear and torsion with their signs. */
  readonly q: number
}

interface FlowPoint { readonly part: number, readonly q: number }

/** Where the flow turns between the given parts: exact on a straight wall, whose flow is a parabola; on an arc the parabola of three neighbours. */
function turningPoints(along: readonly FlowPoint[]): FlowPoint[] {
  return along.flatMap((middle, k) => {
    const [before, after] = [along[k - 1], along[k + 1]]
    if (!before || !after) return []
    const [slope, bend] = [(after.q - before.q) / 2, after.q - 2 * middle.q + before.q]
    const offset = -slope / bend
    return Math.abs(offset) < 1 ? [{ part: middle.part + offset * (after.part - middle.part), q: middle.q + slope * offset / 2 }] : []
  })
}

/**
 * Direct shear with torsion, wall by wall with sign: the flow of the forces plus the circulating flow of the
 * torque, and on top what varies through the thickness at the worse face.
 * @param torsionFlow N/mm along from → to per wall, zero in open walls
 * @param faceStress MPa at the faces beyond the mean flow: G t |θ′|
 */
export function superpose(flows: ShearFlows, Vx: number, Vy: number, torsionFlow: readonly number[], faceStress: readonly number[]): SuperposedWall[] {
  return flows.walls.map(({ id, t, perX, perY }, i) => {
    const along = flowParts.map((part, k) => ({ part, q: Vx * (perX[k] ?? 0) + Vy * (perY[k] ?? 0) + (torsionFlow[i] ?? 0) }))
    const worst = [...along, ...turningPoints(along)].reduce((high, one) => (Math.abs(one.q) > Math.abs(high.q) ? one : high))
    return { id, tau: Math.abs(worst.q) / t + Math.abs(faceStress[i] ?? 0), part: worst.part, q: worst.q }
  })
}

/** Torque of forces about the shear centre: T = Vy (xP − xS) − Vx (yP − yS), plus couples (methods §5.3). N·mm. */
export const torqueAbout = (centre: Point, forces: readonly { readonly Vx: number, readonly Vy: number, readonly at: Point }[], couple = 0): number =>
  forces.reduce((sum, { Vx, Vy, at }) => sum + Vy * (at.x - centre.x) - Vx * (at.y - centre.y), couple)
