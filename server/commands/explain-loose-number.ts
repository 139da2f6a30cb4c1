import { randomUUID } from 'node:crypto'
import type { ExplainLoose } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { LooseDecisionSchema } from '#server/database/entities/loose-decision'
import { actOnIssue } from '#server/notes/act-on-issue'
import { looseNumbersOf } from '#server/notes/reading'
import { addPart } from '#server/notes/parts'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The analyst says why a typed quantity stays untied, or takes the explanation back. */
export function explainLooseNumber(context: CommandContext, issueId: string, input: ExplainLoose): Promise<void> {
  return actOnIssue(context, issueId, input.reason === null ? 'take explanation back' : 'explain loose number', ['answer'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const place = { blockId: input.blockId, text: input.text, ordinal: input.ordinal }
    const held = await em.findOne(LooseDecisionSchema, { issue, ...place })
    const old = held && { reason: held.reason }
    if (input.reason === null) {
      if (held) em.remove(held)
    } else {
      const found = looseNumbersOf(issue).find(n => n.blockId === place.blockId && n.text === place.text && n.ordinal === place.ordinal)
      if (!found) throw new DomainError('stale', 'This number is not in the saved note. It will be listed again when the note is saved.')
      const decision = held ?? em.create(LooseDecisionSchema, { id: randomUUID(), issue, ...place, verdict: found.verdict, reason: input.reason, author: actor, at: clock() })
      Object.assign(decision, { verdict: found.verdict, reason: input.reason, author: actor, at: clock() })
    }
    issue.lastChangeAt = clock()
    await em.flush()
    await addPart(inside, issue, 'contributor')
    await recordAct(inside, { ...name, old, new: { ...place, reason: input.reason } })
  })
}
