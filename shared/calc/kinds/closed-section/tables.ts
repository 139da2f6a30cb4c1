import { flowUnit } from '#shared/calc/kinds/closed-section/outputs'
import type { ClosedSectionSolution } from '#shared/calc/kinds/closed-section/solve'
import { decisiveCases } from '#shared/calc/parts/bar-outputs'
import { shownUnits } from '#shared/calc/parts/shown-units'
import type { CaseRow, ComparedValue, ResultTable } from '#shared/calc/types'
import { barCaseRows } from '#shared/calc/parts/bar-cases'

const words = (key: string, label: string): ResultTable['columns'][number] => ({ key, label, dimension: null, unit: '' })

export function closedSectionTables(s: ClosedSectionSolution): ResultTable[] {
  return [cellTable(s), wallTable(s)]
}

function cellTable({ model, torsion, depths, GJ, cases, margins, governing }: ClosedSectionSolution): ResultTable {
  const u = shownUnits(model)
  const [c] = decisiveCases(cases, margins, governing)
  const flow = torsion.Gref * (c?.torque ?? 0) / GJ
  return {
    key: 'cells', title: `Cells${c ? `, flows of case ${c.model.id}` : ''}`,
    columns: [
      words('cell', 'Cell'), words('walls', 'Walls'), { key: 'A', label: 'Area', symbol: 'A', dimension: 'area', unit: u.area }, { key: 'depth', label: 'Depth', dimension: 'length', unit: u.length },
      { key: 'q', label: 'Shear flow, counter-clockwise', symbol: 'q', dimension: 'shearFlow', unit: flowUnit(model.units) }, { key: 'share', label: 'Torque share', dimension: 'ratio', unit: '' },
    ],
    rows: torsion.cells.map((cell, i) => ({ id: String(i + 1), cells: [String(i + 1), cell.walls.join(', '), cell.area, depths[i] ?? null, c ? cell.flow * flow : null, cell.share] })),
  }
}

function wallTable({ model, torsion, GJ, cases, margins, governing, places }: ClosedSectionSolution): ResultTable {
  const u = shownUnits(model)
  const [c] = decisiveCases(cases, margins, governing)
  const flow = torsion.Gref * (c?.torque ?? 0) / GJ
  const least = new Map<string, number>()
  for (const { wall, ms } of margins) if (wall !== undefined && ms !== null) least.set(wall, Math.min(least.get(wall) ?? Infinity, ms))
  const stress = (key: string, label: string) => ({ key, label, dimension: 'stress' as const, unit: u.stress })
  return {
    key: 'walls', title: `Walls${c ? `, stresses of case ${c.model.id}` : ''}`,
    columns: [
      words('wall', 'Wall'), words('from', 'From'), words('to', 'To'), { key: 'L', label: 'Length', dimension: 'length', unit: u.length }, { key: 't', label: 'Thickness', symbol: 't', dimension: 'length', unit: u.length },
      { key: 'q', label: 'Shear flow, from → to', symbol: 'q', dimension: 'shearFlow', unit: flowUnit(model.units) }, stress('mean', 'Mean stress'), { key: 'chi', label: 'Variation over mean', symbol: '\\chi', dimension: 'ratio', unit: '' },
      stress('face', 'Stress at the face'), { key: 'ms', label: 'Least margin', dimension: 'margin', unit: '' },
    ],
    rows: torsion.walls.map((wall, i) => ({
      id: wall.id,
      cells: [
        wall.id, model.walls[i]?.from ?? '', model.walls[i]?.to ?? '', wall.length, wall.t, c && !wall.fin ? wall.flow * flow : null, c && !wall.fin ? wall.meanPerRate * Math.abs(c.torque) / GJ : null, wall.chi,
        c ? (places[i]?.perTorque ?? 0) * Math.abs(c.torque) : null, least.get(wall.id) ?? null,
      ],
    })),
  }
}

/** The cases with the highest corner stress beside that of the faces. */
export function closedCaseRows({ cases, margins, cornerPlaces }: ClosedSectionSolution): CaseRow[] {
  const corner = cornerPlaces.reduce<number | null>((high, place) => Math.max(high ?? 0, place.perTorque), null)
  return barCaseRows(cases, margins).map((row, i) => ({ ...row, tauCorner: corner === null ? null : corner * Math.abs(cases[i]?.torque ?? 0) }))
}

/** The strips of the walls that Bredt leaves out, and the peak without what varies through the wall. */
export function closedCompared({ model, torsion, GJ, cases }: ClosedSectionSolution): ComparedValue[] {
  const u = shownUnits(model)
  const heaviest = cases.reduce((high, c) => Math.max(high, Math.abs(c.torque)), 0)
  const peak = (of: (wall: (typeof torsion.walls)[number]) => number) => torsion.walls.reduce((high, wall) => Math.max(high, of(wall)), 0) * heaviest / GJ
  return [
    { key: 'J', label: 'J with the strips of the walls added', used: torsion.J, compared: torsion.GJWithOwn / torsion.Gref, dimension: 'inertia', unit: u.inertia, source: '§2.1; the value used is the lower and gives the larger twist' },
    { key: 'tau', label: 'Largest mean stress q/t', used: peak(wall => wall.facePerRate), compared: peak(wall => wall.meanPerRate), dimension: 'stress', unit: u.stress, source: '§2.1; the mean alone is unsafe where walls are thick' },
  ]
}
