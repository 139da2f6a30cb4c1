import type { Release } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { sendJob } from '#server/jobs/queue'
import { signOnIssue } from '#server/notes/act-on-issue'
import { refuseMovedEngine } from '#server/notes/engine-check'
import { expectSeen } from '#server/notes/expect-seen'
import { addPart } from '#server/notes/parts'
import { prepareIssue } from '#server/notes/prepare-heavy'
import { sign } from '#server/notes/signatures'
import type { Standing } from '#server/notes/standing'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** Every deviation is accepted one by one, by its id. @throws DomainError something-remains */
function acceptDeviations({ actor, clock }: CommandContext, { answers }: Standing, accepted: string[]): void {
  const deviations = answers.filter(a => a.kind === 'deviation')
  const left = deviations.filter(d => !accepted.includes(d.id)).length
  if (left) throw new DomainError('something-remains', `${left === 1 ? 'One deviation is' : `${left} deviations are`} not accepted yet. Read and accept each, or return the issue.`)
  for (const deviation of deviations) Object.assign(deviation, { approvedBy: actor, approvedAt: clock() })
}

/** The approver signs the release. The issue is locked and a job is left for the worker, which makes the PDF and only then flips the state. */
export async function requestRelease(context: CommandContext, issueId: string, input: Release): Promise<void> {
  await prepareIssue(context.em, issueId)
  return signOnIssue(context, issueId, 'sign release', ['release'], input.password, async (inside, issue, name, standing) => {
    const { em, clock } = inside
    expectSeen(issue, input.expect)
    if (standing.content.hash !== issue.contentHash) throw new DomainError('stale', 'The content is not what the checker passed. Return the issue.')
    refuseMovedEngine(issue)
    acceptDeviations(inside, standing, input.acceptedDeviations)
    await addPart(inside, issue, 'approver')
    const signature = await sign(inside, issue, 'released', standing.content.hash)
    Object.assign(issue, { releaseRequestedAt: clock(), releaseFailure: null, lastChangeAt: clock() })
    await em.flush()
    await recordAct(inside, { ...name, new: { signature: signature.id, contentHash: standing.content.hash, deviations: input.acceptedDeviations } })
    await sendJob(em, 'release', { issueId: issue.id, signatureId: signature.id })
  })
}
