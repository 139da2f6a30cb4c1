import { attachFile } from '#server/pdf/attach-file'
import { noteDefinition, SIGNATURE_PLACE } from '#server/pdf/definition/note-definition'
import { shownDay, shownTime } from '#server/pdf/definition/shown-time'
import { describeDocument, identify } from '#server/pdf/describe-document'
import { noteAttachments, noteJson } from '#server/pdf/note-attachments'
import type { NotePdfData } from '#server/pdf/note-pdf-data'
import type { PdfDocument } from '#server/pdf/open-pdf'
import type { Signer } from '#server/pdf/signing/local-authority'
import { addSignatureField } from '#server/pdf/signing/signature-field'
import { signPdf } from '#server/pdf/signing/sign'
import { typeset } from '#server/pdf/typeset'

/**
 * Prints an issue: one file, one revision. With a signer it is certified in
 * the shape of PAdES B-B; without one it is left unsigned. The bytes before
 * the signature depend on the data alone.
 * @throws Error naming what cannot be printed, for instance a picture or an equation
 */
export async function renderNotePdf(data: NotePdfData, options: { signer?: Signer } = {}): Promise<Buffer> {
  if (data.uncontrolled && options.signer) throw new Error('An uncontrolled print is not signed.')
  const document = await typeset(noteDefinition(data))
  describeDocument(document)
  identify(document, noteJson(data))
  for (const attachment of noteAttachments(data)) attachFile(document, attachment)
  const signature = options.signer && addSignatureField(document, signatureWords(data, options.signer))
  const pdf = await close(document)
  if (!options.signer || signature?.offset === undefined) return pdf
  return signPdf(pdf, signature.offset, options.signer)
}

function signatureWords(data: NotePdfData, signer: Signer) {
  const approver = data.people.find(person => person.role === 'Approver')
  return {
    signer: signer.name, at: new Date(data.createdAt), place: SIGNATURE_PLACE,
    reason: `${data.number} issue ${data.letter} released by ${approver?.name ?? 'its approver'}, content ${data.contentHash ?? 'not hashed'}`,
    lines: [
      `Certified electronically: ${data.number} issue ${data.letter}, ${shownTime(data.createdAt)}`,
      `By ${signer.name}, on the release by ${approver?.name ?? 'the approver'} of ${shownDay(approver?.at ?? data.createdAt)}. No change is permitted.`,
    ],
  }
}

async function close(document: PdfDocument): Promise<Buffer> {
  const chunks: Buffer[] = []
  document.on('data', (chunk: Buffer) => chunks.push(chunk))
  const ended = new Promise((resolve, reject) => document.once('end', resolve).once('error', reject))
  document.end()
  await ended
  return Buffer.concat(chunks)
}
