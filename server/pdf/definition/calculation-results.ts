import type { Content } from 'pdfmake/interfaces'
import type { CalcResult, CaseRow, Output } from '#shared/calc/types'
import { showMargin, showValue } from '#shared/units/display'
import type { Dimension, UnitId } from '#shared/units/units'
import { INK2 } from '#server/pdf/definition/colours'
import { alignDecimals, ruledTable, type Column } from '#server/pdf/definition/tables'

/** Stresses of more cases than these stand in the appendix only. */
const MAX_CASE_COLUMNS = 4

/** The unit a result of this sort is shown in: the one its output has. */
function unitOf(result: CalcResult, key: (output: Output) => boolean, otherwise: UnitId): UnitId {
  return result.outputs.find(key)?.unit ?? otherwise
}

interface Series { column: Column, values: number[], dimension: Dimension, unit: UnitId }

/** Lengths are mostly as typed: the zeros that five figures would add say nothing. */
const shortened = (shown: string, dimension: Dimension) => dimension === 'length' ? shown.replace(/(\.\d*?)0+$/, '$1').replace(/\.$/, '') : shown
const shownColumn = ({ values, dimension, unit }: Series) => alignDecimals(values.map(value => shortened(showValue(value, dimension, unit), dimension)))

/** Results by wall; the wall with the least margin is marked. */
export function wallTable(result: CalcResult): Content {
  const { walls } = result
  if (walls.length === 0) return { text: '' }
  const byKey = (prefix: string) => (output: Output) => output.key.startsWith(prefix)
  const stress = unitOf(result, output => output.key.startsWith('tau:'), 'MPa')
  const number = (head: string, unit: UnitId, dimension: Dimension, values: number[]): Series => ({ column: { width: 'auto', head, unit, right: true }, values, dimension, unit })
  const series: Series[] = [
    number('Length', unitOf(result, byKey('L:'), 'mm'), 'length', walls.map(wall => wall.length)),
    number('t', unitOf(result, byKey('t:'), 'mm'), 'length', walls.map(wall => wall.thickness)),
    number('G', unitOf(result, byKey('G:'), 'MPa'), 'stress', walls.map(wall => wall.G)),
    number('Part of J', unitOf(result, byKey('J:'), 'mm⁴'), 'inertia', walls.map(wall => wall.J)),
    number('Share', '%', 'ratio', walls.map(wall => wall.share)),
    ...casesShown(result).map(one => number(`τ, ${one.caseId}`, stress, 'stress', walls.map(wall => wall.tau[one.caseId] ?? 0))),
  ]
  const least = leastIndex(walls.map(wall => wall.leastMargin))
  const columns = series.map(shownColumn)
  const margins = alignDecimals(walls.map(wall => showMargin(wall.leastMargin)))
  const hidden = result.cases.length - casesShown(result).length
  return {
    stack: [
      ruledTable({
        columns: [{ width: '*', head: 'Wall' }, ...series.map(one => one.column), { width: 40, head: 'Margin', right: true }],
        rows: walls.map((wall, i) => [[{ text: `${wall.wall} ` }, { text: wall.name, color: INK2 }], ...columns.map(column => column[i] ?? ''), margins[i] ?? '']
          .map((cell, at) => at === 0 ? { text: cell } : cell) as never),
        ...(least === null ? {} : { governing: least }), margin: [0, 6, 0, 4],
      }),
      ...(hidden > 0 ? [{ text: `Stresses of the ${casesShown(result).length} cases with the least margins; the other ${hidden} stand in the table of cases.`, fontSize: 8.5, color: INK2 }] : []),
    ],
  }
}

/** The cases that press hardest, in the order they were given. */
function casesShown({ cases }: CalcResult): CaseRow[] {
  const hardest = [...cases].sort((a, b) => (a.leastMargin ?? Infinity) - (b.leastMargin ?? Infinity)).slice(0, MAX_CASE_COLUMNS)
  return cases.filter(one => hardest.includes(one))
}

/** Results by case; the case with the least margin is marked. */
export function caseTable(result: CalcResult): Content {
  const { cases, outputs } = result
  if (cases.length === 0) return { text: '' }
  const unit = (prefix: string, otherwise: UnitId) => unitOf(result, output => output.key.startsWith(prefix), otherwise)
  const twisted = cases.some(one => one.twist !== null)
  const cornered = outputs.some(output => output.key.startsWith('tau_corner'))
  const number = (head: string, unit: UnitId, dimension: Dimension, values: (number | null)[]) => ({
    column: { width: 'auto' as const, head, unit, right: true },
    shown: alignDecimals(values.map(value => value === null ? '–' : showValue(value, dimension, unit))),
  })
  const numbers = [
    number('Torque', unit('T@', 'N·m'), 'torque', cases.map(one => one.torque)),
    number('Rate of twist', unit('theta@', 'rad/m'), 'rateOfTwist', cases.map(one => one.rate)),
    number('', unit('theta_deg@', '°/m'), 'rateOfTwist', cases.map(one => one.rate)),
    ...(twisted ? [number('Twist', '°' as UnitId, 'angle', cases.map(one => one.twist))] : []),
    number('τ max', unit('tau_max@', 'MPa'), 'stress', cases.map(one => one.tauMax)),
    ...(cornered ? [number('τ corner', unit('tau_max@', 'MPa'), 'stress', cases.map(one => one.tauCorner))] : []),
  ]
  const margins = alignDecimals(cases.map(one => showMargin(one.leastMargin)))
  const least = leastIndex(cases.map(one => one.leastMargin))
  return ruledTable({
    columns: [{ width: 'auto', head: 'Case' }, { width: '*', head: 'Title' }, { width: 'auto', head: 'Level' }, ...numbers.map(one => one.column), { width: 40, head: 'Margin', right: true }],
    rows: cases.map((one, i) => [one.caseId, { text: one.title, color: INK2 }, one.level, ...numbers.map(number => number.shown[i] ?? ''), margins[i] ?? '']),
    ...(least === null ? {} : { governing: least }), margin: [0, 8, 0, 6],
  })
}

function leastIndex(margins: (number | null)[]): number | null {
  const loaded = margins.flatMap((margin, index) => margin === null ? [] : [{ margin, index }])
  return loaded.length === 0 ? null : loaded.reduce((least, one) => one.margin < least.margin ? one : least).index
}
