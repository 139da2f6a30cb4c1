import { randomUUID } from 'node:crypto'
import type { ExplainLoose } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import type { Issue } from '#server/database/entities/issue'
import { LooseDecisionSchema } from '#server/database/entities/loose-decision'
import { actOnIssue } from '#server/notes/act-on-issue'
import { looseNumbersOf } from '#server/notes/reading'
import { addPart } from '#server/notes/parts'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The analyst says why a typed quantity stays untied, or takes the explanation back. */
export const explainLooseNumber = (context: CommandContext, issueId: string, input: ExplainLoose): Promise<void> => explainLooseNumbers(context, issueId, [input])

/** Several quantities at once, each with its row of the trail: all are explained, or none. */
export function explainLooseNumbers(context: CommandContext, issueId: string, inputs: readonly ExplainLoose[]): Promise<void> {
  return actOnIssue(context, issueId, inputs.every(({ reason }) => reason === null) ? 'take explanation back' : 'explain loose number', ['answer'], async (inside, issue, name) => {
    for (const input of inputs) {
      const old = await decide(inside, issue, input)
      issue.lastChangeAt = inside.clock()
      await inside.em.flush()
      await recordAct(inside, { ...name, old, new: { blockId: input.blockId, text: input.text, ordinal: input.ordinal, reason: input.reason } })
    }
    await addPart(inside, issue, 'contributor')
  })
}

/** Answers the decision before. @throws DomainError stale where the number is not in the saved note */
async function decide({ em, actor, clock }: CommandContext, issue: Issue, { reason, ...place }: ExplainLoose) {
  const held = await em.findOne(LooseDecisionSchema, { issue, ...place })
  const old = held && { reason: held.reason }
  if (reason === null) {
    if (held) em.remove(held)
    return old
  }
  const found = looseNumbersOf(issue).find(n => n.blockId === place.blockId && n.text === place.text && n.ordinal === place.ordinal)
  if (!found) throw new DomainError('stale', 'This number is not in the saved note. It will be listed again when the note is saved.')
  const decision = held ?? em.create(LooseDecisionSchema, { id: randomUUID(), issue, ...place, verdict: found.verdict, reason, author: actor, at: clock() })
  Object.assign(decision, { verdict: found.verdict, reason, author: actor, at: clock() })
  return old
}
