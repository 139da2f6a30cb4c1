import type { Evaluation } from '#shared/calc/types'
import { ENGINE_VERSION, evaluateCalculation } from '#shared/calc/registry'
import { canonicalJson } from '#shared/note/canonical'
import type { NoteCalculation } from '#shared/note/calculations'

export type Results = Record<string, Evaluation>

interface Before { calculations: NoteCalculation[], results: Results, engineVersion: string }

const sameInputs = (a: NoteCalculation, b: NoteCalculation | undefined) =>
  b !== undefined && a.kind === b.kind && a.kindVersion === b.kindVersion && canonicalJson(a.inputs) === canonicalJson(b.inputs)

/** Recomputes the calculations of a document; what has the same inputs under the same engine keeps its result. */
export function evaluateDocument(calculations: NoteCalculation[], before?: Before): { results: Results, changed: Results } {
  const results: Results = {}
  const changed: Results = {}
  const earlier = new Map(before?.calculations.map(c => [c.id, c]))
  for (const calculation of calculations) {
    const kept = before?.engineVersion === ENGINE_VERSION && sameInputs(calculation, earlier.get(calculation.id)) ? before.results[calculation.id] : undefined
    const result = kept ?? evaluateCalculation({ kind: calculation.kind, kindVersion: calculation.kindVersion, inputs: calculation.inputs })
    results[calculation.id] = result
    if (!kept) changed[calculation.id] = result
  }
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
