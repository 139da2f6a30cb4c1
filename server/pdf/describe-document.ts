import { createHash } from 'node:crypto'
import type { PdfDocument } from '#server/pdf/open-pdf'

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', '\'': '&apos;' }
const escapeXml = (text: string) => text.replace(/[&<>"']/g, sign => entities[sign] ?? sign)

/** Title, language and dates: the XMP twin of the information dictionary, which pdfkit writes without escaping. */
export function describeDocument(document: PdfDocument): void {
  const addInfo = document._addInfo
  document._addInfo = function () {
    const plain = this.info
    this.info = Object.fromEntries(Object.entries(plain).map(([key, value]) => [key, typeof value === 'string' ? escapeXml(value) : value]))
    addInfo.call(this)
    this.info = plain
    const changed = plain.ModDate instanceof Date ? plain.ModDate.toISOString().replace(/\.\d+Z$/, 'Z') : ''
    this.appendXML(`<rdf:Description rdf:about="" xmlns:xmp="http://ns.adobe.com/xap/1.0/"><xmp:ModifyDate>${changed}</xmp:ModifyDate></rdf:Description>`)
  }
}

/** The file's identifier, from what it contains: the same issue gives the same file up to the signature. */
export function identify(document: PdfDocument, content: string): void {
  document._id = createHash('sha256').update(content).digest().subarray(0, 16)
}
