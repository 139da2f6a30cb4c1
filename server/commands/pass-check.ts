import type { Pass } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { deviationsIn, shownMargin } from '#server/mail/issue-mails'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { signOnIssue } from '#server/notes/act-on-issue'
import { refuseMovedEngine } from '#server/notes/engine-check'
import { expectSeen } from '#server/notes/expect-seen'
import { moveIssue } from '#server/notes/move-issue'
import { addPart } from '#server/notes/parts'
import { prepareIssue } from '#server/notes/prepare-heavy'
import { sign } from '#server/notes/signatures'
import type { CommandContext } from '#server/utils/command-context'

/** The checker signs that every step was followed; the content hash is fixed here. */
export async function passCheck(context: CommandContext, issueId: string, input: Pass): Promise<void> {
  await prepareIssue(context.em, issueId)
  return signOnIssue(context, issueId, 'pass', ['pass'], input.password, async (inside, issue, name, standing) => {
    const { em, actor, clock } = inside
    expectSeen(issue, input.expect)
    refuseMovedEngine(issue)
    await addPart(inside, issue, 'checker')
    const { hash } = standing.content
    await sign(inside, issue, 'passed', hash)
    const { from, to } = moveIssue(issue, 'pass', clock())
    issue.contentHash = hash
    await em.flush()
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to, save: issue.saveNumber, contentHash: hash } })
    if (!issue.approver) return
    await queueMail(inside, {
      template: 'passed', to: issue.approver, event: `pass:${issue.id}:${clock().toISOString()}`,
      props: { ...issueMailProps(issue), checker: actor.name, analyst: issue.analyst?.name ?? '', leastMargin: shownMargin(issue), cautions: issue.cautions, deviations: deviationsIn(standing) },
    })
  })
}
