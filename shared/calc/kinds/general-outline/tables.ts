/** Tables of a general outline: the three meshes, the greatest shears, the solution's own checks, and the compared values. */
import type { CaseRow, ComparedValue, ResultTable } from '#shared/calc/types'
import type { Solution } from '#shared/calc/kinds/general-outline/solution'
import { modulusUnit } from '#shared/calc/kinds/general-outline/outputs'
import { shownUnits } from '#shared/calc/parts/shown-units'

type Column = ResultTable['columns'][number]
const word = (key: string, label: string): Column => ({ key, label, dimension: null, unit: '' })

export const outlineTables = (s: Solution): ResultTable[] => [meshes(s), ...greatest(s), ...casesWithoutPeak(s), checks(s)]

function meshes(s: Solution): ResultTable {
  const u = shownUnits(s.model)
  const { J, shear, unknowns } = s.torsion
  const peaks = shear.bounded ? shear.peaks : shear.outside
  const tau = shear.bounded ? 'Peak shear over Gθ′' : 'Largest shear over Gθ′ outside sharp vertices'
  return {
    key: 'meshes', title: 'Three meshes',
    columns: [
      { key: 'unknowns', label: 'Unknowns', dimension: 'number', unit: '' },
      { key: 'J', label: 'Torsion constant', symbol: 'J', dimension: 'inertia', unit: u.inertia },
      { key: 'tau', label: tau, symbol: '\\tau/G\\theta\'', dimension: 'length', unit: u.length },
    ],
    rows: unknowns.map((count, k) => ({ id: `mesh-${k + 1}`, cells: [count, J.onMeshes[k] ?? null, peaks?.estimate.onMeshes[k] ?? null] })),
  }
}

function greatest(s: Solution): ResultTable[] {
  const u = shownUnits(s.model)
  const { shear } = s.torsion
  const peaks = shear.bounded ? shear.peaks : shear.outside
  if (!peaks) return []
  return [{
    key: 'maxima', title: shear.bounded ? 'Greatest shears on the outline' : 'Greatest shears outside the discs at sharp vertices; the peak itself is unbounded',
    columns: [
      word('edge', 'Edge'),
      { key: 'x', label: 'x', dimension: 'length', unit: u.length }, { key: 'y', label: 'y', dimension: 'length', unit: u.length },
      { key: 'tau', label: 'Shear over Gθ′', symbol: '\\tau/G\\theta\'', dimension: 'length', unit: u.length },
    ],
    rows: [peaks.first, ...peaks.next].map(({ edge, at, tau }, k) => ({ id: `maximum-${k + 1}`, cells: [edge, at.x, at.y, tau] })),
  }]
}

function checks(s: Solution): ResultTable {
  return {
    key: 'checks', title: 'Checks of the solution on itself',
    columns: [word('check', 'What must agree'), { key: 'seen', label: 'Seen', dimension: 'number', unit: '' }, { key: 'limit', label: 'At most', dimension: 'number', unit: '' }],
    rows: s.torsion.checks.map(({ name, value, limit }, k) => ({ id: `check-${k + 1}`, cells: [name, value, limit] })),
  }
}

export function comparedValues(s: Solution): ComparedValue[] {
  const u = shownUnits(s.model)
  const source = (verdict: string, expected: number | null): string =>
    `${s.model.first?.source || 'first method'}; expected within ${expected === null ? 'no known limit' : `${100 * expected} %`}: ${verdict}`
  return s.compared.map(({ quantity, first, second, agreement: { verdict, expected } }): ComparedValue => {
    const from = source(verdict, expected)
    if (quantity === 'J') return { key: 'J', label: 'Torsion constant by the first method', used: second, compared: first, dimension: 'inertia', unit: u.inertia, source: from }
    if (quantity === 'gamma') return { key: 'Gamma', label: 'Warping constant by the first method', used: second, compared: first, dimension: 'warping', unit: u.warping, source: from }
    return { key: 'W_T', label: 'Torsional modulus by the first method', used: 1 / second, compared: 1 / first, dimension: 'firstMoment', unit: modulusUnit(s), source: from }
  })
}

/** Rows of the cases; none where the peak is unbounded, since every such row names a peak. */
export function caseRows(s: Solution): CaseRow[] {
  return s.cases.flatMap((c): CaseRow[] => {
    if (c.tau === null) return []
    const margins = s.margins.flatMap(row => (row.caseId === c.model.id && row.ms !== null ? [row.ms] : []))
    return [{
      caseId: c.model.id, title: c.model.title, level: c.model.level, torque: c.torque, rate: c.rate, twist: c.twist,
      tauMax: c.tau, tauMaxWall: s.peaks?.first.edge ?? '', tauCorner: null, leastMargin: margins.length ? Math.min(...margins) : null,
    }]
  })
}

function casesWithoutPeak(s: Solution): ResultTable[] {
  if (s.peaks) return []
  const u = shownUnits(s.model)
  return [{
    key: 'cases', title: 'Cases; their peak shear is unbounded',
    columns: [
      word('title', 'Case'), { key: 'T', label: 'Torque', symbol: 'T', dimension: 'torque', unit: u.torque },
      { key: 'theta', label: 'Rate of twist', symbol: '\\theta\'', dimension: 'rateOfTwist', unit: u.rate }, { key: 'twist', label: 'Twist', symbol: '\\varphi', dimension: 'angle', unit: '°' },
    ],
    rows: s.cases.map(c => ({ id: c.model.id, cells: [c.model.title, c.torque, c.rate, c.twist] })),
  }]
}
