import type { CalcResult, Guard } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import type { AnswerView, IssueView, LooseView, RemarkView } from '#shared/schemas/issue-view'
import { guardState, type GuardState } from '~/editor/guard-state'
import { looseId } from '~/editor/plugins/marks'

/** One thing that is about the text, and the place it is about. */
export type SideItem
  = | { kind: 'remark', id: string, remark: RemarkView }
    | { kind: 'loose', id: string, loose: LooseView }
    | { kind: 'guard', id: string, calcId: string, guard: Guard, state: GuardState }

interface Sources {
  issue: Pick<IssueView, 'remarks' | 'loose'>
  calculations: readonly NoteCalculation[]
  resultOf: (id: string) => CalcResult | null
  answerTo: (calcId: string, key: string) => AnswerView | null
}

export function sideItems({ issue, calculations, resultOf, answerTo }: Sources): SideItem[] {
  const guards = calculations.flatMap(({ id }) => (resultOf(id)?.guards ?? [])
    .map(guard => ({ kind: 'guard' as const, id: `${id} ${guard.key}`, calcId: id, guard, state: guardState(guard, answerTo(id, guard.key)) }))
    .filter(item => item.guard.severity !== 'information'))
  return [
    ...issue.remarks.map(remark => ({ kind: 'remark' as const, id: remark.id, remark })),
    ...issue.loose.map(loose => ({ kind: 'loose' as const, id: looseId(loose), loose })),
    ...guards,
  ]
}

/** Whether something is still to be done about it. */
export function isOpen(item: SideItem): boolean {
  if (item.kind === 'remark') return item.remark.state !== 'closed'
  if (item.kind === 'loose') return item.loose.decision === null
  return item.state.open
}

/** Where an item's anchor is drawn: the mark in the text, the guard's line, or the calculation. */
export function anchorSelectors(item: SideItem): string[] {
  if (item.kind === 'guard') return [`[data-guard="${CSS.escape(item.id)}"]`, `#calc-${CSS.escape(item.calcId)}`]
  if (item.kind === 'remark' && item.remark.anchor.kind === 'calculation') return [`#calc-${CSS.escape(item.remark.anchor.calcId)}`]
  const block = item.kind === 'loose' ? item.loose.blockId : item.remark.anchor.kind === 'text' ? item.remark.anchor.blockId : ''
  return [`[data-mark="${CSS.escape(item.id)}"]`, `[data-id="${CSS.escape(block)}"]`, `#calc-${CSS.escape(block)}`]
}
