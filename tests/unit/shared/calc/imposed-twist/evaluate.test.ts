/** A part that follows its structure. */
import { describe, expect, it } from 'vitest'
import { followingChannelInputs, followingTubeInputs } from '../../../../factories/imposed-twist'
import { quantity } from '../../../../factories/open-section'
import { evaluateImposedTwist } from '#shared/calc/kinds/imposed-twist/kind'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateImposedTwist(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value ?? Number.NaN
const guards = (inputs: unknown) => resultOf(inputs).guards.map(g => g.key)

describe('imposed twist', () => {
  it('makes torque and stress results of the rate of twist', () => {
    // §6 of the methods reference: 2804.773333 N·mm and G t θ′.
    expect(value(followingChannelInputs(), 'T@L01')).toBeCloseTo(2804.773333, 5)
    expect(value(followingChannelInputs(), 'tau@L01')).toBeCloseTo(26_900 * 4 * 4e-5, 9)
    expect(value(followingChannelInputs(), 'B@L01')).toBeCloseTo(-71_000 * 182857142.857143 * 2e-8, 2)
    const sigma = 71_000 * 1238.0952380952 * 2e-8 + 71_000 * 15 * 2e-8 * 50
    expect(value(followingChannelInputs(), 'sigma_eq@L01')).toBeCloseTo(Math.hypot(sigma, Math.sqrt(3) * 26_900 * 4 * 4e-5), 8)
  })
  it('factors the imposed twist like a load, once: 1.5 from limit to ultimate and nothing beyond', () => {
    const applied = (id: string) => resultOf(followingChannelInputs()).margins.find(m => m.mode === 'shear-ultimate' && m.caseId === id)?.applied
    expect(applied('L01')).toBeCloseTo(1.5 * 26_900 * 4 * 4e-5, 9)
    expect(applied('L02')).toBeCloseTo(26_900 * 4 * 3.2 * Math.PI / 180 / 1000, 9)
  })
  it('asks what the part does to its structure (G-42)', () => {
    expect(guards(followingTubeInputs())).toContain('G-42:unknown')
    expect(guards(followingChannelInputs())).not.toContain('G-42')
    expect(guards({ ...followingChannelInputs(), structure: quantity('700', 'N·m²') })).toContain('G-42')
  })
  it('takes the corner factor of an open section', () => {
    const inputs = followingChannelInputs()
    const cornered = { ...inputs, section: { ...inputs.section, K: quantity('1.7', '') } }
    expect(value(cornered, 'tau@L01')).toBeCloseTo(1.7 * 26_900 * 4 * 4e-5, 9)
    expect(guards(cornered)).toContain('G-27:notch')
  })
})
