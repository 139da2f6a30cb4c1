import type { Node } from '@tiptap/pm/model'
import type { CalcResult, MarginRow, Output } from '#shared/calc/types'
import { calculationsOf, type NoteCalculation } from '#shared/note/calculations'
import { numberingOf, type Numbering } from '#shared/note/numbering'
import { readDocument } from '#shared/note/schema'
import { sectionsOf, type NoteSection } from '#shared/note/sections'
import { showQuantity } from '#shared/units/display'
import { parseUnit } from '#shared/units/parse-unit'
import type { NotePdfData } from '#server/pdf/note-pdf-data'

/** A margin with the calculation it stands in. */
export interface PlacedMargin { calculation: NoteCalculation, row: MarginRow }

/** What every part of a print needs to know. */
export interface NoteContext {
  data: NotePdfData
  doc: Node
  sections: NoteSection[]
  calculations: NoteCalculation[]
  numbering: Numbering
  /** All margins of the note, the least first; those without load last. */
  margins: PlacedMargin[]
}

export function noteContext(data: NotePdfData): NoteContext {
  const doc = readDocument(data.document)
  const calculations = calculationsOf(doc)
  const margins = calculations.flatMap(calculation => (resultOf(data, calculation.id)?.margins ?? []).map(row => ({ calculation, row })))
  margins.sort((a, b) => (a.row.ms ?? Infinity) - (b.row.ms ?? Infinity))
  return { data, doc, sections: sectionsOf(doc), calculations, numbering: numberingOf(doc), margins }
}

export function resultOf(data: NotePdfData, calcId: string): CalcResult | null {
  const evaluation = data.results[calcId]
  return evaluation?.ok ? evaluation.result : null
}

/** The least margin of each mode, the least mode first. */
export function leastByMode({ margins }: NoteContext): PlacedMargin[] {
  const modes = new Set<string>()
  return margins.filter(({ row }) => row.loaded && !modes.has(row.mode) && modes.add(row.mode))
}

export const isNegative = (margin: PlacedMargin | undefined): boolean => (margin?.row.ms ?? 0) < 0

/** What a tied value shows; a lost tie says so rather than showing nothing. */
export function tiedText(data: NotePdfData, calcId: string, key: string, unit: string | null): string {
  const output: Output | undefined = resultOf(data, calcId)?.outputs.find(one => one.key === key)
  if (!output) return `[no result ${key}]`
  return showQuantity(output.value, output.dimension, (unit === null ? null : parseUnit(unit)) ?? output.unit)
}
