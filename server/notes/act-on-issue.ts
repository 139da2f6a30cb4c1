import type { Act } from '#shared/schemas/issue-view'
import { noteChain } from '#server/audit/record'
import type { Issue } from '#server/database/entities/issue'
import { confirmPassword } from '#server/access/confirm-password'
import { recordRefusal, runCommand, type ActName, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'
import { requireAbility } from './facts'
import { findIssueLine, lockIssue } from './find-issue'
import type { Standing } from './standing'

type Work<T> = (inside: CommandContext, issue: Issue, name: ActName, standing: Standing) => Promise<T>

async function nameOf(context: CommandContext, issueId: string, act: string): Promise<ActName> {
  const { note, letter } = await findIssueLine(context.em.fork(), issueId)
  return { chain: noteChain(note.id), act, subject: { type: 'issue', id: issueId, label: `${note.number} ${letter}` } }
}

/**
 * The frame of every act on an issue: one transaction, the issue's row locked,
 * the ability judged inside it, and refusals left in the trail of the note.
 */
export async function actOnIssue<T>(context: CommandContext, issueId: string, act: string, needs: [Act, ...Act[]], work: Work<T>): Promise<T> {
  const name = await nameOf(context, issueId, act)
  return runCommand(context, name, async (inside) => {
    const issue = await lockIssue(inside.em, issueId)
    const standing = await requireAbility(inside, issue, needs)
    return work(inside, issue, name, standing)
  })
}

/**
 * The same for acts that are signed. The password is confirmed before the
 * transaction: inside it, ten who sign at once would hold every connection
 * while each waits for one more.
 */
export async function signOnIssue<T>(context: CommandContext, issueId: string, act: string, needs: [Act, ...Act[]], password: string, work: Work<T>): Promise<T> {
  try {
    await confirmPassword(context, password)
  } catch (error) {
    if (error instanceof DomainError) await recordRefusal(context, await nameOf(context, issueId, act), error)
    throw error
  }
  return actOnIssue(context, issueId, act, needs, work)
}
