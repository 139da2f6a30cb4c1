/**
 * The parts of pdfmake that `typeset.ts` drives itself. They have no types of
 * their own; only what is used is described here, for the pinned version.
 */
declare module 'pdfmake/js/PDFDocument.js' {
  import type { PdfDocument } from '#server/pdf/open-pdf'

  const module: { default: new (fonts: object, images: object, patterns: object, attachments: object, options: object) => PdfDocument }
  export default module
}

declare module 'pdfmake/js/LayoutBuilder.js' {
  import type { Content, DynamicContent, StyleDictionary, Style } from 'pdfmake/interfaces'

  interface LaidOutPage { items: { type: string, item: object }[], pageSize: { width: number, height: number } }
  class LayoutBuilder {
    constructor(pageSize: object, pageMargins: object, svgMeasure: object)
    registerTableLayouts(layouts: object): void
    layoutDocument(content: Content, document: object, styles: StyleDictionary, defaultStyle: Style, background: undefined, header: DynamicContent, footer: DynamicContent, watermark: object | undefined): LaidOutPage[]
  }
  const module: { default: typeof LayoutBuilder }
  export default module
}

declare module 'pdfmake/js/SVGMeasure.js' {
  const module: { default: new () => object }
  export default module
}

declare module 'pdfmake/js/Renderer.js' {
  import type { Line } from '#server/pdf/note-renderer'
  import type { PdfDocument } from '#server/pdf/open-pdf'

  class Renderer {
    constructor(document: PdfDocument)
    pdfDocument: PdfDocument
    renderPages(pages: object[]): void
    renderLine(line: Line, x: number, y: number): void
    renderSVG(svg: { svg: string, x: number, y: number, _width: number, _height: number, font?: string }): void
  }
  const module: { default: typeof Renderer }
  export default module
}

declare module 'pdfmake/js/tableLayouts.js' {
  export const tableLayouts: object
}
