/**
 * Computes the calculations of a note in the order of their links: what a calculation takes from another
 * is computed first, a circle is named by its members, and a failing source is told where it is used.
 */
import { linksOf } from '#shared/calc/links'
import { circleFault, circleThrough, computeLinked, linkState, type NoteCalc, type NoteState, type Results } from '#shared/calc/note-links'
import { gathers } from '#shared/calc/registry'
import type { Evaluation } from '#shared/calc/types'

/** The save before: a calculation with the same inputs and the same linked values keeps its result. */
export interface Before { sameInputs: (calculation: NoteCalc) => boolean, byId: ReadonlyMap<string, NoteCalc>, results: Results }

export interface Evaluated {
  results: Results
  /** Ids of what was computed now, in the order of computing. */
  computed: string[]
}

export function evaluateNote(calculations: readonly NoteCalc[], before?: Before): Evaluated {
  const state: NoteState = { byId: new Map(calculations.map(c => [c.id, c])), results: {} }
  const computed: string[] = []
  const visiting = new Set<string>()

  function visit(calculation: NoteCalc): void {
    if (calculation.id in state.results || visiting.has(calculation.id)) return
    visiting.add(calculation.id)
    const links = linksOf(calculation.inputs)
    for (const { calculation: id } of links) {
      const source = state.byId.get(id)
      if (source) visit(source)
    }
    visiting.delete(calculation.id)
    const circle = links.length > 0 ? circleThrough(calculation, state.byId) : null
    state.results[calculation.id] = circle ? circleFault(circle, links) : kept(calculation) ?? compute(calculation)
  }
  function kept(calculation: NoteCalc): Evaluation | undefined {
    if (!before?.sameInputs(calculation)) return undefined
    const held = before.results[calculation.id]
    return held && linkState(calculation, before) === linkState(calculation, state) ? held : undefined
  }
  function compute(calculation: NoteCalc): Evaluation {
    computed.push(calculation.id)
    return computeLinked(calculation, state)
  }

  // What gathers from all others comes last, and is made anew: it is cheap, and depends on everything.
  const last = calculations.filter(c => gathers(c.kind))
  calculations.filter(c => !gathers(c.kind)).forEach(visit)
  for (const calculation of last) state.results[calculation.id] = compute(calculation)
  return { results: Object.fromEntries(calculations.map(c => [c.id, state.results[c.id] as Evaluation])), computed }
}
