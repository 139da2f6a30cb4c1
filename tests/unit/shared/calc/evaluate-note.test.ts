/** Calculations of a note that take values from one another. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { channelInputs, quantity } from '../../../factories/open-section'
import { loadCasesInputs, materialInputs } from '../../../factories/records'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { NoteCalc } from '#shared/calc/note-links'
import type { Evaluation } from '#shared/calc/types'

const idOf = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`
const calc = (n: number, kind: string, inputs: unknown, title = ''): NoteCalc => ({ id: idOf(n), label: `C${n}`, title, kind, kindVersion: 1, inputs })
const linked = (n: number, key: string) => ({ text: '', unit: 'mm' as const, from: { calculation: idOf(n), key } })
const section = (n: number, over: object = {}) => calc(n, 'open-section', { ...channelInputs(), ...over })
const value = (evaluation: Evaluation | undefined, key: string) => evaluation?.ok ? evaluation.result.outputs.find(o => o.key === key)?.value : undefined
const faults = (evaluation: Evaluation | undefined) => evaluation && !evaluation.ok ? evaluation.faults : []

describe('links between calculations', () => {
  it('takes an output of the same dimension, whatever the order in the note', () => {
    const [first, second] = [section(1, { length: linked(2, 'developed') }), section(2)]
    for (const order of [[first, second], [second, first]]) {
      const { results } = evaluateNote(order)
      expect(value(results[first.id], 'length')).toBe(value(results[second.id], 'developed'))
    }
  })
  it('takes a material and a table of load cases whole from the records of the note', () => {
    const inputs = channelInputs()
    const use = section(1, {
      materials: [{ ...inputs.materials[0]!, Fsu: quantity('1', 'MPa'), record: idOf(2) }],
      loading: { by: 'table', table: idOf(3), quantity: 'T' },
    })
    const { results } = evaluateNote([use, calc(2, 'material', materialInputs()), calc(3, 'load-cases', loadCasesInputs())])
    const result = results[use.id]
    expect(faults(result)).toEqual([])
    expect(value(result, `Fsu:${inputs.materials[0]!.id}`)).toBe(265)
    expect(value(result, 'T@L02')).toBe(-14_000)
    // 90 lbf·in by the definition of the pound-force and the inch.
    expect(value(result, 'T@L03')).toBeCloseTo(90 * 112.9848290276167, 9)
  })
  it('names the members of a circle, and says of those behind it that they are not evaluated', () => {
    const round = [section(1, { length: linked(3, 'length') }), section(2, { length: linked(1, 'length') }), section(3, { length: linked(2, 'length') })]
    const behind = section(4, { length: linked(2, 'length') })
    const { results } = evaluateNote([...round, behind])
    expect(faults(results[idOf(1)])[0]).toMatchObject({ path: 'length', message: expect.stringContaining('C1 → C3 → C2 → C1') })
    expect(faults(results[idOf(2)])[0]?.message).toContain('C2 → C1 → C3 → C2')
    expect(faults(results[idOf(4)])[0]?.message).toContain('Not evaluated, because C2')
  })
  it('says what to do when the source is gone, lost its value, or has another dimension', () => {
    expect(faults(evaluateNote([section(1, { length: linked(9, 'J') })]).results[idOf(1)])[0]?.message).toContain('no longer in the note')
    expect(faults(evaluateNote([section(1, { length: linked(2, 'tau_max@L77') }), section(2)]).results[idOf(1)])[0]?.message).toContain('“tau_max@L77”')
    expect(faults(evaluateNote([section(1, { length: linked(2, 'J') }), section(2)]).results[idOf(1)])[0]?.message).toContain('another dimension')
  })
})

describe('recomputation', () => {
  const table = (torque: string) => calc(9, 'load-cases', { ...loadCasesInputs(), rows: [{ ...loadCasesInputs().rows[0]!, cells: [torque, '0'] }] })
  const note = (torque: string) => [table(torque), section(1, { loading: { by: 'table', table: idOf(9), quantity: 'T' } }), section(2), section(3, { length: linked(2, 'developed') })]
  const before = (calculations: NoteCalc[]) => {
    const { results } = evaluateNote(calculations)
    const byId = new Map(calculations.map(c => [c.id, c]))
    return { byId, results, sameInputs: (c: NoteCalc) => JSON.stringify(c.inputs) === JSON.stringify(byId.get(c.id)?.inputs) }
  }
  it('computes only what depends on the change', () => {
    expect(evaluateNote(note('13'), before(note('12.5'))).computed).toEqual([idOf(9), idOf(1)])
    expect(evaluateNote(note('12.5'), before(note('12.5'))).computed).toEqual([])
  })
  it('gives the same in parts as in whole, in any order', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 40 }), fc.shuffledSubarray([0, 1, 2, 3], { minLength: 4 }), (torque, order) => {
      const now = note(String(torque))
      const whole = evaluateNote(now).results
      expect(evaluateNote(now, before(note('12.5'))).results).toEqual(whole)
      expect(evaluateNote(order.flatMap(i => now[i] ?? [])).results).toEqual(whole)
    }), { numRuns: 60 })
  })
})
