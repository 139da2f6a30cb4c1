import type { Content, ContentTable, CustomTableLayout, TableCell } from 'pdfmake/interfaces'
import { ACCENT, HAIR, INK, INK2, INK3 } from '#server/pdf/definition/colours'
import { rowsFit } from '#server/pdf/definition/keep-together'
import { PAGE } from '#server/pdf/typeset'

export type Width = number | 'auto' | '*'

export interface Column { width: Width, head: string, unit?: string, right?: boolean }

export interface TableWords {
  columns: Column[]
  rows: TableCell[][]
  /** Index of the row that governs: bold, with a bar. */
  governing?: number
  margin?: [number, number, number, number]
}

export const TABLE_TEXT = { fontSize: 9, lineHeight: 1.1, fontFeatures: ['tnum' as const] }

/** Ruled as everything here: a line under the head, hairlines between rows, a line at the end; no boxes. */
function ruled(governing: number | undefined): CustomTableLayout {
  return {
    hLineWidth: (i, node) => i === 0 ? 0 : i === 1 ? 1 : i === node.table.body.length ? 0.75 : 0.5,
    hLineColor: (i, node) => i === 1 || i === node.table.body.length ? INK : HAIR,
    vLineWidth: i => i === 0 && governing !== undefined ? 2.25 : 0,
    vLineColor: (_i, _node, row) => row === (governing ?? -2) + 1 ? ACCENT : '#FFFFFF',
    paddingLeft: i => i === 0 ? (governing === undefined ? 0 : 5) : 5,
    paddingRight: (i, node) => i === (node.table.widths?.length ?? 0) - 1 ? 0 : 5,
    paddingTop: () => 3.5,
    paddingBottom: () => 3,
  }
}

const plain = (cell: TableCell): Record<string, unknown> => typeof cell === 'object' ? { ...cell } : { text: String(cell) }

export function ruledTable({ columns, rows, governing, margin = [0, 4, 0, 12] }: TableWords): ContentTable {
  const head: TableCell[] = columns.map(({ head, unit, right }) => ({
    text: unit ? [`${head}\n`, { text: unit, color: INK3 }] : head, color: INK2, fontSize: 8.5, alignment: right ? 'right' : 'left',
  }))
  const body = rows.map((row, index) => row.map((cell, i) => {
    const [as, bold] = [columns[i]?.right ? { alignment: 'right' } : {}, index === governing ? { bold: true } : {}]
    return { ...as, ...bold, ...plain(cell) } as TableCell
  }))
  return {
    table: { headerRows: 1, keepWithHeaderRows: 1, dontBreakRows: rowsFit(rows), widths: columns.map(column => column.width), body: [head, ...body] },
    layout: ruled(governing), margin, ...TABLE_TEXT,
  }
}

/** Facts side by side under small labels, between a heavy rule and a plain one, as in a title block. */
export function titleBlock(facts: { label: string, value: Content, width: Width }[]): Content {
  const cells = facts.map(({ label, value }): TableCell => ({ stack: [{ text: label, fontSize: 8.5, color: INK3 }, value] }))
  return { stack: sideBySide(cells, facts.map(fact => fact.width)), fontSize: 9.75, lineHeight: 1.2 }
}

/** Cells parted by hairlines between a heavy rule and a plain one. The rules are drawn apart, so that no hairline cuts them. */
export function sideBySide(cells: TableCell[], widths: Width[]): Content[] {
  return [
    heavyRule(PAGE.measure),
    {
      table: { widths, body: [cells] },
      layout: {
        hLineWidth: () => 0, vLineWidth: i => i === 0 || i === cells.length ? 0 : 0.5, vLineColor: () => HAIR,
        paddingLeft: i => i === 0 ? 0 : 9, paddingRight: () => 9, paddingTop: () => 4, paddingBottom: () => 6,
      },
    },
    heavyRule(PAGE.measure, 0.75),
  ]
}

/** Numbers of one column under each other by their decimal point: what a shorter one lacks is filled with spaces as wide as digits, and a thin one for the point. */
export function alignDecimals(values: string[]): TableCell[] {
  const plain = (value: string) => /^[+\u2212]?[\d\u2009]+(\.\d+)?$/.exec(value)
  const fraction = (value: string) => plain(value)?.[1] ?? ''
  const longest = Math.max(0, ...values.map(value => fraction(value).length))
  return values.map((value) => {
    const missing = plain(value) ? longest - fraction(value).length : 0
    const spaces = missing > 0 && fraction(value) === '' ? `\u2009${'\u2007'.repeat(missing - 1)}` : '\u2007'.repeat(Math.max(missing, 0))
    return { text: value + spaces, preserveTrailingSpaces: true }
  })
}

/** A rule over the whole measure. */
export const heavyRule = (width: number, weight = 1.9): Content =>
  ({ canvas: [{ type: 'line', x1: 0, y1: 0, x2: width, y2: 0, lineWidth: weight, lineColor: INK }] })
