import type { Content } from 'pdfmake/interfaces'
import { INK3 } from '#server/pdf/definition/colours'
import type { TextRun } from '#server/pdf/typeset'

/** How far text stands in from the numbers of sections. */
export const HANG = 26

/** A section's head: its number hangs before the text. */
export function sectionHeading(number: string, title: string, id: string, options: { newPage?: boolean } = {}): Content {
  return {
    columns: [
      { width: HANG, text: number, fontSize: 10.5, color: INK3, margin: [0, 3.2, 0, 0] },
      { width: '*', text: title, fontSize: 14.5, bold: true, id, outline: true, outlineText: `${number}  ${title}`, outlineId: id },
    ],
    margin: [0, 18, 0, 5],
    ...(options.newPage ? { pageBreak: 'before' as const } : {}),
  } as Content
}

/** A heading inside a section. */
export function subHeading(number: string, runs: TextRun[], id: string, parent: string, level = 1): Content {
  const plain = runs.map(run => run.equation?.tex ?? run.text).join('')
  const size = [12.5, 11.5, 10.5][level - 1] ?? 10.5
  return {
    text: [{ text: `${number}  `, color: INK3, bold: false }, ...runs], fontSize: size, bold: true, id, margin: [HANG, 9, 0, 3],
    outline: true, outlineText: `${number}  ${plain}`, outlineParentId: parent,
  } as Content
}
