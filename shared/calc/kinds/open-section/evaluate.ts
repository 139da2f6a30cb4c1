import { noLinks, type Links } from '#shared/calc/links'
import type { CalcResult, Evaluation, Fault } from '#shared/calc/types'
import { openSectionGuards } from '#shared/calc/kinds/open-section/guards'
import { METHOD_REVISION } from '#shared/calc/method'
import { openSectionOutputs } from '#shared/calc/kinds/open-section/outputs'
import { parseOpenSection } from '#shared/calc/kinds/open-section/parse'
import { caseRows, wallRows } from '#shared/calc/kinds/open-section/rows'
import { openSectionSketch } from '#shared/calc/kinds/open-section/sketch'
import type { Solution } from '#shared/calc/kinds/open-section/solution'
import { solveOpenSection } from '#shared/calc/kinds/open-section/solve'
import { openSectionWorking } from '#shared/calc/kinds/open-section/working'

/** Typed inputs to results with their working, guards and sketch; or the faults that prevent it. Never throws. */
export function evaluateOpenSection(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseOpenSection(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveOpenSection(parsed.model)
  if (!solved.ok) return { ok: false, faults: parsed.model.profile ? atProfile(solved.faults) : solved.faults }
  return { ok: true, result: present(solved.solution) }
}

/** The walls of a profile have no fields of their own. */
const atProfile = (faults: Fault[]): Fault[] => faults.map(fault => /^(walls|junctions)\b/.test(fault.path) ? { ...fault, path: 'profile' } : fault)

/** Neutral data that the page and the PDF both show. */
function present(s: Solution): CalcResult {
  return {
    kind: 'open-section', methodRevision: METHOD_REVISION,
    outputs: openSectionOutputs(s), walls: wallRows(s), cases: caseRows(s),
    margins: s.margins, governing: s.governing?.key ?? null,
    guards: openSectionGuards(s), working: openSectionWorking(s), drawing: openSectionSketch(s),
  }
}
