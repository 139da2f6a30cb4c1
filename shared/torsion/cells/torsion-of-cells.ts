/**
 * Torsion of closed sections: one cell or many with shared walls, differing shear moduli, and fins
 * (Bredt–Batho; methods §2.1, §2.2). Thin walls, free warping, contour held in shape. N, mm, MPa, rad.
 */
import { finiteOrRefused } from '#shared/torsion/finite'
import { conditionOf, factorise, solveFactorised } from '#shared/torsion/cholesky'
import { circularFacePart, worstCondition } from '#shared/torsion/cells/published'
import { wallGraph, type GraphWall, type WallGraph, type WallSection } from '#shared/torsion/cells/wall-graph'
import { refusal, type Refusal } from '#shared/torsion/section'

/** What one wall does per unit of Gref·θ′. */
export interface CellWall {
  readonly id: string
  readonly length: number
  readonly t: number
  readonly G: number
  readonly arc: boolean
  /** Cells at its left and right along from → to; −1 outside. */
  readonly left: number
  readonly right: number
  /** The same cell, or outside, on both sides: it carries torque as a thin strip only. */
  readonly fin: boolean
  /** Shear flow along from → to per Gref·θ′, mm: q = flow · Gref θ′. */
  readonly flow: number
  /** Stress at the worse face per θ′, N/mm: the mean |q|/t and what varies through the thickness. */
  readonly facePerRate: number
  readonly meanPerRate: number
  /** Share of the variation through the thickness in the mean: χ (methods §2.1); null for a fin, which has no mean. */
  readonly chi: number | null
  /** Part of GJ of a fin; zero of others. */
  readonly finGJ: number
  /** G L t³/3, which Bredt leaves out; for information. */
  readonly ownGJ: number
}

export interface CellTorsion {
  readonly ok: true
  /** N·mm², cells and fins. */
  readonly GJ: number
  /** The modulus that flows and J are referred to: the largest of the cell walls. */
  readonly Gref: number
  /** GJ / Gref, mm⁴; the torsion constant where all moduli are equal. */
  readonly J: number
  /** GJ with the strips of all cell walls added, N·mm²: the comparison for thick walls. */
  readonly GJWithOwn: number
  readonly cells: readonly { readonly area: number, readonly flow: number, readonly share: number, readonly walls: readonly string[] }[]
  readonly walls: readonly CellWall[]
  /** Σ of torque shares of cells and fins less one: rounding. */
  readonly residual: number
  readonly condition: number
  readonly gap: WallGraph['gap']
  readonly size: number
}

/** @returns a refusal where the graph is unsound, closes no cell, or the cells are ill conditioned. */
export function torsionOfCells(section: WallSection): CellTorsion | Refusal {
  const graph = wallGraph(section)
  if (!graph.ok) return graph
  if (graph.cells.length === 0) return refusal(noCell(graph))
  const Gref = graph.walls.reduce((high, wall) => (isFin(wall) ? high : Math.max(high, wall.wall.G)), 0)
  const system = cellMatrix(graph, Gref)
  const factor = factorise(system, graph.cells.length)
  const condition = factor.ok ? conditionOf(system, factor) : Infinity
  if (!factor.ok || !(condition <= worstCondition)) return refusal('The cells differ too much in stiffness to be solved together. Check thicknesses and moduli, or join the cells.')
  const flows = solveFactorised(factor, Float64Array.from(graph.cells, cell => 2 * cell.area))
  return finiteOrRefused(assemble(graph, flows, Gref, condition))
}

export const isFin = ({ left, right }: Pick<GraphWall, 'left' | 'right'>): boolean => left === right

function noCell({ gap, size }: WallGraph): string {
  const near = gap && gap.distance < 0.1 * size ? ` The free ends ${gap.nodes.join(' and ')} stand ${gap.distance.toPrecision(3)} mm apart: join them if the seam is closed.` : ''
  return `The walls close no cell.${near} Use the open section for walls without a cell.`
}

/** ∮ds/t̄ on the diagonal, the shared walls with a minus beside it, t̄ = t G/Gref. */
export function cellMatrix({ walls, cells }: WallGraph, Gref: number): Float64Array {
  const n = cells.length
  const M = new Float64Array(n * n)
  const add = (i: number, j: number, value: number) => {
    M[i * n + j] = (M[i * n + j] ?? 0) + value
  }
  for (const wall of walls) {
    if (isFin(wall)) continue
    const flexibility = wall.length * Gref / (wall.wall.t * wall.wall.G)
    const { left, right } = wall
    if (left >= 0) add(left, left, flexibility)
    if (right >= 0) add(right, right, flexibility)
    if (left >= 0 && right >= 0) {
      add(left, right, -flexibility)
      add(right, left, -flexibility)
    }
  }
  return M
}

function assemble(graph: WallGraph, flows: Float64Array, Gref: number, condition: number): CellTorsion | Refusal {
  const flowOf = (cell: number) => (cell < 0 ? 0 : flows[cell] ?? 0)
  const walls = graph.walls.map((wall): CellWall => cellWall(wall, flowOf(wall.left) - flowOf(wall.right), Gref))
  const cellsGJ = graph.cells.map((cell, i) => 2 * cell.area * flowOf(i) * Gref)
  const finsGJ = walls.reduce((sum, wall) => sum + wall.finGJ, 0)
  const GJ = cellsGJ.reduce((sum, one) => sum + one, 0) + finsGJ
  if (!(Number.isFinite(GJ) && GJ > 0)) return refusal('The torsional stiffness is not a finite number. Check thicknesses, lengths and moduli.')
  const cells = graph.cells.map((cell, i) => ({ area: cell.area, flow: flowOf(i), share: (cellsGJ[i] ?? 0) / GJ, walls: [...new Set(cell.walls.map(({ index }) => graph.walls[index]?.wall.id ?? ''))] }))
  return {
    ok: true, GJ, Gref, J: GJ / Gref, GJWithOwn: GJ + walls.reduce((sum, wall) => sum + (wall.fin ? 0 : wall.ownGJ), 0), cells, walls, condition, gap: graph.gap, size: graph.size,
    residual: Math.abs(cells.reduce((sum, cell) => sum + cell.share, 0) + finsGJ / GJ - 1),
  }
}

function cellWall(wall: GraphWall, flow: number, Gref: number): CellWall {
  const { id, t, G } = wall.wall
  const fin = isFin(wall)
  const arc = wall.path.kind === 'arc'
  const variation = G * t * (arc && !fin ? circularFacePart : 1)
  const meanPerRate = Math.abs(flow) * Gref / t
  const ownGJ = G * wall.length * t ** 3 / 3
  return {
    id, length: wall.length, t, G, arc, left: wall.left, right: wall.right, fin, flow: fin ? 0 : flow, meanPerRate: fin ? 0 : meanPerRate,
    facePerRate: fin ? variation : meanPerRate + variation, chi: fin || meanPerRate === 0 ? null : variation / meanPerRate, finGJ: fin ? ownGJ : 0, ownGJ,
  }
}

/** Walls whose face stress is at least half of the peak: only there χ says something (cells whose flows nearly cancel have a large χ and no stress). */
export function chiThatCounts({ walls }: CellTorsion): { chi: number, wall: string } | null {
  const peak = walls.reduce((high, wall) => Math.max(high, wall.facePerRate), 0)
  return walls.reduce<{ chi: number, wall: string } | null>((worst, { chi, facePerRate, id }) =>
    chi !== null && facePerRate >= peak / 2 && chi > (worst?.chi ?? -1) ? { chi, wall: id } : worst, null)
}

export interface CellResponse {
  readonly ok: true
  readonly torque: number
  /** rad/mm */
  readonly rate: number
  /** By wall in the order of the section: flow along from → to in N/mm, mean and face stress in MPa. */
  readonly q: Float64Array
  readonly mean: Float64Array
  readonly face: Float64Array
  readonly tauMax: number
  readonly tauMaxWall: string
}

/** Flows and stresses for a torque in N·mm. */
export function respondOfCells(torsion: CellTorsion, torque: number): CellResponse | Refusal {
  if (!Number.isFinite(torque)) return refusal('The torque is not a finite number.')
  return atRate(torsion, torque / torsion.GJ, torque)
}

/** Flows, stresses and torque for an imposed rate of twist in rad/mm (methods §6). */
export function respondOfCellsToRate(torsion: CellTorsion, rate: number): CellResponse | Refusal {
  if (!Number.isFinite(rate)) return refusal('The rate of twist is not a finite number.')
  return atRate(torsion, rate, rate * torsion.GJ)
}

function atRate({ walls, Gref }: CellTorsion, rate: number, torque: number): CellResponse | Refusal {
  const [q, mean, face] = [new Float64Array(walls.length), new Float64Array(walls.length), new Float64Array(walls.length)]
  let [tauMax, tauMaxWall] = [-1, '']
  walls.forEach((wall, i) => {
    q[i] = wall.flow * Gref * rate
    mean[i] = wall.meanPerRate * Math.abs(rate)
    const tau = wall.facePerRate * Math.abs(rate)
    face[i] = tau
    if (tau > tauMax) [tauMax, tauMaxWall] = [tau, wall.id]
  })
  // The mean is part of the face stress, so that this one is the largest number of all.
  if (![torque, rate, tauMax, ...q].every(Number.isFinite)) return refusal('The load is too large to compute with. Check its unit.')
  return { ok: true, torque, rate, q, mean, face, tauMax: Math.max(tauMax, 0), tauMaxWall }
}
