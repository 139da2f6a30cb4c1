import type { Content, TableCell } from 'pdfmake/interfaces'
import { showMargin } from '#shared/units/display'
import { INK2, INK3, STOP } from '#server/pdf/definition/colours'
import { isNegative, leastByMode, type NoteContext } from '#server/pdf/definition/note-context'
import { spaced } from '#server/pdf/definition/page-frame'
import { shownDay, shownTime } from '#server/pdf/definition/shown-time'
import { stamp } from '#server/pdf/definition/stamp'
import { leastMarginTable } from '#server/pdf/definition/margin-tables'
import { sideBySide, titleBlock } from '#server/pdf/definition/tables'
import type { NotePdfData, PdfPerson } from '#server/pdf/note-pdf-data'
import { MARGINS, PAGE } from '#server/pdf/typeset'

/** Where the people stand, and under them the picture of the signature. */
const PEOPLE_TOP = 600
export const SIGNATURE_PLACE = { x: MARGINS.left, y: 737, width: PAGE.measure, height: 26 }

/** What each signature says, and what is printed while it is not given. */
const MEANINGS: Record<PdfPerson['role'], { done: string, open: string }> = {
  Analyst: { done: 'wrote the note and submitted it for check', open: 'has not submitted it' },
  Checker: { done: 'followed every step, ticked every calculation and passed the note', open: 'has not passed it' },
  Approver: { done: 'confirms the check and releases the note for use', open: 'has not released it' },
}

export const CAUTIONS = 'The results in this note are aids for qualified engineers. They do not take the place of the governing code, the certification basis or the judgement of the responsible approver, and they must be checked independently.'

export function cover(context: NoteContext): Content[] {
  const { data } = context
  const title = data.title.length > 90 ? 19 : 23
  return [
    { columns: [{ width: '*', text: data.organisation ?? data.project.name }, { width: 'auto', text: data.organisation ? `${data.project.code} ${data.project.name}` : data.project.code }], fontSize: 9.75, margin: [0, 14, 0, 36] },
    {
      columns: [
        { width: '*', text: data.title, fontSize: title, bold: true, lineHeight: 1.1, outline: true, outlineText: `Cover: ${data.number} issue ${data.letter}` },
        stamp(data.state, releaseDay(data)),
      ],
      columnGap: 14,
    },
    { text: 'Torsion substantiation note', fontSize: 12.5, italics: true, color: INK2, margin: [0, 4, 0, 12] },
    titleBlock([
      { label: 'Note', value: { text: data.number, bold: true }, width: '*' },
      { label: 'Issue', value: data.letter, width: 34 },
      { label: 'Part', value: `${data.part}, drawing issue ${data.drawingIssue}`, width: 150 },
      { label: 'Project', value: `${data.project.code}`, width: 70 },
      { label: 'Save', value: String(data.save), width: 34 },
    ]),
    { text: verdict(context), margin: [0, 14, 40, 6] },
    leastMarginTable(context, { places: false }),
    { text: [{ text: 'Basis ', color: INK3 }, shortened(data.project.basis) || 'not given'], fontSize: 9, margin: [0, 0, 0, 4] },
    { text: CAUTIONS, fontSize: 9, italics: true, color: INK2, margin: [0, 0, 40, 0] },
    ...(data.demonstration ? [{ text: 'Demonstration only: maker, parts, people and values are invented. No part may be made, changed or flown on this paper.', fontSize: 9, bold: true, color: STOP, margin: [0, 4, 40, 0] as [number, number, number, number] }] : []),
    people(data),
  ]
}

/** The whole basis stands in the summary where it is longer. */
const shortened = (basis: string) => basis.length > 200 ? `${basis.slice(0, 198).trimEnd()}…` : basis

const releaseDay = (data: NotePdfData) => data.uncontrolled ? null : shownDay(data.createdAt)

/** The one sentence a reader wants first. A negative margin is said before anything else. */
export function verdict(context: NoteContext): Content[] {
  const { data, margins } = context
  const [least] = leastByMode(context)
  const part = `${data.part}, drawing issue ${data.drawingIssue}`
  const unusable = context.calculations.filter(one => data.results[one.id]?.ok !== true).length
  const faults = unusable > 0 ? [{ text: ` ${unusable === 1 ? 'One calculation has' : `${unusable} calculations have`} no result.`, bold: true, color: STOP }] : []
  if (!least) return [{ text: margins.length === 0 ? 'This issue has no margins.' : 'Nothing is loaded in this issue, so no margin governs.' }, ...faults]
  const where = ` The least margin is ${showMargin(least.row.ms)}, ${lower(least.row.modeLabel)}, in case ${least.row.caseId}, ${least.row.place} (calculation ${least.calculation.label}).`
  if (isNegative(least)) {
    return [{ text: 'NOT ADEQUATE. ', bold: true, color: STOP }, { text: `${part} does not carry its torque within the allowables of this note.${where}` }, ...faults]
  }
  return [{ text: `Every margin of ${part} is zero or more.${where}` }, ...faults]
}

const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1)

function people(data: NotePdfData): Content {
  const cell = (person: PdfPerson): TableCell => ({
    stack: [
      { text: person.role, fontSize: 8.5, color: INK3 },
      { text: person.name ?? 'not named', fontSize: 12.5, bold: true },
      { text: person.at ? MEANINGS[person.role].done : MEANINGS[person.role].open, fontSize: 9, color: person.at ? INK2 : STOP, margin: [0, 1, 0, 3] },
      { text: person.at ? `${person.role === 'Analyst' ? 'submitted' : 'signed'} ${shownTime(person.at)}` : '', fontSize: 8.5 },
      { text: person.save === null ? '' : `save ${person.save}`, fontSize: 8.5, color: INK2 },
    ],
    lineHeight: 1.12,
  })
  const others = data.contributors.filter(name => !data.people.some(person => person.name === name))
  const also = others.length > 0 ? `Also contributed: ${others.join(', ')}. ` : ''
  const hash = data.contentHash ? `Content ${spaced(data.contentHash, 64)}` : 'Content not yet hashed'
  return {
    absolutePosition: { x: MARGINS.left, y: PEOPLE_TOP },
    stack: [
      ...sideBySide(data.people.map(cell), data.people.map(() => '*')),
      { text: [also, { text: hash, color: INK2 }], fontSize: 8, margin: [0, 6, 0, 0], lineHeight: 1.1 },
    ],
  }
}
