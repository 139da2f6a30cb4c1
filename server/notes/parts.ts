import { randomUUID } from 'node:crypto'
import type { Issue } from '#server/database/entities/issue'
import { IssuePartSchema, type Part } from '#server/database/entities/issue-part'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

const words: Record<Part, string> = { contributor: 'contributed to', checker: 'checked', approver: 'approved' }

/** Writes down what the actor is to an issue. One part per issue and person; the unique key of the table has the last word. */
export async function addPart({ em, actor, clock }: CommandContext, issue: Issue, part: Part): Promise<void> {
  const held = await em.findOne(IssuePartSchema, { issue, person: actor })
  if (held?.part === part) return
  if (held) throw new DomainError('not-eligible', `You ${words[held.part]} this issue, so this must be somebody else's.`)
  em.create(IssuePartSchema, { id: randomUUID(), issue, person: actor, part, at: clock() })
  await em.flush()
}
