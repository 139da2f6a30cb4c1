import { combinedGuards, combinedOutputs, combinedTable, combinedWorking } from '#shared/calc/kinds/combined-stress/present'
import { combinedStressSchema, type CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import { parseCombinedStress, solveCombinedStress } from '#shared/calc/kinds/combined-stress/solve'
import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { CalcKind, Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateCombinedStress(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseCombinedStress(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveCombinedStress(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'combined-stress', methodRevision: METHOD_REVISION, outputs: combinedOutputs(s), walls: [], cases: [], tables: [combinedTable(s)],
      margins: s.rows, governing: s.governing?.key ?? null, guards: combinedGuards(s), working: combinedWorking(s), drawing: null,
    },
  }
}

/** Combined stress: torsion with direct shear and normal stress at one fibre. */
export const combinedStress: CalcKind<CombinedStressInputs> = {
  kind: 'combined-stress',
  version: 1,
  title: 'Combined stress',
  about: 'Torsion with direct shear and normal stress at the same fibre: equivalent stress and interaction as a load multiplier.',
  methodRevision: METHOD_REVISION,
  schema: combinedStressSchema,
  blank: () => {
    const { factors, declarations, materials } = blankBar('SI', blankMaterial('SI'))
    return { units: 'SI', rule: { by: 'circle' }, points: [], materials, factors, declarations }
  },
  evaluate: evaluateCombinedStress,
}
