import type { EntityManager } from '@mikro-orm/postgresql'
import { noteChain, recordAct } from '#server/audit/record'
import { lockIssue } from '#server/notes/find-issue'
import { voidSignatures } from '#server/notes/signatures'

/** The release could not be made: the issue is unlocked, the signature void, the reason shown. */
export function failRelease(worker: { em: EntityManager, clock: () => Date }, input: { issueId: string, signatureId: string, reason: string }): Promise<void> {
  return worker.em.fork().transactional(async (em) => {
    const inside = { em, clock: worker.clock }
    const issue = await lockIssue(em, input.issueId)
    if (issue.state !== 'for approval' || !issue.releaseRequestedAt) return
    await voidSignatures(inside, issue, ['released'], `the release could not be made: ${input.reason}`)
    Object.assign(issue, { releaseRequestedAt: null, releaseFailure: input.reason, lastChangeAt: worker.clock() })
    await em.flush()
    await recordAct({ ...inside, actor: null }, {
      chain: noteChain(issue.note.id), act: 'fail release', subject: { type: 'issue', id: issue.id, label: `${issue.note.number} ${issue.letter}` }, outcome: 'refused', reason: input.reason,
    })
  })
}
