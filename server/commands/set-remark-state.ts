import type { SetRemarkState } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { RemarkSchema } from '#server/database/entities/remark'
import { actOnIssue } from '#server/notes/act-on-issue'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The assigned checker closes a remark (a predecessor's too), or opens it again. */
export function setRemarkState(context: CommandContext, issueId: string, remarkId: string, input: SetRemarkState): Promise<void> {
  return actOnIssue(context, issueId, input.state === 'closed' ? 'close remark' : 'reopen remark', ['close-remark'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const remark = await em.findOne(RemarkSchema, { id: remarkId, issue })
    if (!remark) throw new DomainError('not-found', 'There is no such remark on this issue.')
    const old = remark.state
    const closed = input.state === 'closed'
    Object.assign(remark, { state: input.state, closedBy: closed ? actor : null, closedAt: closed ? clock() : null })
    await em.flush()
    await recordAct(inside, { ...name, old: { state: old }, new: { remark: remark.number, state: input.state } })
  })
}
