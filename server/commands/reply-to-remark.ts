import { randomUUID } from 'node:crypto'
import type { ReplyToRemark } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { RemarkEntrySchema } from '#server/database/entities/remark-entry'
import { RemarkSchema } from '#server/database/entities/remark'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { actOnIssue } from '#server/notes/act-on-issue'
import { attachmentOf } from '#server/notes/attachment'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** A reply. The first one by somebody other than the remark's author makes it answered, one by its author opens it again. */
export function replyToRemark(context: CommandContext, issueId: string, remarkId: string, input: ReplyToRemark): Promise<void> {
  return actOnIssue(context, issueId, 'reply to remark', ['reply'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const remark = await em.findOne(RemarkSchema, { id: remarkId, issue }, { populate: ['author'] })
    if (!remark) throw new DomainError('not-found', 'There is no such remark on this issue.')
    if (remark.state === 'closed') throw new DomainError('wrong-state', 'This remark is closed; the checker can open it again.')
    const fileId = await attachmentOf(inside, issue, input.fileId)
    const first = await em.findOneOrFail(RemarkEntrySchema, { remark }, { orderBy: { at: 'asc' } })
    const entry = em.create(RemarkEntrySchema, { id: randomUUID(), remark, author: actor, at: clock(), text: input.text, proposed: null, fileId })
    const old = remark.state
    remark.state = actor.id === remark.author.id ? 'open' : 'answered'
    await em.flush()
    await recordAct(inside, { ...name, old: { state: old }, new: { remark: remark.number, state: remark.state, text: input.text } })
    if (actor.id === remark.author.id) return
    await queueMail(inside, {
      template: 'answered', to: remark.author, event: `reply:${entry.id}`,
      props: { ...issueMailProps(issue, `#remark-${remark.number}`), by: actor.name, remark: { number: remark.number, text: first.text }, answer: input.text },
    })
  })
}
