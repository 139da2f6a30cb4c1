/**
 * The state machine of an issue: one row per act and state it can be done in.
 * A pair that is not in the table cannot be done. Who may act and what it takes
 * stands in the same row, so that screens, commands and tests read one truth.
 */
import type { Act } from '#shared/schemas/issue-view'
import { inWords, type IssueState } from '#shared/review/states'

/** Acts of the job worker and of the release of another issue; no person does them directly. */
export type MachineAct = Act | 'complete-release' | 'fail-release' | 'supersede'

/**
 * - `analyst`: an analyst of the project who has no other part in the issue
 * - `author`: such an analyst who contributed to the issue or submitted it
 * - `submitter`: the analyst who submitted it
 * - `checker`, `approver`: the one assigned
 * - `project analyst`, `project approver`: any of the project, whatever their part
 * - `administrator`, `reader` (whoever sees the note), `worker` (no person)
 */
export type Who = 'analyst' | 'project analyst' | 'author' | 'submitter' | 'checker' | 'approver' | 'project approver' | 'administrator' | 'reader' | 'worker'

/**
 * - `independent`: no contribution to this issue or an unreleased one before it, and no other part in it
 * - `unlocked`: the release has not been pressed
 * - `pen`: nobody else is writing
 * - `complete`: nothing stands in the way any more
 * - `no other on its way`: the note has no issue on its way and none later
 */
export type Need = 'independent' | 'unlocked' | 'pen' | 'complete' | 'reason' | 'password' | 'no other on its way'

export interface Move { act: MachineAct, from: IssueState, to: IssueState, who: readonly Who[], needs: readonly Need[] }

const move = (act: MachineAct, from: IssueState, to: IssueState, who: readonly Who[], needs: readonly Need[] = []): Move => ({ act, from, to, who, needs })
const stay = (act: MachineAct, at: IssueState, who: readonly Who[], needs: readonly Need[] = []): Move => move(act, at, at, who, needs)

export const MOVES: readonly Move[] = [
  move('submit', 'draft', 'in check', ['analyst'], ['pen', 'complete']),
  move('recall', 'in check', 'draft', ['author']),
  move('recall', 'for approval', 'draft', ['author'], ['unlocked']),
  move('return', 'in check', 'draft', ['checker'], ['reason']),
  move('return', 'for approval', 'draft', ['approver'], ['unlocked', 'reason']),
  move('pass', 'in check', 'for approval', ['checker'], ['independent', 'complete', 'password']),
  // The signature locks the issue; the worker moves it once the PDF is stored.
  stay('release', 'for approval', ['approver'], ['unlocked', 'independent', 'complete', 'password']),
  move('complete-release', 'for approval', 'released', ['worker'], ['complete']),
  stay('fail-release', 'for approval', ['worker']),
  move('supersede', 'released', 'superseded', ['worker']),
  move('abandon', 'draft', 'abandoned', ['analyst'], ['pen', 'reason']),
  move('withdraw', 'released', 'withdrawn', ['project approver'], ['reason', 'password']),
  stay('open-next', 'released', ['project analyst'], ['no other on its way']),
  stay('open-next', 'withdrawn', ['project analyst'], ['no other on its way']),

  stay('write', 'draft', ['analyst'], ['pen']),
  stay('answer', 'draft', ['analyst']),
  stay('reassign', 'in check', ['submitter', 'administrator'], ['reason']),
  stay('reassign', 'for approval', ['submitter', 'administrator'], ['unlocked', 'reason']),
  stay('remark', 'in check', ['checker']),
  stay('reply', 'draft', ['analyst', 'checker']),
  stay('reply', 'in check', ['analyst', 'checker']),
  stay('close-remark', 'in check', ['checker']),
  stay('tick', 'in check', ['checker'], ['independent']),
  stay('accept', 'in check', ['checker'], ['independent']),
  stay('check-sheet', 'in check', ['checker'], ['independent']),

  stay('see', 'draft', ['reader']),
  stay('see', 'in check', ['reader']),
  stay('see', 'for approval', ['reader']),
  stay('see', 'released', ['reader']),
  stay('see', 'superseded', ['reader']),
  stay('see', 'withdrawn', ['reader']),
  stay('see', 'abandoned', ['reader']),
]

/** The row of an act in a state, or undefined where it cannot be done. */
export const moveOf = (state: IssueState, act: MachineAct): Move | undefined => MOVES.find(row => row.from === state && row.act === act)

/** Every row of an act, in whatever state. */
export const movesOf = (act: MachineAct): Move[] => MOVES.filter(row => row.act === act)

const actInWords: Record<MachineAct, string> = {
  'write': 'written in', 'answer': 'answered for', 'submit': 'submitted', 'recall': 'recalled', 'return': 'returned', 'pass': 'passed',
  'release': 'released', 'abandon': 'abandoned', 'withdraw': 'withdrawn', 'reassign': 'reassigned', 'open-next': 'followed by the next letter',
  'remark': 'remarked on', 'reply': 'replied about', 'close-remark': 'cleared of remarks', 'tick': 'ticked', 'accept': 'judged',
  'check-sheet': 'filled in', 'see': 'seen', 'complete-release': 'released', 'fail-release': 'unlocked', 'supersede': 'superseded',
}

const listed = (words: string[]) => words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} or ${words.at(-1)}`

/** Why an act cannot be done in a state: `This issue is in check; it can be submitted only while it is a draft.` */
export function wrongStateSentence(state: IssueState, act: MachineAct): string {
  const states = movesOf(act).map(row => inWords[row.from])
  return `This issue is ${inWords[state]}; it can be ${actInWords[act]} only while it is ${listed(states)}.`
}
