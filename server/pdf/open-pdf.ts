/** A pdfkit document that is laid out and not yet closed: objects can still be added, and it becomes one revision. */

/** A PDF object being written: `data` is its dictionary, `offset` its place in the file once it has ended. */
export interface PdfRef {
  readonly id: number
  data: Record<string, unknown>
  offset?: number
  compress: boolean
  end: (chunk?: Buffer | string) => void
}

export interface PdfFont {
  id: string
  /** In thousandths of the font size. */
  ascender: number
  descender: number
  font: { hasGlyphForCodePoint: (codePoint: number) => boolean }
  ref: () => PdfRef
  encode: (text: string) => [string[], unknown[]]
  layoutRun: (text: string, features?: unknown) => unknown
  widthOfString: (text: string, size: number, features?: unknown) => number
  lineHeight: (size: number, includeGap?: boolean) => number
}

export interface PdfPage { dictionary: PdfRef, annotations: PdfRef[], xobjects: Record<string, PdfRef>, height: number, width: number }

export interface PdfImage { width: number, height: number, obj: PdfRef | null, finalize?: () => void }

export interface PdfDocument extends NodeJS.ReadableStream {
  page: PdfPage
  info: Record<string, string | Date>
  images: Record<string, string>
  _id: Buffer
  _root: PdfRef
  _addInfo: () => void
  appendXML: (xml: string) => void
  endAcroForm: () => void
  ref: (data?: Record<string, unknown>) => PdfRef
  addContent: (operators: string) => void
  switchToPage: (index: number) => PdfPage
  provideFont(family: string, bold: boolean, italics: boolean): PdfFont
  provideImage: (name: string) => PdfImage
  addNamedEmbeddedFile: (name: string, filespec: PdfRef) => void
  markContent: (tag: string, options: Record<string, unknown>) => void
  endMarkedContent: () => void
  end: () => void
}
