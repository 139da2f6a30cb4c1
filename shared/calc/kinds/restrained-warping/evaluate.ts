import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { openSectionSketch } from '#shared/calc/kinds/open-section/sketch'
import { comparedTwist, restrainedWarpingPlots, restrainedWarpingTables } from '#shared/calc/kinds/restrained-warping/diagrams'
import { restrainedWarpingGuards } from '#shared/calc/kinds/restrained-warping/guards'
import { restrainedWarpingOutputs } from '#shared/calc/kinds/restrained-warping/outputs'
import { parseRestrainedWarping } from '#shared/calc/kinds/restrained-warping/parse'
import { solveRestrainedWarping } from '#shared/calc/kinds/restrained-warping/solve'
import { restrainedWarpingWorking } from '#shared/calc/kinds/restrained-warping/working'
import type { Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateRestrainedWarping(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseRestrainedWarping(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveRestrainedWarping(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'restrained-warping', methodRevision: METHOD_REVISION, outputs: restrainedWarpingOutputs(s), walls: [], cases: [],
      tables: restrainedWarpingTables(s), plots: restrainedWarpingPlots(s), compared: comparedTwist(s),
      margins: s.margins, governing: s.governing?.key ?? null, guards: restrainedWarpingGuards(s), working: restrainedWarpingWorking(s), drawing: openSectionSketch(s.section),
    },
  }
}
