import type { Act } from '#shared/schemas/issue-view'
import { noteChain } from '#server/audit/record'
import type { Issue } from '#server/database/entities/issue'
import { runCommand, type ActName, type CommandContext } from '#server/utils/command-context'
import { requireAbility } from './facts'
import { findIssue, lockIssue } from './find-issue'
import type { Standing } from './standing'

/**
 * The frame of every act on an issue: one transaction, the issue's row locked,
 * the ability judged inside it, and refusals left in the trail of the note.
 */
export async function actOnIssue<T>(context: CommandContext, issueId: string, act: string, needs: [Act, ...Act[]], work: (inside: CommandContext, issue: Issue, name: ActName, standing: Standing) => Promise<T>): Promise<T> {
  const { note, letter } = await findIssue(context.em.fork(), issueId)
  const name = { chain: noteChain(note.id), act, subject: { type: 'issue', id: issueId, label: `${note.number} ${letter}` } }
  return runCommand(context, name, async (inside) => {
    const issue = await lockIssue(inside.em, issueId)
    const standing = await requireAbility(inside, issue, needs)
    return work(inside, issue, name, standing)
  })
}
