import type { Content, DynamicContent } from 'pdfmake/interfaces'
import { INK, INK2, STOP } from '#server/pdf/definition/colours'
import { shownTime } from '#server/pdf/definition/shown-time'
import type { NotePdfData } from '#server/pdf/note-pdf-data'
import { MARGINS, PAGE } from '#server/pdf/typeset'

export const UNCONTROLLED = 'UNCONTROLLED when printed'
export const DEMONSTRATION = 'Demonstration only'

const rule = (y: number): Content => ({ canvas: [{ type: 'line', x1: 0, y1: y, x2: PAGE.measure, y2: y, lineWidth: 0.75, lineColor: INK }] })

/** In fours, as it is read aloud. */
export const spaced = (hash: string, digits = 24): string => hash.slice(0, digits).replace(/.{4}(?=.)/g, '$& ')

/** Number, issue, title and page on every page, and what restricts its use. */
export function header(data: NotePdfData): DynamicContent {
  const marks = [data.uncontrolled ? UNCONTROLLED : '', data.demonstration ? DEMONSTRATION : ''].filter(Boolean).join(' · ')
  return (page, pages) => ({
    margin: [MARGINS.left, 34, MARGINS.right, 0], fontSize: 8.5, color: INK2,
    stack: [
      {
        columns: [
          { width: '*', text: [{ text: data.number, bold: true, color: INK }, ` issue ${data.letter}`] },
          { width: 'auto', text: marks || shortened(data.title), ...(marks ? { bold: true, color: STOP } : {}) },
          { width: '*', text: `page ${page} of ${pages}`, alignment: 'right' },
        ],
      },
      rule(3),
    ],
  })
}

export function footer(data: NotePdfData): DynamicContent {
  return () => ({
    margin: [MARGINS.left, 22, MARGINS.right, 0], fontSize: 8.5, color: INK2,
    stack: [
      rule(0),
      {
        margin: [0, 4, 0, 0],
        columns: [
          { width: '*', text: data.uncontrolled ? `Printed ${shownTime(data.createdAt)}, save ${data.save}` : `Released ${shownTime(data.createdAt)}` },
          { width: 'auto', text: data.contentHash ? `content ${spaced(data.contentHash)}` : `${data.state}, content not yet hashed` },
          { width: '*', text: data.project.code, alignment: 'right' },
        ],
      },
    ],
  })
}

const shortened = (title: string) => title.length > 64 ? `${title.slice(0, 62).trimEnd()}…` : title
