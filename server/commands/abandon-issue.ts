import type { Abandon } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { actOnIssue } from '#server/notes/act-on-issue'
import { expectSeen } from '#server/notes/expect-seen'
import { keepSnapshot } from '#server/notes/keep-snapshot'
import { moveIssue } from '#server/notes/move-issue'
import { layPen } from '#server/notes/pen'
import type { CommandContext } from '#server/utils/command-context'

/** The analyst gives the issue up; its letter is spent. */
export function abandonIssue(context: CommandContext, issueId: string, input: Abandon): Promise<void> {
  return actOnIssue(context, issueId, 'abandon', ['abandon'], async (inside, issue, name) => {
    expectSeen(issue, input.expect)
    await keepSnapshot(inside, issue)
    const { from, to } = moveIssue(issue, 'abandon', inside.clock())
    await inside.em.flush()
    await layPen(inside, issue)
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to }, reason: input.reason })
  })
}
