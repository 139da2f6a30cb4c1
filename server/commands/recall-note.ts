import type { Recall } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { actOnIssue } from '#server/notes/act-on-issue'
import { backToDraft } from '#server/notes/back-to-draft'
import { expectSeen } from '#server/notes/expect-seen'
import type { CommandContext } from '#server/utils/command-context'

/** The analyst takes the issue back, until release is pressed. */
export function recallNote(context: CommandContext, issueId: string, input: Recall): Promise<void> {
  return actOnIssue(context, issueId, 'recall', ['recall'], async (inside, issue, name) => {
    expectSeen(issue, input.expect)
    const { from, to } = await backToDraft(inside, issue, 'recall', `recalled by ${inside.actor.name}`)
    await recordAct(inside, { ...name, old: { state: from }, new: { state: to } })
  })
}
