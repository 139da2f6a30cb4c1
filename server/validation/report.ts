import { chapters } from '#reference/method-sections'
import { METHOD_REVISION } from '#shared/calc/method'
import { ENGINE_VERSION } from '#shared/calc/registry'
import type { ValidationCase, ValidationReport, ValidationSummary } from '#shared/schemas/validation'

/** Order of sections: by their numbers, what has none last. */
function bySection(a: ValidationCase, b: ValidationCase): number {
  const [x = [], y = []] = [a, b].map(one => one.section.split('.').map(part => Number.isNaN(Number(part)) ? Infinity : Number(part)))
  const [chapter, section] = [0, 1].map(i => (x[i] ?? 0) === (y[i] ?? 0) ? 0 : (x[i] ?? 0) - (y[i] ?? 0))
  return chapter || section || 0
}

/** How far a run is: what was judged of how many cases, and how it ended. */
export interface RunState { state: ValidationSummary['state'], rows: readonly ValidationCase[], cases: number, reason: string | null, finishedAt: string | null }

const runtime = `Node.js ${process.versions.node} (V8 ${process.versions.v8}), ${process.platform} ${process.arch}`

export function summarise({ state, rows, cases, reason, finishedAt }: RunState): ValidationSummary {
  return { state, engine: ENGINE_VERSION, methodRevision: METHOD_REVISION, judged: rows.length, cases, failed: rows.filter(row => !row.agrees).length, reason, finishedAt, runtime }
}

/** The cases in the order of the methods reference, counted by chapter. */
export function report(run: RunState): ValidationReport {
  const rows = [...run.rows].sort(bySection)
  const present = [...new Set(rows.map(row => row.chapter))]
  return {
    ...summarise(run), rows,
    chapters: present.map((chapter) => {
      const own = rows.filter(row => row.chapter === chapter)
      return { chapter, title: chapters[chapter] ?? chapter, cases: own.length, failed: own.filter(row => !row.agrees).length }
    }),
  }
}
