import type { Content } from 'pdfmake/interfaces'
import { HAIR, INK, INK2, INK3 } from '#server/pdf/definition/colours'
import { shownDay, shownTime } from '#server/pdf/definition/shown-time'
import type { NotePdfData, PdfPerson } from '#server/pdf/note-pdf-data'
import { MARGINS, PAGE } from '#server/pdf/typeset'

export function cover(data: NotePdfData): Content[] {
  return [{ text: data.title, fontSize: 23, bold: true, outline: true }]
}
