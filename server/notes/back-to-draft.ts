import type { Issue } from '#server/database/entities/issue'
import type { CommandContext } from '#server/utils/command-context'
import { voidSignatures } from './signatures'

/** Return and recall: the issue is a draft again and the signatures given on its way are void. */
export async function backToDraft(inside: CommandContext, issue: Issue, reason: string): Promise<void> {
  await voidSignatures(inside, issue, ['submitted', 'passed', 'released'], reason)
  Object.assign(issue, { state: 'draft', contentHash: null, releaseFailure: null, lastChangeAt: inside.clock() })
  await inside.em.flush()
}
