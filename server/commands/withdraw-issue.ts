import type { Withdraw } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { concerned } from '#server/mail/issue-mails'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { signOnIssue } from '#server/notes/act-on-issue'
import { expectSeen } from '#server/notes/expect-seen'
import { moveIssue } from '#server/notes/move-issue'
import { sign } from '#server/notes/signatures'
import type { CommandContext } from '#server/utils/command-context'

/** An approver takes a released issue out of force, with a reason and a signature. Its PDF stays. */
export function withdrawIssue(context: CommandContext, issueId: string, input: Withdraw): Promise<void> {
  return signOnIssue(context, issueId, 'withdraw', ['withdraw'], input.password, async (inside, issue, name, standing) => {
    const { em, actor, clock } = inside
    expectSeen(issue, input.expect)
    await sign(inside, issue, 'withdrawn', issue.contentHash ?? '')
    const { from, to } = moveIssue(issue, 'withdraw', clock())
    await em.flush()
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to }, reason: input.reason })
    for (const to of concerned(standing, actor)) {
      await queueMail(inside, { template: 'withdrawn', to, event: `withdraw:${issue.id}`, props: { ...issueMailProps(issue), approver: actor.name, reason: input.reason } })
    }
  })
}
