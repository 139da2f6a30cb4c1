import type { CalcResult, MarginRow } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'

/** A margin of the note with the calculation it comes from. */
export interface NoteMargin { row: MarginRow, calcId: string, label: string, title: string, key: string }

export function noteMargins(calculations: readonly NoteCalculation[], resultOf: (id: string) => CalcResult | null): NoteMargin[] {
  return calculations.flatMap(calculation => (resultOf(calculation.id)?.margins ?? []).map(row => (
    { row, calcId: calculation.id, label: calculation.label, title: calculation.title, key: `${calculation.id} ${row.key}` })))
}

const size = (margin: NoteMargin) => margin.row.ms ?? Number.POSITIVE_INFINITY
/** Least first; what carries no load stands last. */
export const byMargin = (a: NoteMargin, b: NoteMargin) => size(a) - size(b)

/** The least margin of each mode over all calculations, least first. */
export function leastOfEachMode(margins: readonly NoteMargin[]): NoteMargin[] {
  const least = new Map<string, NoteMargin>()
  for (const margin of margins) {
    const known = least.get(margin.row.mode)
    if (!known || byMargin(margin, known) < 0) least.set(margin.row.mode, margin)
  }
  return [...least.values()].sort(byMargin)
}
