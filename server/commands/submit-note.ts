import type { Submit } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { deviationsIn, shownMargin } from '#server/mail/issue-mails'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { actOnIssue } from '#server/notes/act-on-issue'
import { eligible } from '#server/notes/candidates'
import { expectSeen } from '#server/notes/expect-seen'
import { keepSnapshot } from '#server/notes/keep-snapshot'
import { moveIssue } from '#server/notes/move-issue'
import { addPart } from '#server/notes/parts'
import { layPen } from '#server/notes/pen'
import { sign } from '#server/notes/signatures'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The analyst submits the issue for check and names the checker and the approver. From here it is frozen. */
export function submitNote(context: CommandContext, issueId: string, input: Submit): Promise<void> {
  return actOnIssue(context, issueId, 'submit', ['submit'], async (inside, issue, name, standing) => {
    const { em, actor, clock } = inside
    expectSeen(issue, input.expect)
    if (input.checkerId === input.approverId) throw new DomainError('not-eligible', 'Checker and approver must be two people.', { fields: { approverId: 'Choose somebody other than the checker.' } })
    const checker = await eligible(em, standing, input.checkerId, 'checker')
    const approver = await eligible(em, standing, input.approverId, 'approver')
    if ([checker.id, approver.id].includes(actor.id)) throw new DomainError('not-eligible', 'You submit this issue, so others must check and release it.')
    await addPart(inside, issue, 'contributor')
    await sign(inside, issue, 'submitted', standing.content.hash)
    const { from, to } = moveIssue(issue, 'submit', clock())
    Object.assign(issue, { analyst: actor, checker, approver, contentHash: null })
    await em.flush()
    await keepSnapshot(inside, issue)
    await layPen(inside, issue)
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to, save: issue.saveNumber, checker: checker.id, approver: approver.id, contentHash: standing.content.hash, documentHash: issue.documentHash } })
    await queueMail(inside, {
      template: 'submitted', to: checker, event: `submit:${issue.id}:${name.subject.label}:${issue.saveNumber}:${clock().toISOString()}`,
      props: { ...issueMailProps(issue), analyst: actor.name, approver: approver.name, save: issue.saveNumber, leastMargin: shownMargin(issue), cautions: issue.cautions, deviations: deviationsIn(standing) },
    })
  })
}
