import { isDeepStrictEqual } from 'node:util'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { NoteCalc, Results } from '#shared/calc/note-links'
import { ENGINE_VERSION } from '#shared/calc/registry'
import type { NoteCalculation } from '#shared/note/calculations'

export type { Results }

interface Before { calculations: NoteCalculation[], results: Results, engineVersion: string }

/**
 * Recomputes the calculations of a document in the order of their links; what has the same inputs and the
 * same linked values under the same engine keeps its result.
 */
export function evaluateDocument(calculations: NoteCalculation[], before?: Before): { results: Results, changed: Results } {
  const byId = new Map(before?.calculations.map(c => [c.id, c]))
  const sameInputs = (now: NoteCalc) => {
    const then = byId.get(now.id)
    return then !== undefined && then.kind === now.kind && then.kindVersion === now.kindVersion && isDeepStrictEqual(then.inputs, now.inputs)
  }
  const held = before?.engineVersion === ENGINE_VERSION ? { byId, results: before.results } : null
  const { results, computed } = evaluateNote(calculations, held ? { ...held, sameInputs } : undefined)
  const changed = Object.fromEntries(Object.entries(results).filter(([id, result]) => computed.includes(id) || result !== held?.results[id]))
  return { results, changed }
}

export interface Summary {
  leastMargin: number | null, leastMarginMode: string | null, leastMarginCase: string | null, leastMarginCalc: string | null
  cautions: number, stops: number
}

/** What the register and the cover say of all calculations together. */
export function summaryOf(results: Results): Summary {
  const summary: Summary = { leastMargin: null, leastMarginMode: null, leastMarginCase: null, leastMarginCalc: null, cautions: 0, stops: 0 }
  for (const [calcId, evaluation] of Object.entries(results)) {
    if (!evaluation.ok) continue
    summary.cautions += evaluation.result.guards.filter(g => g.severity === 'caution').length
    summary.stops += evaluation.result.guards.filter(g => g.severity === 'stop').length
    for (const row of evaluation.result.margins) {
      if (row.ms === null || (summary.leastMargin !== null && row.ms >= summary.leastMargin)) continue
      Object.assign(summary, { leastMargin: row.ms, leastMarginMode: row.modeLabel, leastMarginCase: row.caseId, leastMarginCalc: calcId })
    }
  }
  return summary
}
