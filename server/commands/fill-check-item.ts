import { randomUUID } from 'node:crypto'
import { checkItems, verdictFault } from '#shared/review/check-sheet'
import type { FillCheckItem } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { CheckEntrySchema } from '#server/database/entities/check-entry'
import type { Issue } from '#server/database/entities/issue'
import { actOnIssue } from '#server/notes/act-on-issue'
import { contentOf } from '#server/notes/content'
import { addPart } from '#server/notes/parts'
import { sheetFactsOf } from '#server/notes/sheet-facts'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The checker fills one item of the check sheet, at the content as it stands. */
export const fillCheckItem = (context: CommandContext, issueId: string, input: FillCheckItem): Promise<void> => fillCheckItems(context, issueId, [input])

/** Several items at once, each with its row of the trail: all are filled, or none. */
export function fillCheckItems(context: CommandContext, issueId: string, inputs: readonly FillCheckItem[]): Promise<void> {
  return actOnIssue(context, issueId, 'fill check sheet', ['check-sheet'], async (inside, issue, name) => {
    const onSheet = new Set(checkItems(sheetFactsOf(issue)).map(({ item }) => item))
    const { hash } = await contentOf(inside.em, issue)
    for (const input of inputs) {
      if (!onSheet.has(input.item)) throw new DomainError('not-found', 'This item is not on the sheet of this note.')
      const fault = verdictFault(input.verdict, input.evidence)
      if (fault) throw new DomainError('invalid-input', fault, { fields: { evidence: fault } })
      await recordAct(inside, { ...name, old: await fillItem(inside, issue, input, hash), new: input })
    }
    await addPart(inside, issue, 'checker')
  })
}

/** Answers what the item held before. */
async function fillItem({ em, actor, clock }: CommandContext, issue: Issue, input: FillCheckItem, hash: string) {
  const held = await em.findOne(CheckEntrySchema, { issue, item: input.item })
  const old = held && { verdict: held.verdict, evidence: held.evidence }
  const entry = held ?? em.create(CheckEntrySchema, { id: randomUUID(), issue, ...input, person: actor, at: clock(), saveNumber: issue.saveNumber, hash })
  Object.assign(entry, { verdict: input.verdict, evidence: input.evidence, person: actor, at: clock(), saveNumber: issue.saveNumber, hash })
  await em.flush()
  return old
}
