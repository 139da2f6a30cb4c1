/**
 * What the server tells the browser of an issue of a note. Presenters on the
 * server make these, the stores and pages read them; nothing else crosses.
 */
import type { Evaluation } from '#shared/calc/types'
import type { IssueState } from '#shared/review/states'
import type { LooseNumber } from '#shared/note/loose-numbers'
import type { Anchor } from '#shared/note/anchors'

export interface PersonRef { id: string, name: string }

/** An act and whether the asker may do it now; `why` is the sentence shown when they may not. */
export interface Ability { can: boolean, why?: string }
export type Act
  = | 'write' | 'answer' | 'submit' | 'recall' | 'return' | 'pass' | 'release' | 'abandon' | 'withdraw' | 'reassign' | 'open-next'
    | 'remark' | 'reply' | 'close-remark' | 'tick' | 'accept' | 'check-sheet' | 'see'
export type Abilities = Record<Act, Ability>

export interface AnswerView {
  id: string, calcId: string, guardKey: string, kind: 'answer' | 'deviation'
  text: string, author: PersonRef, at: string, save: number
  /** Set when values moved, or severity, wall, case, method revision or wording changed. */
  lapsed: string | null
  judged: { accepted: boolean, by: PersonRef, at: string, note: string } | null
  approved: { by: PersonRef, at: string } | null
}
export interface RemarkEntryView { id: string, author: PersonRef, at: string, text: string, proposed: string | null, file: { id: string, name: string } | null }
export interface RemarkView {
  id: string, number: number, state: 'open' | 'answered' | 'closed', anchor: Anchor, anchorState: 'ok' | 'edited' | 'orphaned'
  author: PersonRef, at: string, save: number, entries: RemarkEntryView[], closed: { by: PersonRef, at: string } | null
}
export interface TickView { calcId: string, by: PersonRef, at: string, save: number, holds: boolean }
export interface CheckItemView {
  item: number, text: string, verdict: 'ok' | 'not ok' | 'not applicable' | null, evidence: string
  by: PersonRef | null, at: string | null, lapsed: boolean
}
export interface LooseView extends LooseNumber { decision: { reason: string, by: PersonRef, at: string } | null }
/** One thing that stands between the issue and the next act: `id` is stable, `target` is where to go. */
export interface Remaining { id: string, text: string, count: number, target?: { calcId?: string, blockId?: string, remarkId?: string, sectionKey?: string } }
export interface SignatureView { meaning: 'submitted' | 'passed' | 'released' | 'withdrawn', by: PersonRef, at: string, save: number, contentHash: string, void: string | null }
export interface IssueSummary { id: string, letter: string, state: IssueState, releasedAt: string | null, hasPdf: boolean }

export interface IssueView {
  id: string
  note: { id: string, number: string, project: { id: string, code: string, name: string, basis: string } }
  letter: string
  state: IssueState
  /** Approver has signed and the worker is making the PDF. */
  releasing: boolean
  releaseFailure: string | null
  title: string
  part: string
  drawingIssue: string
  /** What changed in this issue, for the revision record. */
  changeNote: string
  save: number
  savedAt: string
  savedBy: PersonRef
  /** The ProseMirror document as stored. */
  document: unknown
  results: Record<string, Evaluation>
  loose: LooseView[]
  answers: AnswerView[]
  remarks: RemarkView[]
  ticks: TickView[]
  checkSheet: CheckItemView[]
  signatures: SignatureView[]
  people: { analyst: PersonRef | null, checker: PersonRef | null, approver: PersonRef | null, contributors: PersonRef[] }
  /** Who holds the pen: null when nobody does. */
  writer: { person: PersonRef, until: string, you: boolean } | null
  contentHash: string | null
  engineVersion: string
  abilities: Abilities
  /** Per next act, what still stands in its way. */
  remaining: { submit: Remaining[], pass: Remaining[], release: Remaining[] }
  issues: IssueSummary[]
  leastMargin: { ms: number, mode: string, caseId: string, calcId: string } | null
  demonstration: boolean
}

/** Answer to a save. */
export interface SaveAnswer {
  save: number, savedAt: string
  results: Record<string, Evaluation>
  loose: LooseView[]
  answers: AnswerView[]
  remarks: RemarkView[]
  abilities: Abilities
  remaining: IssueView['remaining']
  leastMargin: IssueView['leastMargin']
}
