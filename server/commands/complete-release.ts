import type { EntityManager } from '@mikro-orm/postgresql'
import { whyNotApprover } from '#shared/review/eligibility'
import { noteChain, recordAct } from '#server/audit/record'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import { SignatureSchema, type Signature } from '#server/database/entities/signature'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { concerned, shownMargin } from '#server/mail/issue-mails'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { candidateOf } from '#server/notes/candidates'
import { lockIssue } from '#server/notes/find-issue'
import { loadStanding, type Standing } from '#server/notes/standing'
import { moveIssue } from '#server/notes/move-issue'
import { DomainError } from '#server/utils/domain-error'

export interface MadePdf { fileId: string, storageKey: string, name: string, size: number, sha256: string }
interface Making { issueId: string, signatureId: string, pdf: MadePdf }
type Worker = { em: EntityManager, clock: () => Date }

/** What was true when the approver signed must be true now. */
async function recheck(em: EntityManager, standing: Standing, signature: Signature): Promise<void> {
  const { issue, content } = standing
  if (content.hash !== issue.contentHash || content.hash !== signature.contentHash) throw new DomainError('stale', 'The content is not what was passed and signed.')
  const roles = (await em.find(ProjectMemberSchema, { project: issue.note.project.id, person: signature.person.id })).map(m => m.role)
  const why = whyNotApprover(candidateOf(standing, signature.person, roles), issue.letter)
  if (why) throw new DomainError('not-eligible', why)
}

/** The issue that was in force steps back, before this one takes its place: one released issue per note. */
async function supersede(worker: Worker, issue: Issue, by: Signature): Promise<Issue | null> {
  const { em } = worker
  const earlier = await em.findOne(IssueSchema, { note: issue.note.id, state: 'released' }, { populate: ['analyst', 'checker', 'approver', 'note', 'note.project'] })
  if (!earlier) return null
  const { from, to } = moveIssue(earlier, 'supersede', worker.clock())
  await em.flush()
  await recordAct({ ...worker, actor: by.person }, {
    chain: noteChain(issue.note.id), act: 'supersede', subject: { type: 'issue', id: earlier.id, label: `${issue.note.number} ${earlier.letter}` },
    old: { state: from }, new: { state: to, by: issue.letter },
  })
  return earlier
}

async function writeMails(worker: Worker, standing: Standing, signature: Signature, earlier: Issue | null): Promise<void> {
  const { issue } = standing
  const approver = signature.person.name
  const releasedOn = signature.at.toISOString().slice(0, 10)
  const least = issue.leastMargin ?? null
  for (const to of concerned(standing, signature.person)) {
    await queueMail(worker, {
      template: 'released', to, event: `release:${issue.id}`,
      props: { ...issueMailProps(issue), approver, releasedOn, leastMargin: shownMargin(issue), adequate: least === null || least >= 0, supersedes: earlier?.letter ?? null, contentHash: issue.contentHash ?? '' },
    })
  }
  if (!earlier) return
  const before = await loadStanding(worker.em, earlier)
  for (const to of concerned(before, signature.person)) {
    await queueMail(worker, { template: 'superseded', to, event: `supersede:${earlier.id}`, props: { ...issueMailProps(earlier), byLetter: issue.letter, approver, changeNote: issue.changeNote } })
  }
}

/** The one transaction of a release: recheck, flip the state, supersede the earlier issue, trail, mail. Run again, it changes nothing. */
export function completeRelease(worker: Worker, { issueId, signatureId, pdf }: Making): Promise<'released' | 'already released'> {
  return worker.em.fork().transactional(async (em) => {
    const inside = { em, clock: worker.clock }
    const issue = await lockIssue(em, issueId)
    if (issue.state === 'released') return 'already released'
    const signature = await em.findOne(SignatureSchema, { id: signatureId, issue, voidedAt: null }, { populate: ['person'] })
    if (!signature || issue.state !== 'for approval' || !issue.releaseRequestedAt) throw new DomainError('wrong-state', 'The release was taken back before it was made.')
    const standing = await loadStanding(em, issue)
    await recheck(em, standing, signature)
    const earlier = await supersede(inside, issue, signature)
    em.create(StoredFileSchema, { id: pdf.fileId, issue, purpose: 'released-pdf', name: pdf.name, mime: 'application/pdf', size: pdf.size, sha256: pdf.sha256, storageKey: pdf.storageKey, uploadedBy: signature.person, at: worker.clock() })
    const { from, to } = moveIssue(issue, 'complete-release', worker.clock())
    Object.assign(issue, { releasedAt: signature.at, pdfFileId: pdf.fileId, releaseFailure: null })
    await em.flush()
    await recordAct({ ...inside, actor: signature.person }, {
      chain: noteChain(issue.note.id), act: 'release', subject: { type: 'issue', id: issue.id, label: `${issue.note.number} ${issue.letter}` },
      old: { state: from }, new: { state: to, contentHash: issue.contentHash, pdf: pdf.sha256, save: issue.saveNumber },
    })
    await writeMails(inside, standing, signature, earlier)
    return 'released'
  })
}
