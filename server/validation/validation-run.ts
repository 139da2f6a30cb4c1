import { referenceRows } from '#reference/rows'
import type { ValidationCase, ValidationReport, ValidationSummary } from '#shared/schemas/validation'
import { serverClock } from '#server/utils/clock'
import { startThread } from '#server/utils/start-thread'
import { report, summarise, type RunState } from './report'

interface Run extends RunState { rows: ValidationCase[] }

// One run for each process: the engine cannot change while it runs.
let run: Run | undefined

/** Says a failure where an operator looks, since nobody may open the page. */
function tell({ state, rows, reason }: Run): void {
  const failed = rows.filter(row => !row.agrees)
  if (state === 'stopped') console.error(`validation broke off: ${reason}`)
  for (const { id, quantity, expected, got, unit, reason: why } of failed) console.error(`validation: ${id} ${quantity}: expected ${expected} ${unit}, got ${got ?? why}`)
}

function begin(): Run {
  const begun: Run = { state: 'running', rows: [], cases: referenceRows.length, reason: null, finishedAt: null }
  const end = (state: Run['state'], reason: string | null) => {
    if (begun.state !== 'running') return
    Object.assign(begun, { state, reason, finishedAt: serverClock().toISOString() })
    tell(begun)
  }
  const thread = startThread('validation/validation-thread')
  thread.on('message', (row: ValidationCase) => begun.rows.push(row))
  thread.once('error', error => end('stopped', error.message))
  thread.once('exit', () => begun.rows.length === referenceRows.length ? end('done', null) : end('stopped', 'The run ended before its last case.'))
  // A server that is told to stop does not wait for its own proof.
  thread.unref()
  return begun
}

/** Begins the run where it has not begun yet. */
export const startValidation = (): void => void (run ??= begin())

/** What the running engine has been held against so far, counted. */
export const validationSummary = (): ValidationSummary => summarise(run ??= begin())

/** The same with every case. */
export const validationReport = (): ValidationReport => report(run ??= begin())
