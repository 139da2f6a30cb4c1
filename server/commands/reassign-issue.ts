import type { Reassign } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import type { Issue } from '#server/database/entities/issue'
import type { Person } from '#server/database/entities/person'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { actOnIssue } from '#server/notes/act-on-issue'
import { eligible } from '#server/notes/candidates'
import { expectSeen } from '#server/notes/expect-seen'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

interface Change { role: 'checker' | 'approver', before: Person | null, after: Person, reason: string }

async function tell(inside: CommandContext, issue: Issue, { role, before, after, reason }: Change): Promise<void> {
  const event = `reassign:${issue.id}:${role}:${inside.clock().toISOString()}`
  const props = { ...issueMailProps(issue), role, by: inside.actor.name, reason }
  await queueMail(inside, { template: 'assigned', to: after, event, props: { ...props, change: 'named', other: before?.name ?? 'nobody' } })
  if (before) await queueMail(inside, { template: 'assigned', to: before, event, props: { ...props, change: 'relieved', other: after.name } })
}

/** The submitting analyst, or an administrator, names another checker or approver, with a reason. */
export function reassignIssue(context: CommandContext, issueId: string, input: Reassign): Promise<void> {
  return actOnIssue(context, issueId, 'reassign', ['reassign'], async (inside, issue, name, standing) => {
    const { em, clock } = inside
    expectSeen(issue, input.expect)
    if (input.checkerId && issue.state !== 'in check') throw new DomainError('wrong-state', 'The check is passed; only the approver can be named anew.')
    const old = { checker: issue.checker?.id ?? null, approver: issue.approver?.id ?? null }
    const changes: Change[] = []
    for (const role of ['checker', 'approver'] as const) {
      const id = input[`${role}Id`]
      if (!id || id === issue[role]?.id) continue
      const after = await eligible(em, standing, id, role)
      changes.push({ role, before: issue[role] ?? null, after, reason: input.reason })
      issue[role] = after
    }
    if (issue.checker?.id === issue.approver?.id) throw new DomainError('not-eligible', 'Checker and approver must be two people.')
    issue.lastChangeAt = clock()
    await em.flush()
    await recordAct(inside, { ...name, old, new: { checker: issue.checker?.id ?? null, approver: issue.approver?.id ?? null }, reason: input.reason })
    for (const change of changes) await tell(inside, issue, change)
  })
}
