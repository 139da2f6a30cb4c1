import { createHash } from 'node:crypto'
import type { PdfDocument } from '#server/pdf/open-pdf'

export interface Attachment { name: string, description: string, bytes: Buffer, modified: Date }

/** Puts a file into the document as the source it was made from (an associated file with the relationship Source). */
export function attachFile(document: PdfDocument, { name, description, bytes, modified }: Attachment): void {
  const text = (value: string) => new String(value)
  const params = { Size: bytes.length, ModDate: modified, CheckSum: createHash('md5').update(bytes).digest() }
  const file = document.ref({ Type: 'EmbeddedFile', Subtype: 'application#2Fjson', Params: params })
  file.end(bytes)
  const spec = document.ref({ Type: 'Filespec', F: text(name), UF: text(name), Desc: text(description), AFRelationship: 'Source', EF: { F: file, UF: file } })
  spec.end()
  document.addNamedEmbeddedFile(name, spec)
  document._root.data.AF = [...(document._root.data.AF as unknown[] | undefined ?? []), spec]
}
