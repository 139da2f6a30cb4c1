/** What the calculations of a large note cost: all of them, those that follow one changed load, and none. */
import { bench, describe } from 'vitest'
import { evaluateDocument } from '#server/notes/evaluate-document'
import { calculationsOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { ENGINE_VERSION } from '#shared/calc/registry'
import { calculatedNote, calculationId } from '../factories/calculated-note'

describe('two hundred calculations', () => {
  const calculations = calculationsOf(readDocument(calculatedNote(200, 1)))
  const { results } = evaluateDocument(calculations)
  const before = { calculations, results, engineVersion: ENGINE_VERSION }
  const changed = calculations.map(one => (one.id === calculationId(0) ? { ...one, inputs: JSON.parse(JSON.stringify(one.inputs).replace('"10"', '"11"')) as unknown } : one))
  bench('all computed', () => void evaluateDocument(calculations), { iterations: 5 })
  bench('one load changed, and the five bars that take it', () => void evaluateDocument(changed, before), { iterations: 5 })
  bench('nothing changed', () => void evaluateDocument(calculations, before), { iterations: 5 })
})
