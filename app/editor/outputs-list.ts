import type { Evaluation, Output } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { showMargin, showQuantity } from '#shared/units/display'

/** One output that can be tied, as the picker shows it. */
export interface Choice { calcId: string, key: string, label: string, from: string, caseId: string, shown: string, output: Output, search: string }

export function outputChoices(calculations: readonly NoteCalculation[], evaluationOf: (calcId: string) => Evaluation | undefined): Choice[] {
  return calculations.flatMap((calculation) => {
    const evaluation = evaluationOf(calculation.id)
    if (!evaluation?.ok) return []
    return evaluation.result.outputs.map((output) => {
      const shown = output.dimension === 'margin' ? showMargin(output.value) : showQuantity(output.value, output.dimension, output.unit)
      const from = `${calculation.label} ${calculation.title}`.trim()
      return {
        calcId: calculation.id, key: output.key, label: output.label, from: calculation.label, caseId: output.caseId ?? '', shown, output,
        search: `${output.label} ${output.key} ${from} ${output.caseId ?? ''} ${output.wall ?? ''} ${shown}`.toLowerCase(),
      }
    })
  })
}

/** Every word that was typed must be in it, in any order. */
export function matching(choices: readonly Choice[], query: string): Choice[] {
  const words = query.toLowerCase().split(/\s+/).filter(Boolean)
  return choices.filter(choice => words.every(word => choice.search.includes(word)))
}
