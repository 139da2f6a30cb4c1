import type { Return } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { actOnIssue } from '#server/notes/act-on-issue'
import { backToDraft } from '#server/notes/back-to-draft'
import { expectSeen } from '#server/notes/expect-seen'
import type { CommandContext } from '#server/utils/command-context'

/** The checker, or the approver, sends the issue back with a reason. */
export function returnNote(context: CommandContext, issueId: string, input: Return): Promise<void> {
  return actOnIssue(context, issueId, 'return', ['return'], async (inside, issue, name, standing) => {
    const { actor, clock } = inside
    expectSeen(issue, input.expect)
    const { from, to } = await backToDraft(inside, issue, 'return', `returned by ${actor.name}: ${input.reason}`)
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to }, reason: input.reason })
    const analyst = issue.analyst
    if (!analyst) return
    await queueMail(inside, {
      template: 'returned', to: analyst, event: `return:${issue.id}:${clock().toISOString()}`,
      props: { ...issueMailProps(issue), by: actor.name, role: from === 'in check' ? 'checker' : 'approver', reason: input.reason, openRemarks: standing.remarks.filter(r => r.state !== 'closed').length },
    })
  })
}
