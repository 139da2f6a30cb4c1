/** What the lists of the application answer: worklist, people, projects, trail, caught mail. */
import type { IssueState } from '#shared/review/states'
import type { projectRoles } from '#shared/schemas/people'

export type ProjectRole = (typeof projectRoles)[number]

export interface Me {
  id: string, name: string, email: string, auditor: boolean, administrator: boolean
  projects: { id: string, code: string, name: string, roles: ProjectRole[] }[]
  /** How many issues wait for this person. */
  waiting: number
  demonstration: boolean
}

export interface WorklistItem {
  issueId: string, number: string, letter: string, title: string
  project: { code: string, name: string }
  state: IssueState
  /** A sentence: what is asked of this person, and why now. */
  why: string
  since: string
  leastMargin: number | null
  leastMarginMode?: string | null
  cautions: number
  /** What they would press there: `write`, `check`, `release` … */
  act: string
}

export interface PersonRow {
  id: string, name: string, email: string, auditor: boolean, administrator: boolean, disabled: boolean, hasPassword: boolean
  projects: { code: string, roles: ProjectRole[] }[]
}

export interface ProjectRow {
  id: string, code: string, name: string, notePattern: string, basis: string, criteria: string, noteCount: number
  members: { person: { id: string, name: string }, roles: ProjectRole[] }[]
}

export interface TrailRow {
  seq: number, chain: string, chainLabel: string, at: string
  actor: { id: string, name: string } | null
  act: string, outcome: 'done' | 'refused'
  subject: { type: string, id: string, label: string }
  /** Canonical JSON, as it was hashed. */
  old: string | null, new: string | null, reason: string | null
  hash: string
}
export interface ChainRow { chain: string, label: string, rows: number }
export interface ChainVerdict { ok: boolean, rows: number, firstBad: number | null, fault: string | null, head: string }

export interface CaughtMailRow { id: string, at: string, to: string, subject: string }
export interface CaughtMail extends CaughtMailRow { from: string, text: string, html: string }

/** Who may sign in to the demonstration; `people` is empty in production. */
export interface Demonstration { demonstration: boolean, people: { name: string, email: string, duty: string, password: string }[] }
