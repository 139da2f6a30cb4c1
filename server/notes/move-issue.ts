import type { Issue } from '#server/database/entities/issue'
import type { IssueState } from '#shared/review/states'
import { moveOf, wrongStateSentence, type MachineAct } from '#shared/review/transitions'
import { DomainError } from '#server/utils/domain-error'

/** Moves an issue on as the table of moves says, whoever judged that it may. Gives the two states for the trail. */
export function moveIssue(issue: Issue, act: MachineAct, at: Date): { from: IssueState, to: IssueState } {
  const move = moveOf(issue.state, act)
  if (!move) throw new DomainError('wrong-state', wrongStateSentence(issue.state, act))
  Object.assign(issue, { state: move.to, lastChangeAt: at })
  return { from: move.from, to: move.to }
}
