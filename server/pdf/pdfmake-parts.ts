/**
 * The parts of pdfmake that `typeset.ts` drives itself, with types for what is
 * used of them in the pinned version. They are required rather than imported:
 * a bundler, Node.js and the tests differ in what the default export of such a
 * module is, and here it must be the same for all.
 */
import { createRequire } from 'node:module'
import type { Content, DynamicContent, Style, StyleDictionary } from 'pdfmake/interfaces'
import type { PdfDocument } from '#server/pdf/open-pdf'
import type { Line } from '#server/pdf/note-renderer'

const require = createRequire(import.meta.url)
const part = <T>(name: string): T => (require(`pdfmake/js/${name}.js`) as { default: T }).default

interface LaidOutPage { items: { type: string, item: object }[], pageSize: { width: number, height: number } }

interface Builder {
  registerTableLayouts: (layouts: object) => void
  layoutDocument: (
    content: Content, document: object, styles: StyleDictionary, defaultStyle: Style, background: undefined,
    header: DynamicContent, footer: DynamicContent, watermark: object | undefined,
  ) => LaidOutPage[]
}

interface PageRenderer {
  pdfDocument: PdfDocument
  renderPages(pages: object[]): void
  renderLine(line: Line, x: number, y: number): void
  renderSVG(svg: { svg: string, x: number, y: number, _width: number, _height: number, font?: string }): void
}

export const PdfmakeDocument = part<new (fonts: object, images: object, patterns: object, attachments: object, options: object) => PdfDocument>('PDFDocument')
export const LayoutBuilder = part<new (pageSize: object, pageMargins: object, svgMeasure: object) => Builder>('LayoutBuilder')
export const SvgMeasure = part<new () => object>('SVGMeasure')
export const Renderer = part<new (document: PdfDocument) => PageRenderer>('Renderer')
export const { tableLayouts } = require('pdfmake/js/tableLayouts.js') as { tableLayouts: object }
