/** Torque along a bar as an analyst gives it. */
import { describe, expect, it } from 'vitest'
import { quantity } from '../../../../factories/open-section'
import { inchShaftInputs, sharedShaftInputs, steppedShaftInputs } from '../../../../factories/torque-along-bar'
import { evaluateTorqueAlongBar } from '#shared/calc/kinds/torque-along-bar/evaluate'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateTorqueAlongBar(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value ?? Number.NaN
const guards = (inputs: unknown) => resultOf(inputs).guards.map(g => g.key)
const faults = (inputs: unknown) => {
  const evaluation = evaluateTorqueAlongBar(inputs)
  return evaluation.ok ? [] : evaluation.faults.map(f => f.path)
}

describe('torque along a bar', () => {
  it('gives torques, twist and stress of a stepped shaft', () => {
    const inputs = steppedShaftInputs()
    // C-88 of the methods reference.
    expect(value(inputs, 'phi:3@L01')).toBeCloseTo(0.034720475337194655, 12)
    expect([value(inputs, 'T:a@L01'), value(inputs, 'T:b@L01'), value(inputs, 'T:c@L01')].map(T => Math.round(T))).toEqual([150_000, 30_000, 80_000])
    // 16 T/π d³ by hand.
    expect(value(inputs, 'tau:c@L01')).toBeCloseTo(16 * 80_000 / (Math.PI * 8000), 8)
    expect(value(inputs, 'R:0@L01')).toBeCloseTo(-150_000, 6)
    expect(value(inputs, 'MS:shear-ultimate')).toBeCloseTo(390 / (1.5 * 16 * 80_000 / (Math.PI * 8000)) - 1, 8)
  })
  it('shares between two supports by their stiffness', () => {
    const rigid = { ...sharedShaftInputs(), segments: [sharedShaftInputs().segments[0]!, { ...sharedShaftInputs().segments[1]!, section: { by: 'circle' as const, d1: quantity('20', 'mm'), d2: quantity('20', 'mm') } }], supports: [{ node: '0', stiffness: null, clearance: null }, { node: '2', stiffness: null, clearance: null }], cases: [sharedShaftInputs().cases[0]!] }
    // C-86, C-87 of the methods reference.
    expect(value(rigid, 'phi:1@L01')).toBeCloseTo(0.012599574928315633, 12)
    expect(value(rigid, 'R:0@L01')).toBeCloseTo(-197882.73615635178, 5)
  })
  it('draws its diagrams: torque jumps where it is applied', () => {
    const plot = resultOf(sharedShaftInputs()).plots?.find(p => p.key === 'torque')
    expect(plot?.series.map(line => line.name)).toEqual(['L01', 'L02'])
    const [before, after] = plot?.series[0]?.points.filter(([z]) => Math.abs(z - 400) < 1e-9).map(([, T]) => T) ?? []
    expect((before ?? 0) - (after ?? 0)).toBeCloseTo(250_000, 5)
  })
  it('takes a case prescribed at ultimate without a further factor', () => {
    const row = resultOf(inchShaftInputs()).margins.find(m => m.mode === 'shear-ultimate')
    expect(row?.applied).toBeCloseTo(16 * 900 * 112.9848290276167 / (Math.PI * (7 / 8 * 25.4) ** 3), 6)
  })
  it('warns of shares, clearance and steep tapers', () => {
    expect(guards(sharedShaftInputs())).toEqual(expect.arrayContaining(['G-21', 'G-21:clearance']))
    expect(guards(steppedShaftInputs())).not.toContain('G-21')
    const steep = { ...steppedShaftInputs(), segments: [{ ...steppedShaftInputs().segments[0]!, length: quantity('20', 'mm'), section: { by: 'circle' as const, d1: quantity('30', 'mm'), d2: quantity('20', 'mm') } }], cases: [{ ...steppedShaftInputs().cases[0]!, torques: [{ node: '1', T: quantity('10', 'N·m') }] }] }
    expect(guards(steep)).toContain('G-38')
  })
  it('puts each fault at its field', () => {
    const inputs = steppedShaftInputs()
    expect(faults({ ...inputs, supports: [] })).toContain('supports')
    expect(faults({ ...inputs, supports: [{ node: '9', stiffness: null, clearance: null }] })).toContain('supports.0.node')
    expect(faults({ ...inputs, cases: [{ ...inputs.cases[0], torques: [{ node: 'x', T: quantity('1', 'N·m') }] }] })).toContain('cases.0.torques.0.node')
    expect(faults({ ...inputs, segments: [inputs.segments[0], inputs.segments[0]] })).toContain('segments.1.id')
  })
})
