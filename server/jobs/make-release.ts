import { createHash, randomUUID } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { completeRelease } from '#server/commands/complete-release'
import { failRelease } from '#server/commands/fail-release'
import { SignatureSchema } from '#server/database/entities/signature'
import { findIssue } from '#server/notes/find-issue'
import { gatherPdfData } from '#server/notes/gather-pdf-data'
import { renderNotePdf } from '#server/pdf/render'
import type { Signer } from '#server/pdf/signing/local-authority'
import { verifyNotePdf } from '#server/pdf/signing/verify'
import { putFile } from '#server/storage/files'
import { DomainError } from '#server/utils/domain-error'
import type { JobData } from './queue-names'

interface WorkerContext { em: EntityManager, clock: () => Date, signer: Signer }

/**
 * Makes a release: render, sign, store, then one transaction that flips the
 * state. Run twice or broken off anywhere, it leaves one PDF and one set of
 * messages: the state is flipped once, and only the PDF of that commit is
 * known to anybody.
 */
export async function makeRelease({ em, clock, signer }: WorkerContext, { issueId, signatureId }: JobData['release'], { last }: { last: boolean }): Promise<void> {
  try {
    const issue = await findIssue(em, issueId)
    const signature = await em.findOne(SignatureSchema, { id: signatureId, issue, voidedAt: null })
    if (!signature || issue.state !== 'for approval' || !issue.releaseRequestedAt) return
    const data = await gatherPdfData(em, issue, { at: signature.at, releasedAt: signature.at })
    const pdf = await renderNotePdf(data, { signer })
    const verdict = verifyNotePdf(pdf, signer.root)
    if (!verdict.valid) throw new Error(`The signed PDF does not verify: ${verdict.reason}`)
    const fileId = randomUUID()
    const storageKey = `released/${issueId}/${fileId}.pdf`
    await putFile(storageKey, pdf)
    await completeRelease({ em: em.fork(), clock }, {
      issueId, signatureId,
      pdf: { fileId, storageKey, name: `${issue.note.number} ${issue.letter}.pdf`, size: pdf.length, sha256: createHash('sha256').update(pdf).digest('hex') },
    })
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    console.error('release', issueId, error)
    if (!last && !(error instanceof DomainError)) throw error
    await failRelease({ em: em.fork(), clock }, { issueId, signatureId, reason })
  }
}
