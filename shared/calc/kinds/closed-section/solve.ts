/** Cells, stresses per torque once, then every case by its torque (methods §2). */
import { cellCorners, type CellCornerSolution } from '#shared/calc/kinds/closed-section/corners'
import { cellDepth } from '#shared/calc/kinds/closed-section/depth'
import type { ClosedSectionModel } from '#shared/calc/kinds/closed-section/parse'
import { barMargins, stressSets, solveBar, type BarCase, type StressPlace } from '#shared/calc/parts/bar-cases'
import type { MarginMode } from '#shared/calc/parts/margin-rows'
import { strengthUnit } from '#shared/calc/parts/strength'
import type { ModelWall } from '#shared/calc/parts/wall-model'
import type { Fault, MarginRow } from '#shared/calc/types'
import { cellWarping } from '#shared/torsion/cells/cell-warping'
import { chiThatCounts, torsionOfCells, type CellTorsion } from '#shared/torsion/cells/torsion-of-cells'
import type { WallSection } from '#shared/torsion/cells/wall-graph'

export interface ClosedSectionSolution {
  model: ClosedSectionModel
  section: WallSection
  torsion: CellTorsion
  GJ: number
  /** One modulus everywhere: then GJ/G is the torsion constant. */
  oneModulus: boolean
  chi: { chi: number, wall: string } | null
  warps: boolean
  /** Depth of every cell, mm. */
  depths: number[]
  corners: CellCornerSolution[]
  /** Walls in the order of the table, then the corners that have a factor. */
  places: StressPlace[]
  cornerPlaces: StressPlace[]
  cases: BarCase[]
  margins: MarginRow[]
  governing: MarginRow | null
}

export const CORNER_ULTIMATE: MarginMode = { mode: 'corner-ultimate', label: 'Shear at the corners, ultimate', level: 'ultimate', dimension: 'stress' }
export const CORNER_YIELD: MarginMode = { mode: 'corner-yield', label: 'Shear at the corners, yield', level: 'limit', dimension: 'stress' }

export const wallPlace = (wall: ModelWall): string => (wall.name.trim() === '' ? `wall ${wall.id}` : `wall ${wall.id} (${wall.name.trim()})`)

export function sectionOf({ nodes, walls }: ClosedSectionModel): WallSection {
  return {
    nodes,
    walls: walls.map(({ id, from, to, t, G, arc }) => ({ id, from, to, t: t.value, G, ...(arc ? { arc: { radius: arc.radius, sweep: arc.sweep, startDirection: arc.direction } } : {}) })),
  }
}

export function solveClosedSection(model: ClosedSectionModel): { ok: true, solution: ClosedSectionSolution } | { ok: false, faults: Fault[] } {
  const section = sectionOf(model)
  const torsion = torsionOfCells(section)
  if (!torsion.ok) return { ok: false, faults: [{ path: 'walls', message: torsion.reason }, ...openSeams(model)] }
  const warping = cellWarping(section, torsion)
  if (!warping.ok) return { ok: false, faults: [{ path: 'walls', message: warping.reason }] }
  const GJ = torsion.GJ
  const places = torsion.walls.flatMap((wall, i): StressPlace[] => {
    const typed = model.walls[i]
    return typed ? [{ where: wall.id, wall: wall.id, place: wallPlace(typed), unit: strengthUnit([typed.material]), materials: [typed.material], perTorque: wall.facePerRate / GJ }] : []
  })
  const corners = cellCorners(model, torsion)
  const cornerPlaces = corners.flatMap(({ node, walls, worst, perRate }): StressPlace[] => {
    const materials = [...new Set(walls.map(wall => wall.material))]
    return perRate === null ? [] : [{ where: node, wall: worst.id, place: `corner ${node}`, unit: strengthUnit(materials), materials, perTorque: perRate / GJ }]
  })
  const solved = solveBar(model.bar, GJ, places)
  if (!solved.ok) return solved
  const { rows, governing } = barMargins(model.bar, solved.cases, places, stressSets(model.bar, solved.cases, cornerPlaces, CORNER_ULTIMATE, CORNER_YIELD))
  return {
    ok: true,
    solution: {
      model, section, torsion, GJ, oneModulus: model.walls.every(wall => wall.G === torsion.Gref), chi: chiThatCounts(torsion), warps: warping.warps,
      depths: torsion.cells.map(cell => cellDepth(section, cell.walls)), corners, places, cornerPlaces, cases: solved.cases, margins: rows, governing,
    },
  }
}

/** Where no cell closes, the ends that miss each other are the likely cause. */
const openSeams = ({ seams }: ClosedSectionModel): Fault[] =>
  seams.map(({ wall, node, gap }) => ({ path: 'walls', message: `G-07: wall ${wall} is named to end at node ${node} and stops ${gap.toPrecision(3)} mm from it. Join them if the seam is closed.` }))
