import { closedSectionGuards } from '#shared/calc/kinds/closed-section/guards'
import { closedSectionOutputs } from '#shared/calc/kinds/closed-section/outputs'
import { parseClosedSection } from '#shared/calc/kinds/closed-section/parse'
import { closedSectionSketch } from '#shared/calc/kinds/closed-section/sketch'
import { solveClosedSection } from '#shared/calc/kinds/closed-section/solve'
import { closedCaseRows, closedCompared, closedSectionTables } from '#shared/calc/kinds/closed-section/tables'
import { closedSectionWorking } from '#shared/calc/kinds/closed-section/working'
import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import type { Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateClosedSection(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseClosedSection(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveClosedSection(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'closed-section', methodRevision: METHOD_REVISION, outputs: closedSectionOutputs(s), walls: [], cases: closedCaseRows(s), tables: closedSectionTables(s), compared: closedCompared(s),
      margins: s.margins, governing: s.governing?.key ?? null, guards: closedSectionGuards(s), working: closedSectionWorking(s), drawing: closedSectionSketch(s),
    },
  }
}
