import type { Content } from 'pdfmake/interfaces'
import { drawingToSvg } from '#shared/calc/drawing-svg'
import { calcKind, isCalcKind } from '#shared/calc/registry'
import type { CalcResult, MarginRow, Output } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { showMargin, showQuantity, showValue } from '#shared/units/display'
import { calculationAnchor, workingAnchor } from '#server/pdf/definition/anchors'
import { extras } from '#server/pdf/definition/calculation-extras'
import { caseTable, wallTable } from '#server/pdf/definition/calculation-results'
import { HAIR, INK2, INK3, STOP } from '#server/pdf/definition/colours'
import { guardList } from '#server/pdf/definition/guards'
import { inputSummary } from '#server/pdf/definition/input-summary'
import { resultOf, type NoteContext } from '#server/pdf/definition/note-context'
import { alignDecimals, heavyRule, TABLE_TEXT } from '#server/pdf/definition/tables'
import { setEquation } from '#server/pdf/equations'
import { equationRun, PAGE } from '#server/pdf/typeset'

const SKETCH = 296
const SKETCH_HEIGHT = 330
const OUTPUTS = PAGE.measure - SKETCH - 16

/** A calculation where it stands in the text: what it is, its sketch, its results and what its method warns of. */
export function calculationContent(id: string, context: NoteContext): Content {
  const calculation = context.calculations.find(one => one.id === id)
  if (!calculation) return { text: '' }
  const result = resultOf(context.data, id)
  const head = title(calculation, result)
  if (!result) return { stack: [...head, faults(calculation, context)], margin: [0, 10, 0, 14] }
  return {
    stack: [
      { stack: [...head, overview(result)], unbreakable: true },
      inputSummary(calculation, result, context),
      ...guardList(calculation, result, context),
      wallTable(result),
      caseTable(result),
      ...extras(result),
      ...(result.working.length > 0 ? [{ text: ['Its working stands in appendix A.1, on page ', { pageReference: workingAnchor(id) } as unknown as string], fontSize: 9, color: INK2 }] : []),
    ],
    margin: [0, 10, 0, 14],
  }
}

function title(calculation: NoteCalculation, result: CalcResult | null): Content[] {
  const cases = result && result.cases.length > 1 ? `, ${result.cases.length} cases` : ''
  const kind = isCalcKind(calculation.kind) ? calcKind(calculation.kind).title.toLowerCase() : calculation.kind
  return [
    heavyRule(PAGE.measure),
    {
      columns: [
        {
          width: '*', id: calculationAnchor(calculation.id),
          text: [{ text: `Calculation ${calculation.label}  `, fontSize: 10, color: INK3 }, { text: calculation.title, bold: true, fontSize: 12.5 }],
        },
        { width: 'auto', text: `${kind}${cases}`, fontSize: 10, color: INK2, margin: [10, 2, 0, 0] },
      ],
      margin: [0, 5, 0, 4],
    },
    { canvas: [{ type: 'line', x1: 0, y1: 0, x2: PAGE.measure, y2: 0, lineWidth: 0.5, lineColor: HAIR }] },
  ]
}

function faults(calculation: NoteCalculation, { data }: NoteContext): Content {
  const evaluation = data.results[calculation.id]
  const lines = evaluation?.ok === false ? evaluation.faults.map(fault => fault.message) : ['It was not evaluated.']
  return { stack: [{ text: 'No result.', bold: true, color: STOP }, { ul: lines, margin: [0, 2, 0, 0] }], fontSize: 9.5, margin: [0, 6, 0, 0] }
}

/** Sketch to scale at the left, the governing margin and the first results at the right. */
function overview(result: CalcResult): Content {
  const governing = result.margins.find(row => row.key === result.governing)
  const figures: Content = { stack: [...(governing ? [governingMargin(governing)] : []), outputsTable(result)] }
  if (!result.drawing) return { ...figures, margin: [0, 8, 0, 8] } as Content
  const { box } = result.drawing
  // A tall section is drawn narrower, so that the sketch never outgrows the page.
  const width = Math.max(90, Math.min(SKETCH, SKETCH_HEIGHT * box.width / Math.max(box.height, 1e-9)))
  return {
    columns: [{ width: SKETCH, svg: drawingToSvg(result.drawing, { width, theme: 'print' }), fit: [SKETCH, SKETCH_HEIGHT + 60] }, { width: OUTPUTS, ...figures as object }],
    columnGap: 16, margin: [0, 8, 0, 8],
  } as Content
}

function governingMargin(row: MarginRow): Content {
  const negative = (row.ms ?? 0) < 0
  return {
    columns: [
      { width: 'auto', text: showMargin(row.ms), fontSize: 19, bold: true, lineHeight: 1, ...(negative ? { color: STOP } : {}) },
      {
        width: '*', fontSize: 9, lineHeight: 1.15, margin: [0, 2, 0, 0],
        text: [
          ...(negative ? [{ text: 'Negative: not adequate. ', bold: true, color: STOP }] : []),
          `${row.modeLabel}, ${row.caseId}, ${row.place}\n`,
          { text: `${showQuantity(row.applied, row.dimension, row.unit)} of ${showQuantity(row.allowable, row.dimension, row.unit)}`, color: INK2 },
        ],
      },
    ],
    columnGap: 10, margin: [0, 0, 0, 6],
  }
}

function outputsTable(result: CalcResult): Content {
  const outputs = result.outputs.filter(output => output.primary && output.key !== 'MS').slice(0, 9)
  const values = alignDecimals(outputs.map(output => showValue(output.value, output.dimension, output.unit)))
  return {
    table: {
      widths: ['*', 'auto', 'auto'],
      body: outputs.length === 0 ? [['', '', '']] : outputs.map((output, i) => [outputName(output), { ...values[i] as object, alignment: 'right' }, { text: output.unit, color: INK3 }]),
    },
    layout: {
      hLineWidth: i => i === 0 ? 0 : 0.5, hLineColor: () => HAIR, vLineWidth: () => 0,
      paddingLeft: i => i === 0 ? 0 : 5, paddingRight: () => 0, paddingTop: () => 3, paddingBottom: () => 2,
    },
    ...TABLE_TEXT,
  } as Content
}

const outputName = (output: Output) => ({ text: output.dimension === 'margin' ? output.label : [`${output.label} `, equationRun(setEquation(output.symbol, 9))] })
