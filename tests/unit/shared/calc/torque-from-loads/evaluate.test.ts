/** Torque of offset loads about the shear centre. */
import { describe, expect, it } from 'vitest'
import { quantity } from '../../../../factories/open-section'
import { inchLoadsInputs, webLoadInputs } from '../../../../factories/torque-from-loads'
import { evaluateTorqueFromLoads } from '#shared/calc/kinds/torque-from-loads/evaluate'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateTorqueFromLoads(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value ?? Number.NaN

describe('torque from loads', () => {
  it('takes the moment of every force about the shear centre, with its sign', () => {
    // C-89 of the methods reference: 10 kN in the plane of the web.
    expect(value(webLoadInputs(), 'T@L01')).toBeCloseTo(152380.95238095, 6)
    // By hand: −12 000 − 2200·(30 + 15.238095238095) − 850·(104 − 50) + 400·15.238095238095.
    expect(value(webLoadInputs(), 'T@L02')).toBeCloseTo(-12_000 - 2200 * 45.238095238095 - 850 * 54 + 400 * 15.238095238095, 6)
    // 300 lbf · 2 in − 100 lbf · 1 in = 500 lbf·in.
    expect(value(inchLoadsInputs(), 'T@L01')).toBeCloseTo(500 * 112.9848290276167, 6)
  })
  it('gives its cases whole to other calculations', () => {
    expect(resultOf(webLoadInputs()).heads?.map(one => one.id)).toEqual(['L01', 'L02'])
  })
  it('stops where the reference is not the shear centre (G-22)', () => {
    expect(resultOf(inchLoadsInputs()).guards.map(g => [g.id, g.severity])).toContainEqual(['G-22', 'stop'])
    expect(resultOf(webLoadInputs()).guards.map(g => g.id)).not.toContain('G-22')
  })
  it('moves with the axes: all points and the reference shifted, the torque stays', () => {
    const inputs = webLoadInputs()
    const shift = (typed: { text: string, unit: 'mm' }) => quantity(String(Number(typed.text) + 333), 'mm')
    const moved = { ...inputs, reference: { ...inputs.reference, x: shift(inputs.reference.x as never) }, points: inputs.points.map(p => ({ ...p, x: shift(p.x as never) })) }
    expect(value(moved, 'T@L02')).toBeCloseTo(value(inputs, 'T@L02'), 6)
  })
  it('puts each fault at its field', () => {
    const inputs = webLoadInputs()
    const faults = (changed: unknown) => {
      const evaluation = evaluateTorqueFromLoads(changed)
      return evaluation.ok ? [] : evaluation.faults.map(f => f.path)
    }
    expect(faults({ ...inputs, cases: [{ ...inputs.cases[0], forces: [{ ...inputs.cases[0]!.forces[0], point: 'nowhere' }] }] })).toContain('cases.0.forces.0.point')
    expect(faults({ ...inputs, cases: [inputs.cases[0], inputs.cases[0]] })).toContain('cases.1.id')
    expect(faults({ ...inputs, cases: [] })).toContain('cases')
  })
})
