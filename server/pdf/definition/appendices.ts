import type { Content } from 'pdfmake/interfaces'
import { INK2, INK3, STOP } from '#server/pdf/definition/colours'
import { inputListing } from '#server/pdf/definition/input-listing'
import { resultOf, type NoteContext } from '#server/pdf/definition/note-context'
import { shownDay } from '#server/pdf/definition/shown-time'
import { ruledTable } from '#server/pdf/definition/tables'
import { working } from '#server/pdf/definition/working'
import { CONTENT_FILE, NOTE_FILE } from '#server/pdf/signing/attached-note'
import { sectionAnchor } from '#server/pdf/definition/anchors'

const head = (number: string, title: string): Content => ({
  text: [{ text: `${number}  `, color: INK3, bold: false }, title], bold: true, fontSize: 12.5, margin: [0, 14, 0, 3],
  outline: true, outlineText: `${number}  ${title}`, outlineParentId: sectionAnchor('appendices'),
} as Content)
const none = (text: string): Content => ({ text, color: INK2, margin: [0, 2, 0, 6] })

/** Working, inputs as typed, check sheet, deviations, numbers kept as typed, and how to verify the file. */
export function appendices(context: NoteContext): Content[] {
  const { data, calculations } = context
  return [
    head('A.1', 'Working'),
    ...(calculations.length === 0 ? [none('This note has no calculations.')] : calculations.flatMap(one => working(one, resultOf(data, one.id)))),
    head('A.2', 'Inputs as typed'),
    ...(calculations.length === 0 ? [none('This note has no calculations.')] : calculations.flatMap(one => [
      { text: [{ text: `${one.label}  `, color: INK3, bold: false }, one.title], bold: true, fontSize: 11, margin: [0, 8, 0, 0] } as Content, inputListing(one, context),
    ])),
    head('A.3', 'Check sheet'), checkSheet(context),
    head('A.4', 'Deviations'), deviations(context),
    head('A.5', 'Numbers kept as typed'), decisions(context),
    head('A.6', 'How to verify this file'), ...howToVerify(context),
  ]
}

function checkSheet({ data }: NoteContext): Content {
  if (data.checkSheet.length === 0) return none('No check sheet was begun.')
  return ruledTable({
    columns: [{ width: 20, head: 'No.', right: true }, { width: '*', head: 'Item' }, { width: 62, head: 'Verdict' }, { width: 150, head: 'Evidence' }, { width: 80, head: 'By' }],
    rows: data.checkSheet.map(item => [
      String(item.item), item.text, item.verdict === null ? { text: 'open', color: STOP } : item.verdict === 'ok' ? 'OK' : { text: item.verdict, ...(item.verdict === 'not ok' ? { color: STOP, bold: true } : {}) },
      item.evidence || '–', { text: item.by ? `${item.by}, ${item.at ? shownDay(item.at) : ''}` : '–', color: INK2 },
    ]),
  })
}

function deviations({ data, calculations }: NoteContext): Content {
  const found = data.answers.filter(answer => answer.kind === 'deviation')
  if (found.length === 0) return none('None.')
  return ruledTable({
    columns: [{ width: 'auto', head: 'Calc.' }, { width: 60, head: 'Guard' }, { width: '*', head: 'Deviation' }, { width: 84, head: 'Judged' }, { width: 84, head: 'Approved' }],
    rows: found.map(answer => [
      calculations.find(one => one.id === answer.calcId)?.label ?? '–', answer.guardKey, `${answer.text} (${answer.author}, ${shownDay(answer.at)})`,
      answer.judged ? `${answer.judged.accepted ? 'accepted' : 'not accepted'}, ${answer.judged.by}, ${shownDay(answer.judged.at)}${answer.judged.note ? `: ${answer.judged.note}` : ''}` : 'not judged',
      answer.approved ? `${answer.approved.by}, ${shownDay(answer.approved.at)}` : 'not approved',
    ]),
  })
}

function decisions({ data }: NoteContext): Content {
  if (data.loose.length === 0) return none('None: every quantity in the text is tied to a result.')
  return ruledTable({
    columns: [{ width: 90, head: 'As typed' }, { width: '*', head: 'Why it is not tied' }, { width: 110, head: 'By' }],
    rows: data.loose.map(one => [one.text, one.reason, { text: `${one.by}, ${shownDay(one.at)}`, color: INK2 }]),
  })
}

function howToVerify({ data }: NoteContext): Content[] {
  if (data.uncontrolled) return [none('This print is uncontrolled and not signed. It proves nothing; read the issue itself.')]
  return [
    { text: `The file is certified by one electronic signature over all of its bytes; a reader of PDF files shows it, and any change to the file breaks it. The signatures of analyst, checker and approver are acts recorded in the trail of the note and stated on the cover.`, margin: [0, 2, 0, 5] },
    { text: `Attached are ${NOTE_FILE}, the data of this print, and ${CONTENT_FILE}, the frozen parts of the issue. The content hash on the cover is the SHA-256 of ${CONTENT_FILE}: take the file out, hash it, and compare. The inputs in it are those the results were made from.`, margin: [0, 0, 0, 5] },
    { text: `Content hash ${data.contentHash ?? 'not made'}`, fontSize: 9, color: INK2 },
  ]
}
