/**
 * What waits for whom, by hand from the states and roles of the product: the analyst writes a draft, mends a
 * returned one and answers remarks; the checker checks what is in check; the approver releases what is for approval.
 */
import { describe, expect, it } from 'vitest'
import { ISSUE_STATES, type IssueState } from '#shared/review/states'
import { waitingFor, type WaitingFacts } from '#shared/review/worklist'

const facts = (state: IssueState, change: Partial<WaitingFacts> = {}): WaitingFacts => ({
  state, releasing: false, releaseFailure: null, isAnalyst: false, isChecker: false, isApprover: false, returned: null, remarks: { open: 0, answered: 0 }, ...change,
})
const analyst = { isAnalyst: true }
const checker = { isChecker: true }
const approver = { isApprover: true }

describe('what waits', () => {
  it.each<[string, WaitingFacts, string | null, string | null]>([
    ['a draft of one\'s own', facts('draft', analyst), 'Your draft.', 'write'],
    ['a draft that came back', facts('draft', { ...analyst, returned: { by: 'Che Ran', reason: 'Wrong torque.' } }), 'Returned by Che Ran: Wrong torque.', 'write'],
    ['one remark to answer', facts('in check', { ...analyst, remarks: { open: 1, answered: 4 } }), 'In check, with one remark to answer.', 'reply'],
    ['three remarks to answer', facts('in check', { ...analyst, remarks: { open: 3, answered: 0 } }), 'In check, with 3 remarks to answer.', 'reply'],
    ['answered remarks only, for the analyst', facts('in check', { ...analyst, remarks: { open: 0, answered: 2 } }), null, null],
    ['a check', facts('in check', checker), 'Waits for your check.', 'pass'],
    ['a check with one answer', facts('in check', { ...checker, remarks: { open: 2, answered: 1 } }), 'Waits for your check, one remark answered.', 'pass'],
    ['a check with answers', facts('in check', { ...checker, remarks: { open: 0, answered: 2 } }), 'Waits for your check, 2 remarks answered.', 'pass'],
    ['a release', facts('for approval', approver), 'Waits for your release.', 'release'],
    ['a release that failed', facts('for approval', { ...approver, releaseFailure: 'the store is full' }), 'The release could not be made: the store is full', 'release'],
    ['a release that is being made', facts('for approval', { ...approver, releasing: true }), null, null],
    ['a returned draft, for its checker', facts('draft', checker), null, null],
    ['an issue in check, for its approver', facts('in check', approver), null, null],
    ['an issue for approval, for its checker', facts('for approval', checker), null, null],
    ['an issue for approval, for its analyst', facts('for approval', analyst), null, null],
  ])('%s', (_, given, why, act) => {
    expect(waitingFor(given)).toEqual(why === null ? null : { why, act })
  })

  it.each(ISSUE_STATES)('nothing for somebody without a part: %s', (state) => {
    expect(waitingFor(facts(state, { remarks: { open: 2, answered: 2 } }))).toBeNull()
  })

  it.each(['released', 'superseded', 'withdrawn', 'abandoned'] as const)('nothing of an issue that is %s, whoever asks', (state) => {
    expect(waitingFor(facts(state, { ...analyst, ...checker, ...approver, returned: { by: 'Che Ran', reason: 'x' }, releaseFailure: 'x', remarks: { open: 1, answered: 1 } }))).toBeNull()
  })

  it('the one who both checks and writes in the project is told of the check', () => {
    expect(waitingFor(facts('in check', { ...analyst, ...checker, remarks: { open: 1, answered: 0 } }))?.act).toBe('pass')
  })
})
