/** Combined stress at one fibre. */
import { describe, expect, it } from 'vitest'
import { combinedInputs, panelInputs, powersInputs, steadyInputs } from '../../../../factories/combined-stress'
import { quantity } from '../../../../factories/open-section'
import { evaluateCombinedStress } from '#shared/calc/kinds/combined-stress/kind'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateCombinedStress(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value ?? Number.NaN
const margin = (inputs: unknown, mode: string, point: string) => resultOf(inputs).margins.find(m => m.mode === mode && m.caseId === point)?.ms ?? Number.NaN

describe('combined stress', () => {
  it('adds normal stresses with their signs and shear stresses by magnitude', () => {
    expect(value(combinedInputs(), 'sigma@P1')).toBe(60)
    expect(value(combinedInputs(), 'tau@P1')).toBe(35)
    expect(value(combinedInputs(), 'sigma_eq@P1')).toBeCloseTo(Math.sqrt(60 ** 2 + 3 * 35 ** 2), 10)
  })
  it('finds the multiplier that reaches each criterion', () => {
    // By hand at 1.5: Rn = 90/440, Rs = 52.5/265.
    expect(margin(combinedInputs(), 'interaction-ultimate', 'P1')).toBeCloseTo(1 / Math.hypot(90 / 440, 52.5 / 265) - 1, 10)
    expect(margin(combinedInputs(), 'equivalent-yield', 'P1')).toBeCloseTo(320 / Math.sqrt(60 ** 2 + 3 * 35 ** 2) - 1, 10)
    // C-94 of the methods reference: Rc 0.4, Rs 0.5.
    expect(margin(panelInputs(), 'interaction-ultimate', 'P1')).toBeCloseTo(0.354065922853802, 10)
    const rf = 1 + margin(powersInputs(), 'interaction-ultimate', 'P2')
    expect((rf * 142.5 / 440) ** 1.5 + (rf * 60 / 265) ** 2).toBeCloseTo(1, 10)
    const steady = 1 + margin(steadyInputs(), 'interaction-ultimate', 'P2')
    expect((142.5 / 440) ** 2 + (steady * 60 / 265) ** 2).toBeCloseTo(1, 10)
  })
  it('has a negative margin, of all loads together, where the steady part alone is too much', () => {
    const inputs = steadyInputs()
    const over = { ...inputs, points: [{ ...inputs.points[1], normal: [{ title: '', sigma: quantity('-400', 'MPa') }] }] }
    // By hand, ultimate 1.5: Rn = 600/440; Rs = 60/265 as above.
    expect(margin(over, 'interaction-ultimate', 'P2')).toBeCloseTo(1 / Math.hypot(600 / 440, 60 / 265) - 1, 10)
    expect(resultOf(over).guards.map(g => g.id)).toContain('G-34')
    expect(resultOf(over).working.some(step => step.lines.some(each => each.symbols.includes('R_{steady} \\ge 1')))).toBe(true)
  })
  it('stops at yield and names the equivalent stress', () => {
    const inputs = combinedInputs()
    const guard = resultOf({ ...inputs, points: [{ ...inputs.points[0], torsion: quantity('190', 'MPa') }] }).guards.find(g => g.id === 'G-26')
    expect(guard?.message).toContain('equivalent stress')
    expect(resultOf(inputs).guards.map(g => g.id)).not.toContain('G-26')
  })
  it('asks for the strength that its rule needs', () => {
    const inputs = combinedInputs()
    const without = { ...inputs, materials: [{ ...inputs.materials[0], Ftu: null }] }
    expect(resultOf(without).guards.map(g => g.key)).toContain('G-23:strength:QM-31')
    expect(resultOf(without).margins.map(m => m.mode)).not.toContain('interaction-ultimate')
  })
})
