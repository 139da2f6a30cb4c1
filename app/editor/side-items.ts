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

/** Where an item's anchor is drawn, the best first: the mark in the text, the guard's line, the block, or the calculation. */
export function anchorsOf(item: SideItem): string[] {
  if (item.kind === 'guard') return [`guard ${item.id}`, `calculation ${item.calcId}`]
  if (item.kind === 'remark' && item.remark.anchor.kind === 'calculation') return [`calculation ${item.remark.anchor.calcId}`]
  const block = item.kind === 'loose' ? item.loose.blockId : item.remark.anchor.kind === 'text' ? item.remark.anchor.blockId : ''
  return [`mark ${item.id}`, `block ${block}`, `calculation ${block}`]
}

/** Everything on the sheet that an item may be anchored to, found in one pass: a long note has thousands of both. */
export function anchorsOn(sheet: HTMLElement): Map<string, HTMLElement> {
  const found = new Map<string, HTMLElement>()
  const add = (name: string, element: HTMLElement) => found.has(name) || found.set(name, element)
  for (const element of sheet.querySelectorAll<HTMLElement>('[data-guard], [data-mark], [data-id], [id^="calc-"]')) {
    const { guard, mark, id } = element.dataset
    if (guard !== undefined) add(`guard ${guard}`, element)
    if (mark !== undefined) add(`mark ${mark}`, element)
    if (id !== undefined) add(`block ${id}`, element)
    if (element.id.startsWith('calc-')) add(`calculation ${element.id.slice('calc-'.length)}`, element)
  }
  return found
}
