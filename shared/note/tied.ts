/** What a tied value shows, and which tied values point nowhere. */
import type { Node } from '@tiptap/pm/model'
import type { Evaluation, Output } from '#shared/calc/types'
import type { TiedValue } from '#shared/note/calculations'
import { calculationsOf, tiedValuesOf } from '#shared/note/calculations'
import { showQuantity } from '#shared/units/display'
import { isUnit, unitFits } from '#shared/units/units'
import type { UnitId } from '#shared/units/units'

export type Results = Readonly<Record<string, Evaluation>>

export const MISSING_TEXT = '?missing'

export interface TiedText {
  /** `155.54 mm⁴`, or `?missing`. */
  text: string
  missing: boolean
  /** Read aloud and shown on hover: `Torsion constant`, or why it is missing. */
  label: string
  output: Output | null
}

const missing = (label: string): TiedText => ({ text: MISSING_TEXT, missing: true, label, output: null })

/** The unit asked for, where it can carry the result; else the result's own. */
function unitOf(tied: Pick<TiedValue, 'unit'>, output: Output): UnitId {
  return tied.unit !== null && isUnit(tied.unit) && unitFits(tied.unit, output.dimension) ? tied.unit : output.unit
}

/** What a tied value shows with these results. */
export function tiedText(tied: Pick<TiedValue, 'calcId' | 'key' | 'unit'>, results: Results): TiedText {
  const evaluation = Object.hasOwn(results, tied.calcId) ? results[tied.calcId] : undefined
  if (!evaluation) return missing('The calculation it was tied to is not in the note.')
  if (!evaluation.ok) return missing('The calculation it is tied to cannot be computed.')
  const output = evaluation.result.outputs.find(({ key }) => key === tied.key)
  if (!output) return missing('The calculation no longer gives this result.')
  return { text: showQuantity(output.value, output.dimension, unitOf(tied, output)), missing: false, label: output.label, output }
}

export interface BrokenTie extends TiedValue { reason: string }

/** Tied values that show `?missing`: they stand in the way of submission. */
export function brokenTies(doc: Node, results: Results): BrokenTie[] {
  const present = new Set(calculationsOf(doc).map(({ id }) => id))
  return tiedValuesOf(doc).flatMap((tied) => {
    const shown = present.has(tied.calcId) ? tiedText(tied, results) : missing('The calculation it was tied to is not in the note.')
    return shown.missing ? [{ ...tied, reason: shown.label }] : []
  })
}
