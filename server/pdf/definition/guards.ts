import type { Content } from 'pdfmake/interfaces'
import type { CalcResult, Guard, Severity } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { CAUTION, HAIR, INFORMATION, INK, INK2, INK3, STOP } from '#server/pdf/definition/colours'
import { rowsFit } from '#server/pdf/definition/keep-together'
import type { NoteContext } from '#server/pdf/definition/note-context'
import { shownDay } from '#server/pdf/definition/shown-time'
import { TABLE_TEXT } from '#server/pdf/definition/tables'
import type { PdfAnswer } from '#server/pdf/note-pdf-data'

const COLOUR: Record<Severity, string> = { information: INFORMATION, caution: CAUTION, stop: STOP }
const SHAPE: Record<Severity, string> = {
  information: '<circle cx="6" cy="6" r="4.6"/><path d="M6 5.4v3M6 3.4v.4"/>',
  caution: '<path d="M6 1.2l5 9H1z"/><path d="M6 4.4v2.8M6 8.5v.4"/>',
  stop: '<path d="M4 1.2h4l2.8 2.8v4L8 10.8H4L1.2 8V4z"/><path d="M4 6h4"/>',
}

/** The sign of a severity: told by its shape, its word stands beside it. */
const sign = (severity: Severity): Content => ({
  svg: `<svg xmlns="http://www.w3.org/2000/svg" width="12" height="12" viewBox="0 0 12 12"><g fill="none" stroke="${COLOUR[severity]}" stroke-width="1">${SHAPE[severity]}</g></svg>`,
  width: 10, margin: [0, 1, 0, 0],
})

/** What the method warns of in one calculation, with the answers given and who accepted them. */
export function guardList(calculation: NoteCalculation, result: CalcResult, { data }: NoteContext): Content[] {
  if (result.guards.length === 0) return [{ text: 'No guard of this method spoke up.', fontSize: 9, color: INK2, margin: [0, 4, 0, 4] }]
  const rows = result.guards.map((guard) => {
    const answer = data.answers.find(one => one.calcId === calculation.id && one.guardKey === guard.key)
    return [sign(guard.severity), guardText(guard, answer), who(guard, answer)]
  })
  return [{
    table: {
      dontBreakRows: rowsFit(rows), widths: [12, '*', 152], body: rows,
    },
    layout: {
      hLineWidth: (i, node) => i === node.table.body.length ? 1 : 0.5, hLineColor: (i, node) => i === node.table.body.length ? INK : HAIR,
      vLineWidth: () => 0, paddingLeft: i => i === 0 ? 0 : 6, paddingRight: () => 0, paddingTop: () => 4, paddingBottom: () => 4,
    },
    margin: [0, 4, 0, 6], ...TABLE_TEXT, lineHeight: 1.18,
  }]
}

function guardText(guard: Guard, answer: PdfAnswer | undefined): Content {
  return {
    stack: [
      { text: [{ text: guard.title, bold: true }, { text: ` ${word(guard)}, ${guard.id}. `, color: COLOUR[guard.severity] }, guard.message] },
      ...(answer ? [{ text: [{ text: answer.kind === 'deviation' ? 'Deviation. ' : 'Answer. ', italics: true, color: INK3 }, answer.text], margin: [0, 2, 0, 0] as [number, number, number, number] }] : []),
    ],
  }
}

const word = (guard: Guard) => guard.severity === 'stop' && guard.deviable ? 'stop †' : guard.severity

function who(guard: Guard, answer: PdfAnswer | undefined): Content {
  if (!answer) return { text: guard.severity === 'information' ? '' : 'not answered', alignment: 'right', ...(guard.severity === 'information' ? {} : { color: STOP }) }
  const { judged, approved } = answer
  const lines = [
    `${answer.author}, ${shownDay(answer.at)}`,
    judged ? `${judged.accepted ? 'accepted' : 'not accepted'} by ${judged.by}, ${shownDay(judged.at)}` : 'not yet accepted',
    ...(answer.kind === 'deviation' ? [approved ? `approved by ${approved.by}, ${shownDay(approved.at)}` : 'not yet approved'] : []),
  ]
  return { text: lines.join('\n'), alignment: 'right', color: INK2, fontSize: 8.5 }
}
