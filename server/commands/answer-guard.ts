import { randomUUID } from 'node:crypto'
import { guardFacts } from '#shared/calc/lapse'
import type { AnswerGuard } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { actOnIssue } from '#server/notes/act-on-issue'
import { guardIn } from '#server/notes/current-results'
import { addPart } from '#server/notes/parts'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The analyst answers a caution, or writes the deviation for a marked stop. A new wording must be judged anew. */
export function answerGuard(context: CommandContext, issueId: string, input: AnswerGuard): Promise<void> {
  return actOnIssue(context, issueId, 'answer guard', ['answer'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const { guard, methodRevision } = guardIn(issue, input.calcId, input.guardKey)
    if (guard.severity === 'information') throw new DomainError('not-allowed', 'Information needs no answer.')
    if (guard.severity === 'stop' && !guard.deviable) throw new DomainError('not-allowed', 'This stop cannot be met by a deviation; change the calculation.')
    const held = await em.findOne(GuardAnswerSchema, { issue, calcId: input.calcId, guardKey: input.guardKey })
    const old = held && { text: held.text, accepted: held.accepted }
    const answer = held ?? em.create(GuardAnswerSchema, { id: randomUUID(), issue, calcId: input.calcId, guardKey: input.guardKey, kind: 'answer', text: '', facts: guardFacts(guard, methodRevision), author: actor, at: clock(), saveNumber: issue.saveNumber, judgement: '' })
    Object.assign(answer, {
      kind: guard.severity === 'stop' ? 'deviation' : 'answer', text: input.text, facts: guardFacts(guard, methodRevision), author: actor, at: clock(), saveNumber: issue.saveNumber,
      judgedBy: null, judgedAt: null, accepted: null, judgement: '', approvedBy: null, approvedAt: null,
    })
    issue.lastChangeAt = clock()
    await em.flush()
    await addPart(inside, issue, 'contributor')
    await recordAct(inside, { ...name, old, new: { calculation: input.calcId, guard: input.guardKey, kind: answer.kind, text: input.text, at: guard.message } })
  })
}
