/**
 * What stands between an issue and its next act, by hand from the rules of the product: submit needs results, titles,
 * no plain stop, answers, deviations, numbers tied or explained, written sections and no lost tie; pass needs ticks,
 * judgements, closed remarks and a filled sheet as well; release needs the content that was passed.
 */
import { describe, expect, it } from 'vitest'
import type { CalcResult, Evaluation, Guard } from '#shared/calc/types'
import type { AnswerView, CheckItemView, LooseView, RemarkView, TickView } from '#shared/schemas/issue-view'
import { readDocument } from '#shared/note/schema'
import { TEMPLATE } from '#shared/note/template'
import { remaining, type RemainingFacts } from '#shared/review/remaining'
import { calculation, noteDocument, paragraph, testId, tied, withId, type Json } from '../../../factories/note-document'

const C1 = testId(1)
const C2 = testId(2)
const ana = { id: 'ana', name: 'Ana Tver' }
const at = '2031-04-02T09:00:00.000Z'

const guard = (key: string, severity: Guard['severity'], deviable = false): Guard =>
  ({ id: 'G-01', key, severity, deviable, title: 'Wall slenderness', message: 'x', ask: 'y', values: {}, source: '§11' })
const evaluation = (...guards: Guard[]): Evaluation => ({ ok: true, result: {
  kind: 'open-section', methodRevision: 'A', walls: [], cases: [], margins: [], governing: null, guards, working: [], drawing: null,
  outputs: [{ key: 'J', symbol: 'J', label: 'Torsion constant', value: 160, dimension: 'inertia', unit: 'mm⁴', method: '§1.9' }],
} satisfies CalcResult })
const answer = (guardKey: string, change: Partial<AnswerView> = {}): AnswerView =>
  ({ id: guardKey, calcId: C1, guardKey, kind: 'answer', text: 'x', author: ana, at, save: 3, lapsed: null, judged: null, approved: null, ...change })
const accepted = { judged: { accepted: true, by: ana, at, note: '' } }
const declined = { judged: { accepted: false, by: ana, at, note: 'Why?' } }
const loose = (verdict: LooseView['verdict'], explained = false): LooseView => ({
  blockId: testId(9), field: 'text', from: 0, to: 4, text: '5 mm', ordinal: 0, verdict, value: 5, dimension: 'length', candidates: [], reason: '',
  decision: explained ? { reason: 'drawing value', by: ana, at } : null,
})
const remark = (number: number, state: RemarkView['state'], anchorState: RemarkView['anchorState'] = 'ok'): RemarkView =>
  ({ id: `r${number}`, number, state, anchor: { kind: 'calculation', calcId: C1 }, anchorState, author: ana, at, save: 3, entries: [], closed: null })
const tick = (calcId: string, holds = true): TickView => ({ calcId, by: ana, at, save: 3, holds })
const item = (number: number, verdict: CheckItemView['verdict'], lapsed = false): CheckItemView => ({ item: number, text: 'x', verdict, evidence: '', by: ana, at, lapsed })

const settled = Object.fromEntries(TEMPLATE.filter(s => !s.generated && !['scope', 'section-analysis'].includes(s.key)).map(s => [s.key, 'plain strip']))
const documentOf = (change: { scope?: Json[], analysis?: Json[], notApplicable?: Partial<Record<string, string>> } = {}) => readDocument(noteDocument(
  { 'scope': change.scope ?? [paragraph('Both hands.')], 'section-analysis': change.analysis ?? [withId(C1, calculation('Strip'))] }, change.notApplicable ?? settled))

const facts = (change: Partial<RemainingFacts> = {}): RemainingFacts => ({
  doc: documentOf(), results: { [C1]: evaluation() }, answers: [], loose: [], remarks: [], ticks: [tick(C1)], sheet: [item(1, 'ok')], changeNoted: true, contentAsPassed: null, ...change,
})
const named = (lists: { id: string, count: number }[]) => lists.map(({ id, count }) => `${id} ${count}`)
const submit = (change: Partial<RemainingFacts>) => named(remaining(facts(change)).submit)
const pass = (change: Partial<RemainingFacts>) => named(remaining(facts(change)).pass)

describe('a note that is ready', () => {
  it('has nothing in its way', () => {
    expect(remaining(facts())).toEqual({ submit: [], pass: [], release: [] })
  })
})

describe('before submit', () => {
  const two = documentOf({ analysis: [withId(C1, calculation('Strip')), withId(C2, calculation('Clip'))] })
  it.each<[string, Partial<RemainingFacts>, string[]]>([
    ['no calculation', { doc: documentOf({ analysis: [paragraph('Later.')] }), results: {} }, ['no-calculation 1']],
    ['one without a result', { doc: two }, ['results 1']],
    ['two that fail', { doc: two, results: { [C1]: { ok: false, faults: [] }, [C2]: { ok: false, faults: [] } } }, ['results 2']],
    ['one without a title', { doc: documentOf({ analysis: [withId(C1, calculation('  '))] }) }, ['titles 1']],
    ['a plain stop', { results: { [C1]: evaluation(guard('a', 'stop')) } }, ['stops 1']],
    ['a plain stop, answered all the same', { results: { [C1]: evaluation(guard('a', 'stop')) }, answers: [answer('a')] }, ['stops 1']],
    ['a marked stop', { results: { [C1]: evaluation(guard('a', 'stop', true)) } }, ['deviations 1']],
    ['a marked stop with its deviation', { results: { [C1]: evaluation(guard('a', 'stop', true)) }, answers: [answer('a', { kind: 'deviation' })] }, []],
    ['two cautions', { results: { [C1]: evaluation(guard('a', 'caution'), guard('b', 'caution')) } }, ['cautions 2']],
    ['a caution with its answer', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a')] }, []],
    ['an answer that lapsed', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a', { lapsed: 'the ratio moved' })] }, ['cautions 1']],
    ['an answer that was declined', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a', declined)] }, ['cautions 1']],
    ['the answer of another calculation', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a', { calcId: C2 })] }, ['cautions 1']],
    ['information', { results: { [C1]: evaluation(guard('a', 'information')) } }, []],
    ['loose numbers of each verdict', { loose: [loose('agreeing'), loose('ambiguous'), loose('unrelated'), loose('disagreeing')] }, ['disagreeing 1', 'loose 3']],
    ['loose numbers that were explained', { loose: [loose('agreeing', true), loose('disagreeing', true)] }, []],
    ['an empty section', { doc: documentOf({ scope: [paragraph()] }) }, ['sections 1']],
    ['guidance left standing', { doc: documentOf({ scope: [paragraph(TEMPLATE.find(s => s.key === 'scope')!.guidance)] }) }, ['sections 1']],
    ['a reason not written', { doc: documentOf({ notApplicable: { ...settled, loads: ' ' } }) }, ['sections 1']],
    ['a tie to nothing', { doc: documentOf({ scope: [paragraph('J = ', tied(C2, 'J'))] }) }, ['ties 1']],
    ['a tie to no result', { doc: documentOf({ scope: [paragraph('J = ', tied(C1, 'Gamma'))] }) }, ['ties 1']],
    ['no line in the revision record', { changeNoted: false }, ['change-note 1']],
  ])('%s', (_, change, left) => {
    expect(submit(change)).toEqual(left)
    // What hinders submission hinders the pass too.
    expect(pass({ ticks: [tick(C1), tick(C2)], ...change })).toEqual(expect.arrayContaining(left))
  })

  it('says where to go, and speaks of one or of many', () => {
    const lists = remaining(facts({ results: { [C1]: evaluation(guard('a', 'caution'), guard('b', 'caution'), guard('c', 'stop')) }, loose: [loose('unrelated')] }))
    expect(lists.submit).toEqual([
      { id: 'stops', text: 'One stop', count: 1, target: { calcId: C1 } },
      { id: 'cautions', text: '2 cautions without an answer', count: 2, target: { calcId: C1 } },
      { id: 'loose', text: 'One loose number to tie or explain', count: 1, target: { blockId: testId(9) } },
    ])
  })
})

describe('before the pass', () => {
  it.each<[string, Partial<RemainingFacts>, string[]]>([
    ['a calculation not ticked', { ticks: [] }, ['ticks 1']],
    ['a tick that lapsed', { ticks: [tick(C1, false)] }, ['ticks 1']],
    ['the tick of a calculation that is gone', { ticks: [tick(C2)] }, ['ticks 1']],
    ['an answer to judge', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a')] }, ['judgements 1']],
    ['an answer that was accepted', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a', accepted)] }, []],
    ['a declined answer, which must be written anew and judged', { results: { [C1]: evaluation(guard('a', 'caution')) }, answers: [answer('a', declined)] }, ['cautions 1', 'judgements 1']],
    ['a deviation to judge', { results: { [C1]: evaluation(guard('a', 'stop', true)) }, answers: [answer('a', { kind: 'deviation' })] }, ['judgements 1']],
    ['an answer whose guard does not fire any more', { answers: [answer('gone')] }, []],
    ['remarks open and answered', { remarks: [remark(1, 'open'), remark(2, 'answered'), remark(3, 'closed')] }, ['remarks 2']],
    ['a remark that lost its place', { remarks: [remark(1, 'answered', 'orphaned')] }, ['remarks 1']],
    ['items to fill, to fill again, and not OK', { sheet: [item(1, null), item(2, 'ok', true), item(3, 'not ok'), item(4, 'not applicable')] }, ['sheet 2', 'not-ok 1']],
    ['an item not OK of an earlier content is to fill again', { sheet: [item(3, 'not ok', true)] }, ['sheet 1']],
  ])('%s', (_, change, left) => {
    expect(pass(change)).toEqual(left)
  })

  it('does not ask of the analyst what is the checker\'s', () => {
    expect(submit({ ticks: [], remarks: [remark(1, 'open')], sheet: [item(1, null)] })).toEqual([])
  })
})

describe('before release', () => {
  it.each<[string, boolean | null, string[]]>([['before a pass', null, []], ['as it was passed', true, []], ['another content', false, ['content 1']]])('%s', (_, contentAsPassed, left) => {
    expect(named(remaining(facts({ contentAsPassed })).release)).toEqual(left)
  })
})
