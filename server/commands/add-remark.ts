import { randomUUID } from 'node:crypto'
import { anchorHolds } from '#shared/note/anchors'
import type { AddRemark } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { RemarkEntrySchema } from '#server/database/entities/remark-entry'
import { RemarkSchema } from '#server/database/entities/remark'
import { issueMailProps } from '#server/mail/issue-props'
import { queueMail } from '#server/mail/queue-mail'
import { actOnIssue } from '#server/notes/act-on-issue'
import { attachmentOf } from '#server/notes/attachment'
import { documentOf } from '#server/notes/reading'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The checker remarks on a range of the text or on a calculation, in a document they cannot edit. */
export function addRemark(context: CommandContext, issueId: string, input: AddRemark): Promise<void> {
  return actOnIssue(context, issueId, 'remark', ['remark'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    if (!anchorHolds(documentOf(issue), input.anchor)) throw new DomainError('stale', 'The words you selected are not in the saved note. Select them again.')
    const fileId = await attachmentOf(inside, issue, input.fileId)
    const number = await em.count(RemarkSchema, { issue }) + 1
    const remark = em.create(RemarkSchema, {
      id: randomUUID(), issue, number, state: 'open', anchor: input.anchor, anchorState: 'ok', author: actor, at: clock(), saveNumber: issue.saveNumber,
    })
    em.create(RemarkEntrySchema, { id: randomUUID(), remark, author: actor, at: clock(), text: input.text, proposed: input.proposed, fileId })
    await em.flush()
    await recordAct(inside, { ...name, new: { remark: number, anchor: input.anchor, text: input.text, proposed: input.proposed } })
    if (!issue.analyst) return
    await queueMail(inside, {
      template: 'remarked', to: issue.analyst, event: `remark:${remark.id}`,
      props: { ...issueMailProps(issue, `#remark-${number}`), checker: actor.name, remark: { number, text: input.text, quote: input.anchor.kind === 'text' ? input.anchor.quote : '' } },
    })
  })
}
