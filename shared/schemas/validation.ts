/** The engine held against every reference case: what the page, the terminal and the health answer say of it. */

export interface ValidationCase {
  /** Unique among the cases. */
  key: string
  /** Section of the methods reference, `1.9`. */
  section: string
  chapter: string
  /** `C-44`, `§1.10`, or the program that gave it. */
  id: string
  quantity: string
  inputs: string
  unit: string
  expected: number
  source: string
  tolerance: { kind: 'rel' | 'abs', value: number }
  /** Null where the engine refused; then `reason` says why. */
  got: number | null
  /** In the kind of the tolerance: relative to the expected value, or absolute. */
  difference: number | null
  agrees: boolean
  reason: string | null
}

export interface ValidationChapter { chapter: string, title: string, cases: number, failed: number }

export interface ValidationSummary {
  /** `stopped`: the run itself broke off, `reason` says why; what was judged before stands. */
  state: 'running' | 'done' | 'stopped'
  engine: string
  methodRevision: string
  judged: number
  cases: number
  failed: number
  reason: string | null
  /** ISO time of the last case, null while it runs. */
  finishedAt: string | null
  /** What the engine ran on: a validation speaks of that too. */
  runtime: string
}

export interface ValidationReport extends ValidationSummary {
  chapters: ValidationChapter[]
  rows: ValidationCase[]
}
