/** The shape in which a demonstration note is told: who did what, when, and what the text then was. */
import type { DemoSection } from './build-document'
import type { PersonKey, ProjectCode } from './people'

/** Why a typed quantity stays untied: `text` as typed, in the section of that key. */
export interface LooseReason { section: string, text: string, reason: string }

/** Answer to every guard of a calculation whose id matches, `G-02` or `G-02:wall-a`. */
export interface DemoAnswer { calc: string, guard: string, text: string }

export interface DemoRemark {
  by: PersonKey
  at: string
  /** A quote of the text, or the name of a calculation. */
  on: { section: string, quote: string } | { calc: string, field?: string }
  text: string
  replies: { by: PersonKey, at: string, text: string }[]
  closedAt?: string
}

export type DemoAct
  = | { act: 'save', by: PersonKey, at: string, sections: DemoSection[], label?: string }
    | { act: 'metadata', by: PersonKey, at: string, drawingIssue: string, changeNote: string }
    | { act: 'answer', by: PersonKey, at: string, answers: DemoAnswer[] }
    | { act: 'explain', by: PersonKey, at: string, reasons: LooseReason[] }
    | { act: 'submit', by: PersonKey, at: string, checker: PersonKey, approver: PersonKey }
    | { act: 'remark', remark: DemoRemark }
    | { act: 'check', by: PersonKey, at: string, items: DemoCheckItem[] }
    /** Ticks every calculation of the note. */
    | { act: 'tick', by: PersonKey, at: string }
    | { act: 'judge', by: PersonKey, at: string, note: string }
    | { act: 'return', by: PersonKey, at: string, reason: string }
    | { act: 'pass', by: PersonKey, at: string }
    | { act: 'release', by: PersonKey, at: string }

export interface DemoCheckItem { item: number, verdict: 'ok' | 'not ok' | 'not applicable', evidence: string }

export interface DemoNote {
  project: ProjectCode
  /** The counter of its number: 31 gives QSN-19-0031. */
  counter: number
  number: string
  title: string
  part: string
  drawingIssue: string
  createdBy: PersonKey
  createdAt: string
  /** Opens of further issues happen at the first act of each. */
  issues: { letter: string, openedBy: PersonKey, openedAt: string, acts: DemoAct[] }[]
}

/** Several quantities of one section that stay untied for the same reason. */
export const looseRows = (section: string, reason: string, ...texts: string[]): LooseReason[] => texts.map(text => ({ section, text, reason }))
