import type { Evaluation } from '#shared/calc/types'

/** The least margin of a calculation, and what governs it. */
export interface LeastMargin { ms: number, mode: string, caseId: string, place: string }

export type MarginAt
  = | { ok: true, /** Null where nothing is loaded. */ least: LeastMargin | null }
    | { ok: false, reason: string }

/** A calculation without a result has no margin but a reason. */
export function leastMarginOf(evaluation: Evaluation): MarginAt {
  if (!evaluation.ok) return { ok: false, reason: evaluation.faults[0]?.message ?? 'The calculation gives no result.' }
  let least: LeastMargin | null = null
  for (const { ms, modeLabel, caseId, place } of evaluation.result.margins) {
    if (ms !== null && (least === null || ms < least.ms)) least = { ms, mode: modeLabel, caseId, place }
  }
  return { ok: true, least }
}
