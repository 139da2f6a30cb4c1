import type { Lease } from '#server/database/entities/lease'
import { requireAbility } from '#server/notes/facts'
import { lockIssue } from '#server/notes/find-issue'
import { takePen } from '#server/notes/pen'
import type { CommandContext } from '#server/utils/command-context'

/** Takes the pen when it is free, or shows a sign of life. No act: it leaves no row in the trail. */
export function keepPen(context: CommandContext, issueId: string): Promise<Lease> {
  return context.em.fork().transactional(async (em) => {
    const inside = { ...context, em }
    const issue = await lockIssue(em, issueId)
    await requireAbility(inside, issue, ['write'])
    return takePen(inside, issue)
  })
}
