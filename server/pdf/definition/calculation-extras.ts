/** Tables, plots and compared values of a calculation of any kind. */
import type { Content } from 'pdfmake/interfaces'
import { plotToSvg } from '#shared/calc/drawing/plot-svg'
import type { CalcResult, ComparedValue, Plot, ResultTable } from '#shared/calc/types'
import { decimals, minusSign, showQuantity, showValue } from '#shared/units/display'
import { INK2 } from '#server/pdf/definition/colours'
import { alignDecimals, ruledTable } from '#server/pdf/definition/tables'
import { PAGE } from '#server/pdf/typeset'

const PLOT_HEIGHT = 220

export const extras = ({ tables = [], plots = [], compared = [] }: CalcResult): Content[] =>
  [...tables.filter(table => table.rows.length > 0).map(resultTable), ...plots.map(plotContent), ...(compared.length > 0 ? [comparedTable(compared)] : [])]

function resultTable(table: ResultTable): Content {
  const columns = table.columns.map((column, c) => {
    const cells = table.rows.map(row => row.cells[c] ?? null)
    const { dimension, unit } = column
    return dimension === null
      ? cells.map(cell => ({ text: String(cell ?? ''), color: INK2 }))
      : alignDecimals(cells.map(cell => typeof cell === 'number' ? showValue(cell, dimension, unit) : cell ?? '–'))
  })
  return {
    stack: [
      { text: table.title, bold: true, fontSize: 10, margin: [0, 6, 0, 0] },
      ruledTable({
        columns: table.columns.map(({ label, unit, dimension }) => ({ width: dimension === null ? '*' : 'auto', head: label, ...(unit === '' ? {} : { unit }), right: dimension !== null })),
        rows: table.rows.map((_, r) => columns.map(column => column[r] ?? '')), margin: [0, 2, 0, 6],
      }),
    ],
  }
}

const plotContent = (plot: Plot): Content => ({
  stack: [{ text: plot.title, bold: true, fontSize: 10, margin: [0, 6, 0, 2] }, { svg: plotToSvg(plot, { width: PAGE.measure, theme: 'print' }), fit: [PAGE.measure, PLOT_HEIGHT] }],
  unbreakable: true,
})

function comparedTable(rows: readonly ComparedValue[]): Content {
  const apart = ({ used, compared }: ComparedValue) => {
    const percent = used === 0 ? 0 : (compared / used - 1) * 100
    return `${percent < 0 ? minusSign : '+'}${decimals(Math.abs(percent), 2)} %`
  }
  return ruledTable({
    columns: [{ width: '*', head: 'Compared with other formulas' }, { width: 'auto', head: 'Used', right: true }, { width: 'auto', head: 'Compared', right: true }, { width: 'auto', head: 'Difference', right: true }, { width: 130, head: 'Source' }],
    rows: rows.map(row => [row.label, showQuantity(row.used, row.dimension, row.unit), showQuantity(row.compared, row.dimension, row.unit), apart(row), { text: row.source, color: INK2 }]),
    margin: [0, 6, 0, 6],
  })
}
