import type { Content } from 'pdfmake/interfaces'
import type { CalcResult, WorkingLine } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { workingAnchor } from '#server/pdf/definition/anchors'
import { blockEquation } from '#server/pdf/definition/block-equation'
import { INK2, INK3 } from '#server/pdf/definition/colours'
import { HANG } from '#server/pdf/definition/headings'

/** Symbols, then numbers, then the result: one line of mathematics. */
const lineTex = ({ symbols, numbers, result }: WorkingLine) => [symbols, numbers, result].filter(part => part !== '').join(' = ')

/** The derivation of a calculation with its numbers put in, to be followed with a pocket calculator. */
export function working(calculation: NoteCalculation, result: CalcResult | null): Content[] {
  const steps = result?.working ?? []
  const head: Content = {
    text: [{ text: `${calculation.label}  `, color: INK3, bold: false }, calculation.title], bold: true, fontSize: 11, id: workingAnchor(calculation.id), margin: [0, 10, 0, 3],
  }
  if (steps.length === 0) return [head, { text: 'No working: there is no result.', color: INK2, fontSize: 9.5 }]
  return [head, ...steps.map((step): Content => {
    const [first, ...rest] = step.lines.map(line => blockEquation(lineTex(line), { margin: [HANG, 2, 0, 3], size: 9.5 }))
    const title: Content = { text: [step.heading, { text: `  ${step.method}`, color: INK3 }], fontSize: 9.5, italics: true, margin: [0, 6, 0, 1] }
    return { stack: [{ stack: first ? [title, first] : [title], unbreakable: true }, ...rest] }
  })]
}
