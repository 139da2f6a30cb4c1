/** Whole calculations as a save computes them: reading what was typed, results, margins, guards, working and sketch. */
import { bench, describe } from 'vitest'
import { evaluateNote } from '#shared/calc/evaluate-note'
import { computeLinked } from '#shared/calc/note-links'
import { calcKind, gathers } from '#shared/calc/registry'
import { allSamples } from '../factories/calc-samples'
import { largeOpenSection, withLargeTable } from '../factories/large-section'

const note = withLargeTable('open-section', largeOpenSection())
const [, section] = note
const state = { byId: new Map(note.map(one => [one.id, one])), results: evaluateNote(note).results }

describe('a hundred walls under a thousand cases', () => {
  bench('open section with margins, guards, working and sketch', () => {
    if (section) computeLinked(section, state)
  })
  bench('the same with its table of cases read anew', () => void evaluateNote(note))
})

/** Every sample but those that solve an outline twice over, which have benchmarks of their own. */
const samples = allSamples().filter(({ kind }) => kind !== 'general-outline' && !gathers(kind))
describe('a note', () => {
  bench(`${samples.length} calculations, the samples of all kinds`, () => {
    for (const { kind, inputs } of samples) calcKind(kind).evaluate(inputs)
  })
})
