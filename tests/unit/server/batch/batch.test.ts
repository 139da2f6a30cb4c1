import { describe, expect, it } from 'vitest'
import { evaluateBatch } from '#server/batch/evaluate-batch'
import { inputSchema } from '#server/batch/input-schema'
import { readBatch, type Batch } from '#server/batch/read-batch'
import { calcKind, calcKindNames, gathers } from '#shared/calc/registry'
import { allSamples } from '../../../factories/calc-samples'
import { stripInputs } from '../../../factories/open-section'
import { loadCasesInputs } from '../../../factories/records'

function read(value: unknown): Batch {
  const result = readBatch(JSON.stringify(value))
  if (!result.ok) throw new Error(JSON.stringify(result.faults))
  return result.batch
}
const faultsOf = (value: unknown) => {
  const result = readBatch(typeof value === 'string' ? value : JSON.stringify(value))
  return result.ok ? [] : result.faults.map(({ calculation, path }) => ({ calculation, path }))
}
const strip = { kind: 'open-section', title: 'Strip', inputs: stripInputs() }

describe('a batch', () => {
  it('evaluates every sample of every kind as a note does', () => {
    const { answers, faults } = evaluateBatch(read(allSamples().map(({ kind, name, inputs }) => ({ kind, title: name, inputs }))), { working: true })
    expect(faults).toEqual([])
    for (const [i, { kind, inputs }] of allSamples().entries()) {
      // What gathers from the others differs alone.
      if (gathers(kind)) continue
      const evaluation = calcKind(kind).evaluate(inputs)
      const answer = answers[i]
      if (!evaluation.ok || !answer?.ok) throw new Error(`${kind} was refused`)
      expect(answer.outputs.map(o => [o.key, o.value])).toEqual(evaluation.result.outputs.map(o => [o.key, o.value]))
      expect(answer.guards).toEqual(evaluation.result.guards)
      expect(answer.working).toEqual(evaluation.result.working)
    }
  })

  it('gives every number in engine units and as shown (J = 60·2³/3 before ends, algebra)', () => {
    const [answer] = evaluateBatch(read(strip), { working: false }).answers
    if (!answer?.ok) throw new Error('refused')
    expect(answer.outputs.find(o => o.key === 'J_plain')).toMatchObject({ dimension: 'inertia', unit: 'mm⁴', value: expect.closeTo(160, 10), shown: { unit: 'mm⁴', text: '160.00\u2009mm⁴' }, method: '§1.9' })
    expect(answer.outputs.find(o => o.dimension === 'torque')).toMatchObject({ unit: 'N·mm', value: 1000, shown: { unit: 'N·m', value: 1 } })
    expect('working' in answer).toBe(false)
  })

  it('lets one calculation take its loads from another', () => {
    const id = '0b0f7a52-3d1e-4c55-9a53-6f2f7f6a1d10'
    const { answers } = evaluateBatch(read([
      { id, kind: 'load-cases', inputs: loadCasesInputs() },
      { ...strip, inputs: { ...stripInputs(), loading: { by: 'table', table: id, quantity: 'T' } } },
    ]), { working: false })
    expect(answers.map(answer => answer.ok)).toEqual([true, true])
  })

  it('keeps the other results when one calculation is refused', () => {
    const { answers, faults } = evaluateBatch(read([strip, { ...strip, title: 'Thin', inputs: { ...stripInputs(), length: { text: '1,5', unit: 'mm' } } }, { ...strip, kindVersion: 9 }]), { working: false })
    expect(answers.map(answer => answer.ok)).toEqual([true, false, false])
    expect(faults.map(({ calculation, title, path }) => ({ calculation, title, path }))).toEqual([{ calculation: 2, title: 'Thin', path: 'inputs.length' }, { calculation: 3, title: 'Strip', path: 'kindVersion' }])
  })
})

describe('bad input', () => {
  it.each([
    ['no JSON', '{"kind":', [{ calculation: null, path: '' }]],
    ['nothing at all', '', [{ calculation: null, path: '' }]],
    ['an empty list', [], [{ calculation: null, path: '' }]],
    ['a number', 3, [{ calculation: 1, path: '' }]],
    ['an unknown kind', [strip, { kind: 'beam', inputs: {} }], [{ calculation: 2, path: 'kind' }]],
    ['no inputs', { kind: 'open-section' }, [{ calculation: 1, path: 'inputs' }]],
    ['a name that is not taken', { ...strip, input: {} }, [{ calculation: 1, path: '' }]],
    ['an id twice', [{ ...strip, id: '0b0f7a52-3d1e-4c55-9a53-6f2f7f6a1d10' }, { ...strip, id: '0b0f7a52-3d1e-4c55-9a53-6f2f7f6a1d10' }], [{ calculation: 2, path: 'id' }]],
  ])('%s is told with its place', (_, given, faults) => expect(faultsOf(given)).toEqual(faults))
})

describe('the published schema', () => {
  it.each(calcKindNames())('of %s is plain JSON with words and units in it', (kind) => {
    const schema = inputSchema(kind)
    expect(schema).toMatchObject({ type: 'object', additionalProperties: false, title: expect.stringContaining(kind) })
    expect(JSON.parse(JSON.stringify(schema))).toEqual(schema)
  })

  it('lists the units of a field', () => {
    expect(JSON.stringify(inputSchema('open-section'))).toContain('"unit":{"type":"string","enum":["mm"')
  })
})
