import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { renderNotePdf } from '#server/pdf/render'
import { loadSigner, readRoot } from '#server/pdf/signing/local-authority'
import { samplePdfData } from '../../../factories/note-pdf-data'

/** A released sample in a folder of its own, with the authority that signed it. */
export async function signedSample(data = samplePdfData()) {
  const folder = mkdtempSync(join(tmpdir(), 'torquill-pdf-'))
  const authority = join(folder, 'authority')
  const signer = await loadSigner(authority)
  const pdf = await renderNotePdf(data, { signer })
  return { folder, authority, signer, data, pdf, root: await readRoot(authority) }
}
export type SignedSample = Awaited<ReturnType<typeof signedSample>>

/** The CMS object of a signed file, and the bytes it is made over. */
export function splitSignature(pdf: Buffer): { cms: Buffer, signed: Buffer } {
  const start = pdf.indexOf('/Contents <3082', 0, 'latin1') + '/Contents '.length
  const end = pdf.indexOf('>', start) + 1
  const bytes = Buffer.from(pdf.toString('latin1', start + 1, end - 1), 'hex')
  return { cms: bytes.subarray(0, 4 + bytes.readUInt16BE(2)), signed: Buffer.concat([pdf.subarray(0, start), pdf.subarray(end)]) }
}
