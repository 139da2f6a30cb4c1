import type { Issue } from '#server/database/entities/issue'
import { SaveSchema } from '#server/database/entities/save'
import type { CommandContext } from '#server/utils/command-context'

/**
 * Keeps the whole document with the save that an act rests on, so that it can be
 * read without replaying a step. Outside draft nothing changes any more, so the
 * act that leaves it is enough for all that follow.
 */
export async function keepSnapshot({ em }: CommandContext, issue: Issue): Promise<void> {
  await em.nativeUpdate(SaveSchema, { issue, number: issue.saveNumber, snapshot: null }, { snapshot: issue.document })
}
