import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { imposedGuards, imposedOutputs, imposedWorking } from '#shared/calc/kinds/imposed-twist/present'
import { imposedTwistSchema, type ImposedTwistInputs } from '#shared/calc/kinds/imposed-twist/schema'
import { parseImposedTwist, solveImposedTwist } from '#shared/calc/kinds/imposed-twist/solve'
import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { CalcKind, Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateImposedTwist(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseImposedTwist(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveImposedTwist(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'imposed-twist', methodRevision: METHOD_REVISION, outputs: imposedOutputs(s), walls: [], cases: [],
      heads: s.cases.map(({ model: { id, title, source, level, temperature } }) => ({ id, title, source, level, temperature: temperature?.value ?? null })),
      margins: s.margins, governing: s.governing?.key ?? null, guards: imposedGuards(s), working: imposedWorking(s), drawing: null,
    },
  }
}

/** Imposed twist: torque and stress of the part that follows the structure. */
export const imposedTwist: CalcKind<ImposedTwistInputs> = {
  kind: 'imposed-twist',
  version: 1,
  title: 'Imposed twist',
  about: 'Torque and stress of a part that follows the twist of the structure it is attached to.',
  methodRevision: METHOD_REVISION,
  schema: imposedTwistSchema,
  blank: () => {
    const { factors, declarations, materials } = blankBar('SI', blankMaterial('SI'))
    return {
      units: 'SI', section: { by: 'open', J: { text: '', unit: 'mm⁴' }, t: { text: '', unit: 'mm' }, K: null }, material: 'M1',
      Gamma: null, omega: null, offset: null, fibre: null, structure: null, materials, cases: [], factors, declarations,
    }
  },
  evaluate: evaluateImposedTwist,
}
