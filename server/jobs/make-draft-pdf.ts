import { createHash, randomUUID } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { findIssue } from '#server/notes/find-issue'
import { gatherPdfData } from '#server/notes/gather-pdf-data'
import { renderNotePdf } from '#server/pdf/render'
import { putFile } from '#server/storage/files'
import type { JobData } from './queue-names'

/** Prints an issue as it stands: unsigned, marked uncontrolled on every page. Answers with the id of the file. */
export async function makeDraftPdf({ em, clock }: { em: EntityManager, clock: () => Date }, { issueId, personId }: JobData['draft-pdf']): Promise<{ fileId: string }> {
  const issue = await findIssue(em, issueId)
  const pdf = await renderNotePdf(await gatherPdfData(em, issue, { at: clock() }))
  const fileId = randomUUID()
  const storageKey = `drafts/${issueId}/${fileId}.pdf`
  await putFile(storageKey, pdf)
  em.create(StoredFileSchema, {
    id: fileId, issue, purpose: 'draft-pdf', name: `${issue.note.number} ${issue.letter} save ${issue.saveNumber} uncontrolled.pdf`, mime: 'application/pdf',
    size: pdf.length, sha256: createHash('sha256').update(pdf).digest('hex'), storageKey, uploadedBy: personId, at: clock(),
  })
  await em.flush()
  return { fileId }
}
