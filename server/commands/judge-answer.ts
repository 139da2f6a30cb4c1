import type { JudgeAnswer } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { actOnIssue } from '#server/notes/act-on-issue'
import { addPart } from '#server/notes/parts'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The checker accepts an answer or deviation, or says what is missing. */
export function judgeAnswer(context: CommandContext, issueId: string, answerId: string, input: JudgeAnswer): Promise<void> {
  return actOnIssue(context, issueId, input.accepted ? 'accept answer' : 'decline answer', ['accept'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const answer = await em.findOne(GuardAnswerSchema, { id: answerId, issue })
    if (!answer) throw new DomainError('not-found', 'There is no such answer in this issue.')
    const old = { accepted: answer.accepted ?? null }
    Object.assign(answer, { judgedBy: actor, judgedAt: clock(), accepted: input.accepted, judgement: input.note })
    await em.flush()
    await addPart(inside, issue, 'checker')
    await recordAct(inside, { ...name, old, new: { guard: answer.guardKey, calculation: answer.calcId, accepted: input.accepted }, reason: input.note || null })
  })
}
