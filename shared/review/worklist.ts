/** Why an issue waits for a person: one sentence, and the act that is theirs. */
import type { Act } from '#shared/schemas/issue-view'
import type { IssueState } from '#shared/review/states'

export interface WaitingFacts {
  state: IssueState
  releasing: boolean
  releaseFailure: string | null
  /** What the person is to the issue now. */
  isAnalyst: boolean
  isChecker: boolean
  isApprover: boolean
  /** Who sent it back last and why; null where it was never returned. */
  returned: { by: string, reason: string } | null
  /** Remarks that wait for an answer, and those answered and not closed. */
  remarks: { open: number, answered: number }
}

export interface Waiting { why: string, act: Act }

const counted = (count: number, one: string, many: string) => count === 1 ? `one ${one}` : `${count} ${many}`

function forAnalyst({ state, returned, remarks, isAnalyst }: WaitingFacts): Waiting | null {
  if (!isAnalyst) return null
  if (state === 'in check' && remarks.open > 0) return { why: `In check, with ${counted(remarks.open, 'remark', 'remarks')} to answer.`, act: 'reply' }
  if (state !== 'draft') return null
  if (returned) return { why: `Returned by ${returned.by}: ${returned.reason}`, act: 'write' }
  return { why: 'Your draft.', act: 'write' }
}

function forChecker({ state, remarks, isChecker }: WaitingFacts): Waiting | null {
  if (!isChecker || state !== 'in check') return null
  const answered = remarks.answered > 0 ? `, ${counted(remarks.answered, 'remark', 'remarks')} answered` : ''
  return { why: `Waits for your check${answered}.`, act: 'pass' }
}

function forApprover({ state, releasing, releaseFailure, isApprover }: WaitingFacts): Waiting | null {
  if (!isApprover || state !== 'for approval' || releasing) return null
  return releaseFailure ? { why: `The release could not be made: ${releaseFailure}`, act: 'release' } : { why: 'Waits for your release.', act: 'release' }
}

/** null when nothing of the issue waits for the person. */
export const waitingFor = (facts: WaitingFacts): Waiting | null => forApprover(facts) ?? forChecker(facts) ?? forAnalyst(facts)
