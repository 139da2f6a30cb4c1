import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { solidBarGuards } from '#shared/calc/kinds/solid-bar/guards'
import { solidBarCompared, solidBarOutputs } from '#shared/calc/kinds/solid-bar/outputs'
import { parseSolidBar } from '#shared/calc/kinds/solid-bar/parse'
import { solidBarSketch } from '#shared/calc/kinds/solid-bar/sketch'
import { solveSolidBar } from '#shared/calc/kinds/solid-bar/solve'
import { solidBarWorking } from '#shared/calc/kinds/solid-bar/working'
import { barCaseRows } from '#shared/calc/parts/bar-cases'
import type { Evaluation } from '#shared/calc/types'

/** Never throws. */
export function evaluateSolidBar(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseSolidBar(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const solved = solveSolidBar(parsed.model)
  if (!solved.ok) return { ok: false, faults: solved.faults }
  const s = solved.solution
  return {
    ok: true,
    result: {
      kind: 'solid-bar', methodRevision: METHOD_REVISION, outputs: solidBarOutputs(s), walls: [], cases: barCaseRows(s.cases, s.margins), compared: solidBarCompared(s),
      margins: s.margins, governing: s.governing?.key ?? null, guards: solidBarGuards(s), working: solidBarWorking(s), drawing: solidBarSketch(s),
    },
  }
}
