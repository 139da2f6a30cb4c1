import { inflateSync } from 'node:zlib'

const PNG = Buffer.from([0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A])
/** Of 40 million pixels, the most an upload may have, at 16 bits in four channels. */
const MAX_BYTES = 330_000_000

/**
 * Unpacks a PNG once to see that it can be. The writer of the file unpacks on
 * another thread, and a fault there would end the process instead of the print.
 * @throws Error saying what is wrong
 */
export function checkPicture(bytes: Uint8Array): void {
  const picture = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  if (!picture.subarray(0, 8).equals(PNG)) return
  const parts: Buffer[] = []
  for (let at = 8; at + 12 <= picture.length;) {
    const length = picture.readUInt32BE(at)
    if (at + 12 + length > picture.length) throw new Error('it is cut off')
    if (picture.toString('latin1', at + 4, at + 8) === 'IDAT') parts.push(picture.subarray(at + 8, at + 8 + length))
    at += 12 + length
  }
  inflateSync(Buffer.concat(parts), { maxOutputLength: MAX_BYTES })
}
