import { cover } from '#server/pdf/definition/cover'
import { INK } from '#server/pdf/definition/colours'
import { footer, header } from '#server/pdf/definition/page-frame'
import { TEXT } from '#server/pdf/fonts'
import type { NotePdfData } from '#server/pdf/note-pdf-data'
import { MARGINS, PAGE, type NoteDefinition } from '#server/pdf/typeset'

/** Where the picture of the signature stands on the cover. */
export const SIGNATURE_PLACE = { x: MARGINS.left, y: 742, width: PAGE.measure, height: 30 }

export function noteDefinition(data: NotePdfData): NoteDefinition {
  const at = new Date(data.createdAt)
  return {
    content: [...cover(data)],
    header: header(data), footer: footer(data),
    styles: {}, defaultStyle: { font: TEXT, fontSize: 10.5, color: INK, lineHeight: 1.25 },
    images: {},
    info: {
      Title: `${data.number} issue ${data.letter}: ${data.title}`, Subject: 'Torsion substantiation note',
      Author: data.people.map(person => person.name).filter(Boolean).join(', '),
      Creator: 'Torquill', Producer: 'Torquill', CreationDate: at, ModDate: at,
    },
  }
}
