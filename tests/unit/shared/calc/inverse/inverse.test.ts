/** What it would take: thickness for zero margin, allowable torque, what the margin hangs on. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { channelInputs, lippedChannelInputs, quantity, stripInputs } from '../../../../factories/open-section'
import { solidBarInputs } from '../../../../factories/solid-bar'
import { formFields } from '#shared/calc/form/form-fields'
import { allowableTorques } from '#shared/calc/inverse/allowable-torque'
import { withValue } from '#shared/calc/inverse/changed-inputs'
import { leastMarginOf, type MarginAt } from '#shared/calc/inverse/least-margin'
import { sensitivity } from '#shared/calc/inverse/sensitivity'
import { variablesOf, type Variable } from '#shared/calc/inverse/variables'
import { roundedToPass, zeroMargins } from '#shared/calc/inverse/zero-margin'
import { calcKind } from '#shared/calc/registry'

const marginOf = (kind: string) => (inputs: unknown): MarginAt => leastMarginOf(calcKind(kind).evaluate(inputs))
const variables = (kind: string, inputs: unknown) => variablesOf(formFields(calcKind(kind).schema), inputs)
function named(kind: string, inputs: unknown, label: string | RegExp): Variable {
  const found = variables(kind, inputs).find(one => (typeof label === 'string' ? one.label === label : label.test(one.label)))
  if (!found) throw new Error(`no variable ${String(label)} among ${variables(kind, inputs).map(one => one.label).join('; ')}`)
  return found
}
/** Runs a question to its end. */
function answer<T>(asking: Generator<undefined, T>): T {
  for (;;) {
    const step = asking.next()
    if (step.done) return step.value
  }
}
const ask = (kind: string, inputs: unknown, variable: Variable) => answer(zeroMargins(value => marginOf(kind)(withValue(inputs, variable, value)), variable.value))

describe('the value for zero margin', () => {
  it('of the lipped channel is the thickness that an independent program found: 2.6181 mm for all walls', () => {
    const inputs = lippedChannelInputs()
    const all = named('open-section', inputs, 'Thickness of all walls')
    const { zeros } = ask('open-section', inputs, all)
    expect(zeros).toHaveLength(1)
    expect(zeros[0]?.passesAbove).toBe(true)
    expect(zeros[0]?.value).toBeCloseTo(2.6181, 3)
  })

  it('of a round bar is d = ∛(16·T·n/(π·F)), by hand', () => {
    const bar = { ...solidBarInputs({ by: 'circle', radius: quantity('9', 'mm') }), twistAllowed: null }
    const { zeros, trend } = ask('solid-bar', bar, named('solid-bar', bar, 'Radius'))
    const ultimate = Math.cbrt(16 * 400e3 * 1.5 / (Math.PI * 265)) / 2
    const yielding = Math.cbrt(16 * 400e3 / (Math.PI * 320 / Math.sqrt(3))) / 2
    expect(trend).toBe('rises')
    expect(zeros.map(zero => zero.value)).toEqual([expect.closeTo(Math.max(ultimate, yielding), 8)])
  })

  it('evaluated again gives a margin of zero, and rounded passes', () => {
    fc.assert(fc.property(fc.double({ min: 0.6, max: 6, noNaN: true }), (t) => {
      const strip = stripInputs()
      const inputs = { ...strip, walls: strip.walls.map(wall => ({ ...wall, t: quantity(String(t), 'mm') })) }
      const variable = named('open-section', inputs, /^Thickness/)
      for (const { value, passesAbove } of ask('open-section', inputs, variable).zeros) {
        const at = (x: number) => {
          const margin = marginOf('open-section')(withValue(inputs, variable, x))
          return margin.ok ? margin.least?.ms ?? Number.NaN : Number.NaN
        }
        expect(Math.abs(at(value))).toBeLessThan(1e-9)
        expect(at(roundedToPass(value, passesAbove))).toBeGreaterThanOrEqual(0)
      }
    }), { numRuns: 6 })
  })

  it('is not made up: no crossing in the range is no zero, and a jump is told as one', () => {
    const flat = answer(zeroMargins(() => ({ ok: true, least: { ms: 0.4, mode: 'm', caseId: 'c', place: 'p' } }), 2))
    expect(flat).toMatchObject({ zeros: [], jumps: [], trend: 'flat' })
    const step = answer(zeroMargins(x => ({ ok: true, least: { ms: x < 2.5 ? -0.2 : 0.3, mode: 'm', caseId: 'c', place: 'p' } }), 2))
    expect(step.zeros).toEqual([])
    expect(step.jumps).toEqual([expect.closeTo(2.5, 9)])
    const broken = answer(zeroMargins(x => (x < 1 ? { ok: false, reason: 'too thin' } : { ok: true, least: { ms: x - 3, mode: 'm', caseId: 'c', place: 'p' } }), 2))
    expect(broken).toMatchObject({ reasons: ['too thin'], trend: 'rises', zeros: [{ value: expect.closeTo(3, 9) }] })
    const hump = answer(zeroMargins(x => ({ ok: true, least: { ms: 1 - (x - 2) ** 2, mode: 'm', caseId: 'c', place: 'p' } }), 2))
    expect(hump.trend).toBe('neither')
    expect(hump.zeros.map(zero => [zero.value, zero.passesAbove])).toEqual([[expect.closeTo(1, 9), true], [expect.closeTo(3, 9), false]])
  })

  it.each([[2.61812, true, 2.619], [2.61812, false, 2.618], [2.618, true, 2.618], [2.618, false, 2.618], [0.0123456, true, 0.01235], [1234.5, true, 1235]])('%s passing %s is written %s', (value, above, written) => {
    expect(roundedToPass(value, above)).toBe(written)
  })
})

describe('the allowable torque', () => {
  it('is the one at which the least margin is zero', () => {
    const inputs = { ...stripInputs(), loading: { by: 'torque' as const, torque: quantity('8', 'N·m'), level: 'limit' as const, temperature: null, source: '' } }
    const evaluation = calcKind('open-section').evaluate(inputs)
    if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
    const [allowable] = allowableTorques(evaluation.result)
    const at = marginOf('open-section')({ ...inputs, loading: { ...inputs.loading, torque: quantity(String((allowable?.allowable ?? 0) / 1000), 'N·m') } })
    expect(at.ok && at.least ? at.least.ms : Number.NaN).toBeCloseTo(0, 9)
  })
})

describe('what the margin hangs on', () => {
  it('of a strip: about twice as much on its thickness as on its length, since τ = 3T/(bt²(1 − 0.63 t/b))', () => {
    const inputs = { ...stripInputs(), twistAllowed: null }
    const rows = answer(sensitivity(inputs, variables('open-section', inputs).filter(one => one.dimension === 'length'), 0.001, marginOf('open-section')))
    const effect = (label: RegExp) => rows.find(row => label.test(row.variable.label))?.effect ?? Number.NaN
    const size = (label: RegExp) => rows.find(row => label.test(row.variable.label))?.variable.value ?? Number.NaN
    const slenderness = 0.63 * size(/^Thickness/) / size(/^(x|Length), wall/)
    const ends = slenderness / (1 - slenderness)
    expect(effect(/^Thickness/) / effect(/^(x|Length), wall/)).toBeCloseTo((2 - ends) / (1 + ends), 2)
    expect(rows[0]?.variable.label).toMatch(/^Thickness/)
  })

  it('names every typed number once, and leaves out what is linked', () => {
    const inputs = channelInputs()
    const paths = variables('open-section', inputs).filter(one => one.paths.length === 1).map(one => one.paths[0])
    expect(new Set(paths).size).toBe(paths.length)
    const linked = { ...inputs, walls: inputs.walls.map((wall, i) => (i === 0 ? { ...wall, t: { ...wall.t, from: { calculation: '00000000-0000-4000-8000-000000000001', key: 'd' } } } : wall)) }
    expect(variables('open-section', linked).some(one => one.paths.includes('walls.0.t'))).toBe(false)
  })
})
