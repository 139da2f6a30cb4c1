import type { Content, DynamicContent, Style, StyleDictionary } from 'pdfmake/interfaces'
import type { Equation } from '#server/pdf/equations'
import { fontFaces, TEXT } from '#server/pdf/fonts'
import { NoteRenderer } from '#server/pdf/note-renderer'
import type { PdfDocument, PdfFont } from '#server/pdf/open-pdf'
import { preparedText } from '#server/pdf/prepared-text'
import { LayoutBuilder, PdfmakeDocument, SvgMeasure, tableLayouts } from '#server/pdf/pdfmake-parts'

/** What pdfmake lays out, with every image under a name. */
export interface NoteDefinition {
  content: Content
  header: DynamicContent
  footer: DynamicContent
  styles: StyleDictionary
  defaultStyle: Style
  watermark?: { text: string, color: string, opacity: number, bold: boolean, angle: number, fontSize: number }
  /** Data addresses by name. */
  images: Record<string, string>
  info: Record<'Title' | 'Author' | 'Subject' | 'Creator' | 'Producer', string> & { CreationDate: Date, ModDate: Date }
}

const A4 = { width: 595.28, height: 841.89, orientation: 'portrait' }
/** As the pages of the design: 19 mm at the sides. */
export const MARGINS = { left: 53.86, top: 66, right: 53.86, bottom: 64 }
export const PAGE = { ...A4, measure: A4.width - MARGINS.left - MARGINS.right }

/** A family name that carries the measures of an equation: width, height and depth in points. */
const EQUATION_FONT = /^equation ([\d.]+) ([\d.]+) (-?[\d.]+)$/

/** The run that stands for an equation in a line of text. At size one, thousandths of the size are thousandths of a point. */
export function equationRun(equation: Equation): TextRun {
  const { width, height, depth } = equation
  return { text: '\u25A1', font: `equation ${width} ${height} ${depth}`, fontSize: 1, lineHeight: 1, characterSpacing: 0, equation }
}

/** Text of a definition, in pdfmake's words; an `equation` is drawn in its place. */
export interface TextRun { text: string, equation?: Equation, [style: string]: unknown }

/** The measures of an equation in the words of a font, so that the layout leaves it its room. */
function equationFont(width: number, height: number, depth: number): PdfFont {
  const never = () => { throw new Error('An equation in a line is drawn, not written.') }
  return {
    id: 'equation', font: { hasGlyphForCodePoint: () => true }, ref: never, encode: never, layoutRun: never,
    ascender: (height - depth) * 1000, descender: -depth * 1000,
    widthOfString: text => text === '' ? 0 : width,
    lineHeight: () => height - depth + Math.max(depth + 1.5, 3),
  }
}

const remembered = new WeakSet<PdfFont>()

/** pdfkit forgets the shapes of words that are set with font features; tables ask for them, over and over. */
function remembering(font: PdfFont): PdfFont {
  if (remembered.has(font)) return font
  remembered.add(font)
  const runs = new Map<string, unknown>()
  const layoutRun = font.layoutRun.bind(font)
  font.layoutRun = (text, features) => {
    const key = `${String(features)} ${text}`
    const run = runs.get(key) ?? layoutRun(text, features)
    runs.set(key, run)
    return run
  }
  return font
}

class NoteDocument extends PdfmakeDocument {
  override provideFont(family: string, bold: boolean, italics: boolean): PdfFont {
    const [, width, height, depth] = EQUATION_FONT.exec(family) ?? []
    return depth === undefined ? remembering(super.provideFont(family, bold, italics)) : equationFont(Number(width), Number(height), Number(depth))
  }
}

/**
 * Lays a definition out and draws its pages, leaving the document open. Where
 * pdfmake's own printer would fetch addresses and read files, this one knows
 * only its fonts and the images it is given.
 */
export async function typeset(definition: NoteDefinition): Promise<PdfDocument> {
  const document = new NoteDocument(fontFaces(), definition.images, {}, {}, {
    size: [A4.width, A4.height], pdfVersion: '1.7', subset: 'PDF/A-3b', lang: 'en', displayTitle: true,
    compress: true, bufferPages: true, autoFirstPage: false, font: null, info: definition.info,
  })
  for (const name of Object.keys(definition.images)) await embedImage(document, name)
  const builder = new LayoutBuilder(A4, MARGINS, new SvgMeasure())
  builder.registerTableLayouts(tableLayouts)
  const face = document.provideFont(TEXT, false, false).font
  const prepare = (content: Content | null | undefined) => preparedText(content, codePoint => face.hasGlyphForCodePoint(codePoint)) as Content
  const repeated = (part: DynamicContent): DynamicContent => (page, pages, size) => prepare(part(page, pages, size))
  const pages = builder.layoutDocument(
    prepare(definition.content), document, definition.styles, definition.defaultStyle, undefined,
    repeated(definition.header), repeated(definition.footer), definition.watermark,
  )
  new NoteRenderer(document).renderPages(pages)
  return document
}

/** A PNG with transparency is unpacked on another thread: waiting for each keeps the order of objects, and with it the bytes, the same. */
async function embedImage(document: PdfDocument, name: string): Promise<void> {
  const image = document.provideImage(name)
  if (!image.obj || image.obj.offset !== undefined || !image.finalize) return
  await new Promise<void>((resolve, reject) => {
    const finalize = image.finalize
    const patience = setTimeout(() => reject(new Error(`The picture ${name} cannot be unpacked.`)), 30_000)
    image.finalize = () => {
      clearTimeout(patience)
      finalize?.call(image)
      resolve()
    }
  })
}
