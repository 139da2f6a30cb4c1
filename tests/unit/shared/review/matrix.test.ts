/**
 * State × act × role × relation, written by hand from the roles and the state
 * machine as they are defined for the product: analysts write, submit, recall
 * and abandon; the assigned checker returns, passes, remarks, ticks and judges;
 * the assigned approver returns and releases; any approver withdraws; the
 * submitting analyst or an administrator reassigns; auditors read.
 */
import { describe, expect, it } from 'vitest'
import { abilities, ACTS } from '#shared/review/abilities'
import type { ReviewFacts } from '#shared/review/facts'
import type { IssueState } from '#shared/review/states'
import { factsWith } from './example-facts'

type Column = IssueState | 'being released'
const COLUMNS: Column[] = ['draft', 'in check', 'for approval', 'being released', 'released', 'superseded', 'withdrawn', 'abandoned']

interface Persona { who: string, person: Partial<ReviewFacts['person']>, may: Partial<Record<Column, string>>, blind?: boolean }

const writes = 'write answer submit abandon reply'
const checks = 'return pass remark reply close-remark tick accept check-sheet'

const PERSONAS: Persona[] = [
  { who: 'somebody of another project', person: {}, may: {}, blind: true },
  { who: 'the analyst who submitted', person: { id: 'ana', roles: ['analyst'], part: 'contributor', contributedTo: ['B'] },
    may: { 'draft': writes, 'in check': 'recall reassign reply', 'for approval': 'recall reassign', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'another analyst who contributed', person: { id: 'coa', roles: ['analyst'], part: 'contributor', contributedTo: ['B'] },
    may: { 'draft': writes, 'in check': 'recall reply', 'for approval': 'recall', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'an analyst without a part', person: { roles: ['analyst'] },
    may: { 'draft': writes, 'in check': 'reply', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'the submitter who is no analyst any more', person: { id: 'ana', roles: ['approver'], part: 'contributor', contributedTo: ['B'] },
    may: { released: 'withdraw' } },
  { who: 'the assigned checker, before the first tick', person: { id: 'che', roles: ['checker'] },
    may: { 'draft': 'reply', 'in check': checks } },
  { who: 'the assigned checker', person: { id: 'che', roles: ['checker'], part: 'checker' },
    may: { 'draft': 'reply', 'in check': checks } },
  { who: 'another checker', person: { roles: ['checker'] }, may: {} },
  { who: 'another checker, who ticked before being relieved', person: { roles: ['checker'], part: 'checker' }, may: {} },
  { who: 'the assigned checker who contributed to an abandoned issue', person: { id: 'che', roles: ['checker'], contributedTo: ['A'] },
    may: { 'draft': 'reply', 'in check': 'return remark reply close-remark' } },
  { who: 'the assigned checker who wrote in this issue', person: { id: 'che', roles: ['analyst', 'checker'], part: 'contributor', contributedTo: ['B'] },
    may: { 'draft': writes, 'in check': 'recall return remark reply close-remark', 'for approval': 'recall', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'the assigned checker whose role was taken', person: { id: 'che', roles: ['analyst'], part: null },
    may: { 'draft': writes, 'in check': 'reply', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'the assigned checker who is an analyst too', person: { id: 'che', roles: ['analyst', 'checker'], part: 'checker' },
    may: { 'draft': 'reply', 'in check': checks, 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'the assigned checker who signed a release that failed', person: { id: 'che', roles: ['checker', 'approver'], part: 'approver' },
    may: { 'draft': 'reply', 'in check': 'return remark reply close-remark', 'released': 'withdraw' } },
  { who: 'the assigned approver', person: { id: 'app', roles: ['approver'] },
    may: { 'for approval': 'return release', 'released': 'withdraw' } },
  { who: 'the assigned approver after a release that failed', person: { id: 'app', roles: ['approver'], part: 'approver' },
    may: { 'for approval': 'return release', 'released': 'withdraw' } },
  { who: 'another approver', person: { roles: ['approver'] }, may: { released: 'withdraw' } },
  { who: 'the assigned approver who checked', person: { id: 'app', roles: ['checker', 'approver'], part: 'checker' },
    may: { 'for approval': 'return', 'released': 'withdraw' } },
  { who: 'the assigned approver who contributed', person: { id: 'app', roles: ['analyst', 'approver'], part: 'contributor', contributedTo: ['B'] },
    may: { 'draft': writes, 'in check': 'recall reply', 'for approval': 'recall return', 'released': 'withdraw open-next', 'withdrawn': 'open-next' } },
  { who: 'the assigned approver who contributed to an abandoned issue', person: { id: 'app', roles: ['approver'], contributedTo: ['A'] },
    may: { 'for approval': 'return', 'released': 'withdraw' } },
  { who: 'the assigned approver whose role was taken', person: { id: 'app', roles: ['checker'] }, may: {} },
  { who: 'an administrator', person: { administrator: true }, may: { 'in check': 'reassign', 'for approval': 'reassign' } },
  { who: 'an auditor', person: { auditor: true }, may: {} },
  { who: 'an auditor who is an analyst of the project', person: { auditor: true, roles: ['analyst'] },
    may: { 'draft': writes, 'in check': 'reply', 'released': 'open-next', 'withdrawn': 'open-next' } },
  { who: 'an author with every role there is', person: { id: 'ana', auditor: true, administrator: true, roles: ['analyst', 'checker', 'approver'], part: 'contributor', contributedTo: ['B'] },
    may: { 'draft': writes, 'in check': 'recall reassign reply', 'for approval': 'recall reassign', 'released': 'open-next withdraw', 'withdrawn': 'open-next' } },
  { who: 'a disabled author', person: { id: 'ana', disabled: true, roles: ['analyst'], part: 'contributor' }, may: {}, blind: true },
  { who: 'a disabled administrator', person: { disabled: true, administrator: true }, may: {}, blind: true },
]

describe('who may do what, in every state', () => {
  for (const { who, person, may, blind } of PERSONAS) {
    it.each(COLUMNS)(`${who}: %s`, (column) => {
      const state = column === 'being released' ? 'for approval' : column
      const got = abilities(factsWith({ issue: { state, releasing: column === 'being released' }, person }))
      const expected = new Set((may[column] ?? '').split(' ').filter(Boolean))
      if (!blind) expected.add('see')
      expect(ACTS.filter(act => got[act].can).sort()).toEqual([...expected].sort())
      for (const act of ACTS) expect(got[act].can, got[act].why).toBe(got[act].why === undefined)
    })
  }
})
