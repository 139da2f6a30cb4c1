import { expect, it } from 'vitest'
import { lippedChannelInputs } from '../../../factories/open-section'
import { compareEvaluations, compareResults, numbersDiffer } from '#shared/calc/result-compare'
import { evaluateCalculation } from '#shared/calc/registry'
import type { CalcResult } from '#shared/calc/types'

function result(t?: string): CalcResult {
  const evaluation = evaluateCalculation({ kind: 'open-section', kindVersion: 1, inputs: lippedChannelInputs(t) })
  if (!evaluation.ok) throw new Error('the sample has faults')
  return evaluation.result
}

it('calls numbers different beyond 1e-9 of the larger one', () => {
  expect(numbersDiffer(1, 1 + 0.9e-9)).toBe(false)
  expect(numbersDiffer(1, 1 + 1.1e-9)).toBe(true)
  expect(numbersDiffer(0, 0)).toBe(false)
  expect(numbersDiffer(0, 1e-12)).toBe(true)
})
it('finds nothing between a result and its recomputation, and last digits do not count', () => {
  const noisy = result()
  noisy.outputs.forEach((o) => {
    o.value *= 1 + 1e-12
  })
  expect(compareResults(result(), result())).toEqual([])
  expect(compareResults(result(), noisy)).toEqual([])
})
it('names outputs, margins, guards and revision that differ', () => {
  const keys = compareResults(result(), { ...result('2.6'), methodRevision: 'B' }).map(d => d.key)
  expect(keys).toEqual(expect.arrayContaining(['methodRevision', 'J', 'MS:twist@L04', 'margin twist@L04']))
  const without = result()
  const gone = without.outputs.pop()
  expect(compareResults(result(), without)).toEqual([{ key: gone?.key, was: gone?.value, now: null }])
  expect(compareResults(result(), { ...result(), guards: [] }).map(d => d.key)).toContain('G-34:twist')
})
it('compares evaluations with faults as wholes', () => {
  const faulty = { ok: false as const, faults: [{ path: 'walls', message: 'Add a wall.' }] }
  expect(compareEvaluations(faulty, faulty)).toEqual([])
  expect(compareEvaluations({ ok: true, result: result() }, faulty)).toHaveLength(1)
})
