/** A result as other tools read it: every number with its units, in the engine's own and as it is shown. */
import { fromEngine, engineUnit, type Dimension, type UnitId } from '#shared/units/units'
import { showMargin, showQuantity } from '#shared/units/display'
import type { CalcResult, MarginRow, Output, Plot, ResultTable } from '#shared/calc/types'

/** One number twice: in engine units at full precision, and in the unit it is shown in with its text. */
export interface BatchQuantity { value: number, unit: UnitId, shown: { value: number, unit: UnitId, text: string } }

const quantity = (value: number, dimension: Dimension, unit: UnitId): BatchQuantity =>
  ({ value, unit: engineUnit(dimension), shown: { value: fromEngine(value, unit), unit, text: showQuantity(value, dimension, unit) } })

const outputOf = ({ key, symbol, label, value, dimension, unit, method, caseId, wall }: Output) => ({
  key, symbol, label, dimension, ...quantity(value, dimension, unit), method, ...(caseId === undefined ? {} : { caseId }), ...(wall === undefined ? {} : { wall }),
})

const marginOf = ({ applied, allowable, dimension, unit, ms, ...row }: MarginRow) =>
  ({ ...row, dimension, applied: quantity(applied, dimension, unit), allowable: quantity(allowable, dimension, unit), ms, shown: showMargin(ms) })

const cellOf = (cell: number | string | null, { dimension, unit }: ResultTable['columns'][number]) =>
  typeof cell === 'number' && dimension !== null ? quantity(cell, dimension, unit) : cell

const tableOf = ({ key, title, columns, rows }: ResultTable) => ({
  key, title, columns,
  rows: rows.map(({ id, cells }) => ({ id, cells: cells.map((cell, i) => columns[i] ? cellOf(cell, columns[i]) : cell) })),
})

/** Points of a plot stay in engine units, which its axes name. */
const plotOf = ({ x, y, ...plot }: Plot) => ({ ...plot, x: { ...x, unit: engineUnit(x.dimension) }, y: { ...y, unit: engineUnit(y.dimension) } })

/** Everything but the drawing; the working where it is asked for. */
export function batchResult(result: CalcResult, more: { working: boolean }) {
  return {
    methodRevision: result.methodRevision,
    outputs: result.outputs.map(outputOf),
    margins: result.margins.map(marginOf),
    governing: result.governing,
    guards: result.guards,
    tables: (result.tables ?? []).map(tableOf),
    plots: (result.plots ?? []).map(plotOf),
    compared: (result.compared ?? []).map(({ used, compared, dimension, unit, ...rest }) => ({ ...rest, dimension, used: quantity(used, dimension, unit), compared: quantity(compared, dimension, unit) })),
    ...(more.working ? { working: result.working } : {}),
  }
}
