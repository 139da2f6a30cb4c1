import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { alongGuards } from '#shared/calc/kinds/torque-along-bar/guards'
import { alongOutputs, alongPlots, alongTables } from '#shared/calc/kinds/torque-along-bar/outputs'
import { parseTorqueAlongBar } from '#shared/calc/kinds/torque-along-bar/parse'
import { solveTorqueAlongBar } from '#shared/calc/kinds/torque-along-bar/solve'
import { alongWorking } from '#shared/calc/kinds/torque-along-bar/working'
import type { Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateTorqueAlongBar(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseTorqueAlongBar(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveTorqueAlongBar(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'torque-along-bar', methodRevision: METHOD_REVISION, outputs: alongOutputs(s), walls: [], cases: [], tables: alongTables(s), plots: alongPlots(s),
      heads: s.cases.map(({ model: { id, title, source, level, temperature } }) => ({ id, title, source, level, temperature: temperature?.value ?? null })),
      margins: s.margins, governing: s.governing?.key ?? null, guards: alongGuards(s), working: alongWorking(s), drawing: null,
    },
  }
}
