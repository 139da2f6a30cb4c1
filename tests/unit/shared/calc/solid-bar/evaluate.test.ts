/** The solid bar as an analyst gives it, against the values of its methods. */
import { describe, expect, it } from 'vitest'
import { quantity } from '../../../../factories/open-section'
import { flatShaftInputs, inchBarInputs, solidBarInputs, solidBarShapes } from '../../../../factories/solid-bar'
import { evaluateSolidBar } from '#shared/calc/kinds/solid-bar/evaluate'
import type { SolidBarInputs } from '#shared/calc/kinds/solid-bar/schema'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateSolidBar(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value
const guards = (inputs: unknown) => resultOf(inputs).guards.map(g => g.key)
const faults = (inputs: unknown) => {
  const evaluation = evaluateSolidBar(inputs)
  return evaluation.ok ? [] : evaluation.faults
}

describe('values', () => {
  it('gives stress, twist and margins of a round bar', () => {
    const inputs = solidBarInputs()
    // C-01, C-02 of the methods reference.
    expect(value(inputs, 'J')).toBeCloseTo(164895.91520162107, 6)
    expect(value(inputs, 'tau_max@T')).toBeCloseTo(43.66390756979296, 9)
    // θ = T L/GJ by hand.
    expect(value(inputs, 'twist@T')).toBeCloseTo(400e3 * 300 / (26_900 * 164895.91520162107), 12)
    // MS = Fsu/(1.5 τ) − 1.
    expect(value(inputs, 'MS:shear-ultimate')).toBeCloseTo(265 / (1.5 * 43.66390756979296) - 1, 10)
  })
  it('judges each case at its temperature and level: the hot one has its knock-down, the ultimate one no further factor', () => {
    const result = resultOf(flatShaftInputs())
    const hot = result.margins.find(m => m.mode === 'shear-ultimate' && m.caseId === 'L03')
    // C-109: 40.45319444 MPa at 80 N·m; knock-down 1 − 0.2·80/130 at 100 °C.
    expect(hot?.applied).toBeCloseTo(40.45319444 * 95 / 80, 2)
    expect(hot?.allowable).toBeCloseTo(265 * (1 - 0.2 * 80 / 130), 9)
    expect(result.cases.map(c => c.caseId)).toEqual(['L01', 'L02', 'L03'])
    expect(value(flatShaftInputs(), 'theta@L02')).toBeLessThan(0)
  })
  it('shows remembered formulas beside the values used', () => {
    const compared = resultOf(inchBarInputs()).compared ?? []
    expect(compared.map(c => c.key)).toEqual(['J', 'tau'])
    for (const { used, compared: other } of compared) expect(Math.abs(other / used - 1)).toBeLessThan(0.005)
  })
  it('takes an imposed rate of twist', () => {
    const inputs: SolidBarInputs = { ...solidBarInputs(), loading: { by: 'rate', cases: [{ id: 'R1', title: '', source: '', level: 'limit', temperature: null, rate: quantity('1e-4', 'rad/mm') }] } }
    expect(value(inputs, 'T@R1')).toBeCloseTo(26_900 * 164895.91520162107 * 1e-4, 3)
  })
  it.each(Object.entries(solidBarShapes()))('draws and works through %s', (_, inputs) => {
    const result = resultOf(inputs)
    expect(result.drawing?.shapes.length).toBeGreaterThan(2)
    expect(result.working.length).toBeGreaterThan(3)
  })
})

describe('guards and faults', () => {
  it('tells a re-entrant apex, a short bar, a taper and two special factors', () => {
    expect(guards(solidBarInputs({ by: 'sector', radius: quantity('20', 'mm'), angle: quantity('270', '°') }))).toContain('G-10:apex')
    expect(guards({ ...solidBarInputs(), length: quantity('30', 'mm') })).toContain('G-39')
    expect(guards(solidBarInputs())).not.toContain('G-39')
    expect(guards(inchBarInputs())).toEqual(expect.arrayContaining(['G-36', 'G-38', 'G-27:repeated']))
  })
  it('puts each fault at its field', () => {
    expect(faults({ ...solidBarInputs(), material: 'none' })[0]?.path).toBe('material')
    expect(faults(solidBarInputs({ by: 'tube', outer: quantity('20', 'mm'), inner: quantity('25', 'mm') }))[0]).toMatchObject({ path: 'shape', message: expect.stringContaining('inside radius') as string })
    expect(faults(solidBarInputs({ by: 'circle', radius: quantity('', 'mm') }))[0]?.path).toBe('shape.radius')
    expect(faults({ ...solidBarInputs(), more: 1 })).not.toEqual([])
  })
})
