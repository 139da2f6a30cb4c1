/** The plain facts on which every decision of the review rests. The server gathers them; nothing here asks a database. */
import type { Part, ProjectRole } from '#shared/review/eligibility'
import type { IssueState } from '#shared/review/states'

export interface ReviewFacts {
  issue: {
    letter: string
    state: IssueState
    /** The approver has signed and the worker is making the PDF. */
    releasing: boolean
    /** Who submitted it; while in draft, who opened it. */
    analystId: string | null
    checkerId: string | null
    approverId: string | null
    /** Name of the assigned, for sentences. */
    checkerName: string | null
    approverName: string | null
  }
  note: {
    /** Letter of the issue on its way, this one included. */
    onItsWay: string | null
    /** Letter of the newest issue that is or was released. */
    newestReleased: string | null
  }
  person: {
    id: string
    disabled: boolean
    auditor: boolean
    administrator: boolean
    /** Roles in the project of the note. */
    roles: readonly ProjectRole[]
    /** Part in this issue. */
    part: Part | null
    /** Letters that bar from checking this issue, from `contributedTo`. */
    contributedTo: readonly string[]
  }
  /** Who holds the pen. */
  writer: { id: string, name: string } | null
  /** How many things stand before each act. */
  remaining: { submit: number, pass: number, release: number }
}

/**
 * Why an act is refused. The kind says which status the server answers with:
 * `hidden` 404 · `role`, `part` 403 · `state`, `locked`, `pen`, `remains` 409.
 */
export type RefusalKind = 'hidden' | 'role' | 'part' | 'state' | 'locked' | 'pen' | 'remains'
export interface Refusal { kind: RefusalKind, why: string }
