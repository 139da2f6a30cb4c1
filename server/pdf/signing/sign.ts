import { createHash } from 'node:crypto'
import { signDigest } from '#server/pdf/signing/cms'
import type { Signer } from '#server/pdf/signing/local-authority'
import { CMS_ROOM } from '#server/pdf/signing/signature-field'

/** Where the signature stands: `start` is the `<` of its hexadecimal string, `end` the byte after the `>`. */
interface Gap { start: number, end: number }

const CONTENTS = '/Contents <'
const BYTE_RANGE = /\/ByteRange \[0 \d{10} \d{10} \d{10}\]/

/**
 * Fills the room that was left for the signature.
 * @param pdf a whole file with one unsigned signature object
 * @param offset where that object begins: it is looked for nowhere else
 */
export function signPdf(pdf: Buffer, offset: number, signer: Signer): Buffer {
  const signed = Buffer.from(pdf)
  const gap = findGap(signed, offset)
  writeByteRange(signed, offset, gap)
  const digest = createHash('sha256').update(signed.subarray(0, gap.start)).update(signed.subarray(gap.end)).digest()
  const cms = signDigest({ digest, certificate: signer.certificate, root: signer.root }, signer.key)
  if (cms.length > CMS_ROOM) throw new Error(`The signature takes ${cms.length} bytes and ${CMS_ROOM} were kept for it.`)
  signed.write(cms.toString('hex'), gap.start + 1, 'latin1')
  return signed
}

function findGap(pdf: Buffer, offset: number): Gap {
  const start = pdf.indexOf(CONTENTS, offset, 'latin1') + CONTENTS.length - 1
  const end = start + CMS_ROOM * 2 + 2
  if (start < offset || pdf[end - 1] !== 0x3E) throw new Error('The file has no room for a signature.')
  return { start, end }
}

function writeByteRange(pdf: Buffer, offset: number, gap: Gap): void {
  const found = BYTE_RANGE.exec(pdf.toString('latin1', offset, gap.start))
  if (!found) throw new Error('The file does not name the range of its signature.')
  const numbers = `/ByteRange [0 ${gap.start} ${gap.end} ${pdf.length - gap.end}`
  pdf.write(`${numbers.padEnd(found[0].length - 1)}]`, offset + found.index, 'latin1')
}
