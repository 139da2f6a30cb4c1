import { createHash, verify as verifyValue, X509Certificate } from 'node:crypto'
import { bytesToSign, encodeCms, readCms } from '#server/pdf/signing/cms'
import { readNoteData, type AttachedNote } from '#server/pdf/signing/attached-note'
import { dictionaries, dictionary, readPdfFile, resolve, unreached, type Dictionary, type PdfFile } from '#server/pdf/signing/pdf-file'
import { NotOurs, type PdfValue } from '#server/pdf/signing/pdf-values'
import { CMS_ROOM } from '#server/pdf/signing/signature-field'

export type Verdict
  = | { valid: true, signer: string, fingerprint: string, claimedAt: string, note: AttachedNote }
    | { valid: false, reason: string }

/** Names that have no business in a released note: anything that acts, hides or arrives later. */
const FORBIDDEN = ['JavaScript', 'JS', 'OpenAction', 'AA', 'Launch', 'Encrypt', 'OCProperties', 'OCG', 'ObjStm', 'XFA', 'RichMedia', 'Movie', 'Sound', 'GoToR', 'GoToE', 'SubmitForm', 'ImportData']
const MAX_BYTES = 50 * 1024 * 1024

/**
 * Verifies a released note against the root of the authority that signed it.
 * It accepts only files as this program writes them: one revision, one
 * signature over every byte but the signature's own, and a signature object
 * that can be made again, byte for byte, from its certificate and value.
 * @param pinnedRoot PEM or DER
 * @param at when the certificates must be in force
 */
export function verifyNotePdf(pdf: Buffer, pinnedRoot: string | Buffer, at = new Date()): Verdict {
  try {
    if (pdf.length > MAX_BYTES) throw new NotOurs('the file is larger than 50 MB')
    return check(pdf, new X509Certificate(pinnedRoot), at)
  } catch (fault) {
    return { valid: false, reason: fault instanceof NotOurs ? `Not a file as it was signed: ${fault.message}.` : `The signature cannot be read: ${fault instanceof Error ? fault.message : 'unknown fault'}.` }
  }
}

function check(pdf: Buffer, root: X509Certificate, at: Date): Verdict {
  const file = readPdfFile(pdf)
  const signature = theOnlySignature(file)
  const gap = signedRange(pdf, signature)
  const digest = createHash('sha256').update(pdf.subarray(0, gap.start)).update(pdf.subarray(gap.end)).digest()
  const hex = pdf.toString('latin1', gap.start + 1, gap.end - 1)
  const cms = Buffer.from(hex, 'hex')
  const length = derLength(cms)
  if (cms.subarray(length).some(byte => byte !== 0)) throw new NotOurs('bytes are hidden behind the signature')
  const { certificate, signature: value } = readCms(Buffer.from(cms.subarray(0, length)), root.raw)
  const parts = { digest, certificate, root: root.raw }
  if (!encodeCms(parts, value).equals(cms.subarray(0, length))) {
    throw new NotOurs('the signed bytes were altered, or the signature object is not as it was made')
  }
  const signer = new X509Certificate(certificate)
  checkChain(signer, root, at)
  if (!verifyValue('sha256', bytesToSign(parts), { key: signer.publicKey, dsaEncoding: 'der' }, value)) throw new NotOurs('the signature value does not fit')
  return {
    valid: true, note: readNoteData(pdf, file), fingerprint: signer.fingerprint256,
    signer: `${textOf(signature.get('Name'))}`, claimedAt: claimedTime(textOf(signature.get('M'))),
  }
}

/** One signature in the whole file, reached from the form, certifying the document with no change permitted. */
function theOnlySignature(file: PdfFile): Dictionary {
  const all = [...dictionaries(file), file.trailer]
  const bad = all.flatMap(entries => [...entries]).find(([key, value]) => FORBIDDEN.includes(key) || (value.kind === 'name' && FORBIDDEN.includes(value.value)))
  if (bad) throw new NotOurs(`${bad[0]} has no place in a released note`)
  if (unreached(file).length > 0) throw new NotOurs('the file holds objects that nothing shows')
  if (all.filter(entries => nameOf(entries.get('Type')) === 'Sig').length !== 1) throw new NotOurs('there is not exactly one signature')
  if (all.filter(entries => nameOf(entries.get('FT')) !== null).length !== 1) throw new NotOurs('there is not exactly one form field')
  const root = dictionary(resolve(file, file.trailer.get('Root')))
  const fields = dictionary(resolve(file, root.get('AcroForm'))).get('Fields')
  if (fields?.kind !== 'array' || fields.items.length !== 1) throw new NotOurs('the form does not hold exactly one field')
  const field = dictionary(resolve(file, fields.items[0]))
  const reference = field.get('V')
  const certified = dictionary(resolve(file, root.get('Perms'))).get('DocMDP')
  if (reference?.kind !== 'ref' || certified?.kind !== 'ref' || certified.id !== reference.id) throw new NotOurs('the signature does not certify the document')
  const signature = dictionary(resolve(file, reference))
  if (nameOf(signature.get('SubFilter')) !== 'ETSI.CAdES.detached') throw new NotOurs('the signature is of another kind')
  checkPermission(signature)
  return signature
}

function checkPermission(signature: Dictionary): void {
  const references = signature.get('Reference')
  const only = references?.kind === 'array' && references.items.length === 1 ? dictionary(references.items[0]) : new Map()
  const permission = only.size > 0 ? dictionary(only.get('TransformParams')).get('P') : undefined
  if (nameOf(only.get('TransformMethod')) !== 'DocMDP' || permission?.kind !== 'number' || permission.value !== 1) throw new NotOurs('changes would be permitted')
}

/** The signed range is the whole file but the hexadecimal string of the signature itself. */
function signedRange(pdf: Buffer, signature: Dictionary): { start: number, end: number } {
  const [contents, range] = [signature.get('Contents'), signature.get('ByteRange')]
  if (contents?.kind !== 'hex' || contents.end - contents.start !== CMS_ROOM * 2 + 2) throw new NotOurs('the signature is missing')
  const said = range?.kind === 'array' ? range.items.map(item => item.kind === 'number' ? item.value : -1) : []
  const true_ = [0, contents.start, contents.end, pdf.length - contents.end]
  if (said.length !== 4 || said.some((number, index) => number !== true_[index])) throw new NotOurs('the signature does not cover the whole file')
  return contents
}

/** The length of a DER value of the long form `30 82 hh ll`. */
function derLength(bytes: Buffer): number {
  if (bytes.readUInt16BE(0) !== 0x3082) throw new NotOurs('the signature is empty or malformed')
  const length = 4 + bytes.readUInt16BE(2)
  if (length > bytes.length) throw new NotOurs('the signature is cut off')
  return length
}

function checkChain(signer: X509Certificate, root: X509Certificate, at: Date): void {
  if (signer.ca || !signer.checkIssued(root) || !signer.verify(root.publicKey)) throw new NotOurs('the certificate was not issued by the pinned authority')
  const outside = [signer, root].some(one => at < new Date(one.validFrom) || at > new Date(one.validTo))
  if (outside) throw new NotOurs('the certificate is not in force; compare the file\'s hash with the record of the release')
}

const nameOf = (value: PdfValue | undefined): string | null => value?.kind === 'name' ? value.value : null
const textOf = (value: PdfValue | undefined): string => value?.kind === 'text' ? value.value : ''

/** `D:20261201091200Z` as ISO 8601; it is what the signer claims, not a stamp. */
function claimedTime(text: string): string {
  const parts = /^D:(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d)Z$/.exec(text)
  if (!parts) throw new NotOurs('the claimed time is missing')
  return `${parts[1]}-${parts[2]}-${parts[3]}T${parts[4]}:${parts[5]}:${parts[6]}Z`
}
