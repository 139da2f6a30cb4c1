import type { Evaluation } from '#shared/calc/types'

/** Everything a printed issue shows, as plain data. Times are ISO 8601 in UTC. */
export interface NotePdfData {
  number: string
  letter: string
  /** As printed: `released`, `draft`, `in check`, … */
  state: string
  title: string
  part: string
  drawingIssue: string
  project: { code: string, name: string, basis: string }
  /** Name of the organisation, at the head of the cover. */
  organisation: string | null
  changeNote: string
  save: number
  engineVersion: string
  /** SHA-256 of the frozen parts; null while there is none. */
  contentHash: string | null
  /** The frozen parts as the canonical text that was hashed; attached as a file of its own. */
  frozen: string | null
  /** Analyst, checker and approver, in this order; a part not yet played has no `at`. */
  people: PdfPerson[]
  /** Who else contributed. */
  contributors: string[]
  /** All issues of the note, the newest first, this one included. */
  revisions: PdfRevision[]
  /** The ProseMirror document. */
  document: unknown
  results: Record<string, Evaluation>
  answers: PdfAnswer[]
  loose: PdfDecision[]
  ticks: PdfTick[]
  checkSheet: PdfCheckItem[]
  /** Pictures by the id of their file. */
  figures: Record<string, PdfFigure>
  demonstration: boolean
  /** A print of an issue that is not released: marked on every page, and not signed. */
  uncontrolled: boolean
  /** The moment the print was asked for; the file's dates and the claimed time of the signature. */
  createdAt: string
}

export interface PdfPerson {
  role: 'Analyst' | 'Checker' | 'Approver'
  /** Null while nobody is named. */
  name: string | null
  at: string | null
  save: number | null
}

export interface PdfRevision {
  letter: string
  state: string
  releasedAt: string | null
  change: string
  /** Least margin and its mode; null where nothing was loaded. */
  leastMargin: number | null
  leastMarginMode: string | null
}

export interface PdfAnswer {
  calcId: string
  guardKey: string
  kind: 'answer' | 'deviation'
  text: string
  author: string
  at: string
  judged: { accepted: boolean, by: string, at: string, note: string } | null
  approved: { by: string, at: string } | null
}

/** A loose number that stays as typed, and why. */
export interface PdfDecision { blockId: string, text: string, reason: string, by: string, at: string }
export interface PdfTick { calcId: string, by: string, at: string, save: number }
export interface PdfCheckItem {
  item: number
  text: string
  verdict: 'ok' | 'not ok' | 'not applicable' | null
  evidence: string
  by: string | null
  at: string | null
}
export interface PdfFigure { mime: string, bytes: Uint8Array }
