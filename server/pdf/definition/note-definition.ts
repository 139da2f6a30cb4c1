import type { Content } from 'pdfmake/interfaces'
import { sectionAnchor } from '#server/pdf/definition/anchors'
import { INK, INK2, STOP } from '#server/pdf/definition/colours'
import { contents } from '#server/pdf/definition/contents'
import { cover, SIGNATURE_PLACE } from '#server/pdf/definition/cover'
import { generatedSection } from '#server/pdf/definition/generated-sections'
import { HANG, sectionHeading } from '#server/pdf/definition/headings'
import { headed } from '#server/pdf/definition/keep-together'
import { noteContext, type NoteContext } from '#server/pdf/definition/note-context'
import { footer, header, UNCONTROLLED } from '#server/pdf/definition/page-frame'
import { sectionBlocks } from '#server/pdf/definition/text-blocks'
import { checkPicture } from '#server/pdf/check-picture'
import { TEXT } from '#server/pdf/fonts'
import type { NotePdfData } from '#server/pdf/note-pdf-data'
import type { NoteDefinition } from '#server/pdf/typeset'
import type { NoteSection } from '#shared/note/sections'

export { SIGNATURE_PLACE }

/** Sections that begin a page of their own. */
const NEW_PAGE = new Set(['revisions', 'appendices'])

/** An issue as pages: pure, the same data gives the same definition. */
export function noteDefinition(data: NotePdfData): NoteDefinition {
  const context = noteContext(data)
  const at = new Date(data.createdAt)
  return {
    content: [...cover(context), ...contents(context), ...context.sections.filter(section => section.key !== 'cover').flatMap(section => sectionContent(section, context))],
    header: header(data), footer: footer(data),
    styles: {}, defaultStyle: { font: TEXT, fontSize: 10.5, color: INK, lineHeight: 1.25 },
    ...(data.uncontrolled ? { watermark: { text: UNCONTROLLED.toUpperCase(), color: STOP, opacity: 0.07, bold: true, angle: -52, fontSize: 54 } } : {}),
    images: pictures(context),
    info: {
      Title: `${data.number} issue ${data.letter}: ${data.title}`, Subject: 'Torsion substantiation note',
      Author: data.people.flatMap(person => person.name ?? []).join(', '),
      Creator: 'Torquill', Producer: 'Torquill', CreationDate: at, ModDate: at,
    },
  }
}

/** The pictures that the text shows, each readable. */
function pictures({ data, doc }: NoteContext): Record<string, string> {
  const shown: Record<string, string> = {}
  doc.descendants((node) => {
    const { fileId, caption } = node.attrs as { fileId: string, caption: string }
    const figure = node.type.name === 'figure' ? data.figures[fileId] : undefined
    if (!figure) return !node.isTextblock
    try {
      checkPicture(figure.bytes)
    } catch (fault) {
      throw new Error(`The picture of the figure “${caption}” cannot be read (${fault instanceof Error ? fault.message : 'unknown fault'}). Save it again as PNG or JPEG and put that in its place.`)
    }
    shown[fileId] = `data:${figure.mime};base64,${Buffer.from(figure.bytes).toString('base64')}`
    return false
  })
  return shown
}

function sectionContent(section: NoteSection, context: NoteContext): Content[] {
  const heading = sectionHeading(section.number, section.title, sectionAnchor(section.key), { newPage: NEW_PAGE.has(section.key) })
  const [first, ...rest] = sectionBody(section, context)
  if (!first) return [heading]
  // A forced page inside a block that is kept whole would be lost.
  return [NEW_PAGE.has(section.key) ? { stack: [heading, first] } : headed(heading, first), ...rest]
}

function sectionBody(section: NoteSection, context: NoteContext): Content[] {
  const aside = (text: string): Content[] => [{ text, italics: true, color: INK2, margin: [HANG, 0, 24, 6] }]
  if (section.generated) return generatedSection(section.key, context)
  if (section.notApplicable !== null) return aside(`Not applicable because ${section.notApplicable}`)
  if (section.empty) return aside('Nothing is written here yet.')
  return sectionBlocks(section.node, context)
}
