import type { CalcResult, Evaluation } from '#shared/calc/types'
import type { Solution } from '#shared/calc/kinds/general-outline/solution'
import { generalOutlineGuards } from '#shared/calc/kinds/general-outline/guards'
import { generalOutlineOutputs } from '#shared/calc/kinds/general-outline/outputs'
import { parseGeneralOutline } from '#shared/calc/kinds/general-outline/parse'
import { generalOutlineSketch } from '#shared/calc/kinds/general-outline/sketch'
import { solveGeneralOutline } from '#shared/calc/kinds/general-outline/solve'
import { caseRows, comparedValues, outlineTables } from '#shared/calc/kinds/general-outline/tables'
import { generalOutlineWorking } from '#shared/calc/kinds/general-outline/working'
import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'

/** Typed inputs to results with their working, guards and sketch; or the faults that prevent it. Never throws. */
export function evaluateGeneralOutline(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseGeneralOutline(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveGeneralOutline(parsed.model)
  return solved.ok ? { ok: true, result: present(solved.solution) } : { ok: false, faults: solved.faults }
}

/** Neutral data that the page and the PDF both show. */
function present(s: Solution): CalcResult {
  return {
    kind: 'general-outline', methodRevision: METHOD_REVISION,
    outputs: generalOutlineOutputs(s), walls: [], cases: caseRows(s), tables: outlineTables(s), compared: comparedValues(s),
    margins: s.margins, governing: s.governing?.key ?? null,
    guards: generalOutlineGuards(s), working: generalOutlineWorking(s), drawing: generalOutlineSketch(s),
  }
}
