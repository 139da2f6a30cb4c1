import { TEXT } from '#server/pdf/fonts'
import type { PdfDocument, PdfFont, PdfRef } from '#server/pdf/open-pdf'

/** Bytes kept for the CMS object; the rest is filled with zeros. */
export const CMS_ROOM = 4096
/** Ten digits each, so that the true numbers fit in the same place. */
const UNKNOWN = 9_999_999_999

export interface SignatureWords {
  signer: string
  reason: string
  at: Date
  /** The lines of its picture on the cover. */
  lines: string[]
  /** In points from the top left corner of the first page. */
  place: { x: number, y: number, width: number, height: number }
}

const text = (value: string) => new String(value)

/** The only signature of the file: it certifies the document, and no change is permitted after it (DocMDP, P = 1). */
export function addSignatureField(document: PdfDocument, words: SignatureWords): PdfRef {
  const signature = document.ref({
    Type: 'Sig', Filter: 'Adobe.PPKLite', SubFilter: 'ETSI.CAdES.detached',
    ByteRange: [0, UNKNOWN, UNKNOWN, UNKNOWN], Contents: Buffer.alloc(CMS_ROOM),
    Name: text(words.signer), Reason: text(words.reason), M: words.at,
    Reference: [{ Type: 'SigRef', TransformMethod: 'DocMDP', TransformParams: { Type: 'TransformParams', P: 1, V: '1.2' } }],
  })
  signature.end()
  const page = document.switchToPage(0)
  const { x, y, width, height } = words.place
  const widget = document.ref({
    // F 132: printed, and locked in its place.
    Type: 'Annot', Subtype: 'Widget', FT: 'Sig', T: text('Release'), F: 132, V: signature, P: page.dictionary,
    Rect: [x, page.height - y - height, x + width, page.height - y], AP: { N: appearance(document, words) },
  })
  widget.end()
  page.annotations.push(widget)
  const form = document.ref({ Fields: [widget], SigFlags: 3 })
  form.end()
  const root = document._root.data
  root.AcroForm = form
  root.Perms = { DocMDP: signature }
  root.Extensions = { ESIC: { BaseVersion: '1.7', ExtensionLevel: 2 } }
  // pdfkit would close a form of its own here.
  document.endAcroForm = () => {}
  return signature
}

/** What is seen of the signature: lines of text between two rules, in the document's own face. */
function appearance(document: PdfDocument, { lines, place: { width, height } }: SignatureWords): PdfRef {
  const regular = document.provideFont(TEXT, false, false)
  const bold = document.provideFont(TEXT, true, false)
  const fonts = { [regular.id]: regular.ref(), [bold.id]: bold.ref() }
  const form = document.ref({ Type: 'XObject', Subtype: 'Form', BBox: [0, 0, width, height], Resources: { Font: fonts } })
  const leading = 11.5
  const show = (line: string, index: number) => {
    const font: PdfFont = index === 0 ? bold : regular
    return `BT /${font.id} ${index === 0 ? 9 : 8} Tf 0 ${(height - 11 - index * leading).toFixed(2)} Td <${font.encode(line)[0].join('')}> Tj ET`
  }
  form.end(`0.110 0.153 0.200 rg\n${lines.map(show).join('\n')}\n`)
  return form
}
