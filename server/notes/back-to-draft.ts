import type { Issue } from '#server/database/entities/issue'
import type { CommandContext } from '#server/utils/command-context'
import { moveIssue } from './move-issue'
import { voidSignatures } from './signatures'

/** Return and recall: the issue is a draft again and the signatures given on its way are void. */
export async function backToDraft(inside: CommandContext, issue: Issue, act: 'recall' | 'return', reason: string) {
  await voidSignatures(inside, issue, ['submitted', 'passed', 'released'], reason)
  const moved = moveIssue(issue, act, inside.clock())
  Object.assign(issue, { contentHash: null, releaseFailure: null })
  await inside.em.flush()
  return moved
}
