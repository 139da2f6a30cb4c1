/** Whether a recomputed result says the same as a stored one, number by number. */
import type { CalcResult, Evaluation } from '#shared/calc/types'

/** Difference that machines and engine builds may show in the last digits. */
export const RESULT_TOLERANCE = 1e-9

/** One thing that differs: `was` is stored, `now` recomputed; null where it is absent on that side. */
export interface Difference { key: string, was: number | string | null, now: number | string | null }

export function numbersDiffer(a: number, b: number, tolerance = RESULT_TOLERANCE): boolean {
  return Math.abs(a - b) > tolerance * Math.max(Math.abs(a), Math.abs(b))
}

/** Outputs, margins and guards that differ; empty when the results agree. */
export function compareResults(stored: CalcResult, recomputed: CalcResult, tolerance = RESULT_TOLERANCE): Difference[] {
  const revision: Difference[] = stored.methodRevision === recomputed.methodRevision ? [] : [{ key: 'methodRevision', was: stored.methodRevision, now: recomputed.methodRevision }]
  return [
    ...revision,
    ...compareMaps(numbersOf(stored), numbersOf(recomputed), tolerance),
    ...compareMaps(guardsOf(stored), guardsOf(recomputed), tolerance),
  ]
}

/** The same for evaluations: one that has faults and one that has a result differ as a whole. */
export function compareEvaluations(stored: Evaluation, recomputed: Evaluation, tolerance = RESULT_TOLERANCE): Difference[] {
  if (stored.ok && recomputed.ok) return compareResults(stored.result, recomputed.result, tolerance)
  if (!stored.ok && !recomputed.ok) return []
  return [{ key: 'evaluation', was: stored.ok ? 'results' : 'faults', now: recomputed.ok ? 'results' : 'faults' }]
}

function numbersOf(result: CalcResult): Map<string, number | string> {
  const numbers = new Map<string, number | string>(result.outputs.map(o => [o.key, o.value]))
  for (const row of result.margins) numbers.set(`margin ${row.key}`, row.rf ?? 'no load')
  numbers.set('governing', result.governing ?? 'none')
  return numbers
}

const guardsOf = (result: CalcResult) => new Map<string, number | string>(result.guards.map(g => [g.key, g.severity]))

function compareMaps(was: Map<string, number | string>, now: Map<string, number | string>, tolerance: number): Difference[] {
  return [...new Set([...was.keys(), ...now.keys()])].flatMap((key) => {
    const a = was.get(key) ?? null
    const b = now.get(key) ?? null
    const differ = typeof a === 'number' && typeof b === 'number' ? numbersDiffer(a, b, tolerance) : a !== b
    return differ ? [{ key, was: a, now: b }] : []
  })
}
