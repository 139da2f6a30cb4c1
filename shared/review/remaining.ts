/**
 * What still stands between an issue and its next act, as sentences with a
 * place to go to. The server refuses by this list; the screens show it.
 */
import type { Node } from '@tiptap/pm/model'
import type { Evaluation, Guard } from '#shared/calc/types'
import { calculationsOf } from '#shared/note/calculations'
import { unfinishedSections } from '#shared/note/sections'
import { brokenTies } from '#shared/note/tied'
import type { AnswerView, CheckItemView, LooseView, Remaining, RemarkView, TickView } from '#shared/schemas/issue-view'

export interface RemainingFacts {
  doc: Node
  results: Readonly<Record<string, Evaluation>>
  answers: readonly AnswerView[]
  loose: readonly LooseView[]
  remarks: readonly RemarkView[]
  ticks: readonly TickView[]
  sheet: readonly CheckItemView[]
  /** The line of the revision record is written. */
  changeNoted: boolean
  /** The content hashes to what the pass was given for; null before a pass. */
  contentAsPassed: boolean | null
}

export interface RemainingLists { submit: Remaining[], pass: Remaining[], release: Remaining[] }

type Target = Remaining['target']

/** One line for all things of one sort; none when there is none. */
function line(id: string, targets: readonly Target[], one: string, many: (count: number) => string): Remaining[] {
  const [first] = targets
  if (targets.length === 0) return []
  return [{ id, text: targets.length === 1 ? one : many(targets.length), count: targets.length, ...(first ? { target: first } : {}) }]
}

interface Fired { calcId: string, guard: Guard, answer: AnswerView | undefined }

function fired({ results, answers }: RemainingFacts): Fired[] {
  return Object.entries(results).flatMap(([calcId, evaluation]) => evaluation.ok
    ? evaluation.result.guards.map(guard => ({ calcId, guard, answer: answers.find(a => a.calcId === calcId && a.guardKey === guard.key) }))
    : [])
}

const at = ({ calcId }: Fired): Target => ({ calcId })
/** An answer stands while it has not lapsed and the checker has not declined it. */
const stands = ({ answer }: Fired) => answer !== undefined && answer.lapsed === null && answer.judged?.accepted !== false

function guardLines(facts: RemainingFacts): Remaining[] {
  const all = fired(facts)
  const stops = all.filter(f => f.guard.severity === 'stop')
  return [
    ...line('stops', stops.filter(f => !f.guard.deviable).map(at), 'One stop', n => `${n} stops`),
    ...line('deviations', stops.filter(f => f.guard.deviable && !stands(f)).map(at), 'One stop without a deviation', n => `${n} stops without a deviation`),
    ...line('cautions', all.filter(f => f.guard.severity === 'caution' && !stands(f)).map(at), 'One caution without an answer', n => `${n} cautions without an answer`),
  ]
}

function calculationLines({ doc, results }: RemainingFacts): Remaining[] {
  const all = calculationsOf(doc)
  const target = ({ id }: { id: string }): Target => ({ calcId: id })
  return [
    ...(all.length === 0 ? [{ id: 'no-calculation', text: 'No calculation yet', count: 1, target: { sectionKey: 'section-analysis' } }] : []),
    ...line('results', all.filter(c => !results[c.id]?.ok).map(target), 'One calculation without a result', n => `${n} calculations without a result`),
    ...line('titles', all.filter(c => c.title.trim() === '').map(target), 'One calculation without a title', n => `${n} calculations without a title`),
  ]
}

function numberLines({ loose }: RemainingFacts): Remaining[] {
  const open = loose.filter(number => number.decision === null)
  const target = ({ blockId }: LooseView): Target => ({ blockId })
  return [
    ...line('disagreeing', open.filter(n => n.verdict === 'disagreeing').map(target), 'One number disagrees with its calculation', n => `${n} numbers disagree with their calculations`),
    ...line('loose', open.filter(n => n.verdict !== 'disagreeing').map(target), 'One loose number to tie or explain', n => `${n} loose numbers to tie or explain`),
  ]
}

function textLines(facts: RemainingFacts): Remaining[] {
  const sections = unfinishedSections(facts.doc)
  return [
    ...line('sections', sections.map(s => ({ sectionKey: s.sectionKey, ...(s.blockId ? { blockId: s.blockId } : {}) })), sections[0]?.message ?? '', n => `${n} sections to write or mark not applicable`),
    ...line('ties', brokenTies(facts.doc, facts.results).map(({ blockId }) => ({ blockId })), 'One tied value has lost its calculation', n => `${n} tied values have lost their calculations`),
    ...(facts.changeNoted ? [] : [{ id: 'change-note', text: 'The revision record does not say what changed', count: 1, target: { sectionKey: 'revisions' } }]),
  ]
}

function checkLines(facts: RemainingFacts): Remaining[] {
  const ticked = new Set(facts.ticks.filter(t => t.holds).map(t => t.calcId))
  const unjudged = fired(facts).filter(f => f.answer && f.guard.severity !== 'information' && f.answer.judged?.accepted !== true)
  const remarks = facts.remarks.filter(r => r.state !== 'closed')
  const notOk = facts.sheet.filter(item => item.verdict === 'not ok' && !item.lapsed)
  const open = facts.sheet.filter(item => item.verdict === null || item.lapsed)
  return [
    ...line('ticks', calculationsOf(facts.doc).filter(c => !ticked.has(c.id)).map(c => ({ calcId: c.id })), 'One calculation to tick', n => `${n} calculations to tick`),
    ...line('judgements', unjudged.map(at), 'One answer or deviation to judge', n => `${n} answers or deviations to judge`),
    ...line('remarks', remarks.map(r => ({ remarkId: r.id })), 'One remark not closed', n => `${n} remarks not closed`),
    ...line('sheet', open.map(() => undefined), 'One item of the check sheet to fill', n => `${n} items of the check sheet to fill`),
    ...line('not-ok', notOk.map(() => undefined), 'One item of the check sheet is not OK', n => `${n} items of the check sheet are not OK`),
  ]
}

/** What stands before submit, pass and release. */
export function remaining(facts: RemainingFacts): RemainingLists {
  const submit = [...calculationLines(facts), ...guardLines(facts), ...numberLines(facts), ...textLines(facts)]
  return {
    submit,
    pass: [...submit, ...checkLines(facts)],
    release: facts.contentAsPassed === false ? [{ id: 'content', text: 'The content is not what the checker passed', count: 1 }] : [],
  }
}
