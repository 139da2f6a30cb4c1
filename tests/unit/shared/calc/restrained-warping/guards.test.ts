/** Guards of restrained warping: each fires where it should and not where it should not. */
import { describe, expect, it } from 'vitest'
import { builtInAt, caseOf, channelBarInputs, forkAt, torqueAt } from '../../../../factories/restrained-warping'
import { evaluateRestrainedWarping } from '#shared/calc/kinds/restrained-warping/evaluate'
import type { RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'

const mm = (text: string) => ({ text, unit: 'mm' as const })
const fillets = ['2', '3'].map(node => ({ node, radius: mm('3'), make: 'machined' as const }))
function guards(more: Partial<RestrainedWarpingInputs> = {}) {
  const evaluation = evaluateRestrainedWarping(channelBarInputs(more))
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return (id: string) => evaluation.result.guards.filter(one => one.id === id)
}
const tip = (T: string, more: Parameters<typeof caseOf>[1] = {}) => [caseOf('W1', { torques: [torqueAt(mm('1200'), T)], ...more })]

describe('guards of restrained warping', () => {
  it('says how far the result rests on a restraint (G-16), or that it hardly does (G-17)', () => {
    expect(guards()('G-16')).toMatchObject([{ severity: 'caution', values: { kL: expect.closeTo(2.76, 1) as number } }])
    const long = guards({ length: mm('9000'), cases: [caseOf('W1', { torques: [torqueAt(mm('9000'), '1')] })] })
    expect([long('G-16').length, long('G-17').length]).toEqual([0, 1])
    const free = guards({ supports: [forkAt(mm('0'))] })
    expect([free('G-16').length, free('G-17').length]).toEqual([0, 0])
  })
  it('asks why warping is free at a support that is built in (G-18)', () => {
    const declarations = { ...channelBarInputs().declarations, builtIn: true }
    expect(guards({ declarations, supports: [forkAt(mm('0'))] })('G-18')).toHaveLength(1)
    expect(guards({ declarations })('G-18')).toHaveLength(0)
  })
  it('asks how supports share (G-21)', () => {
    expect(guards()('G-21')).toHaveLength(0)
    expect(guards({ supports: [builtInAt(mm('0')), forkAt(mm('1200'))] })('G-21')).toHaveLength(1)
  })
  it('stops at yield by the equivalent stress (G-26) and at a negative margin (G-34)', () => {
    expect(guards()('G-26')).toHaveLength(0)
    const much = guards({ cases: tip('120') })
    expect(much('G-26')[0]).toMatchObject({ severity: 'stop', message: expect.stringMatching(/equivalent stress/) as string })
    expect(much('G-34').some(one => one.severity === 'stop')).toBe(true)
  })
  it('judges the rate of twist (G-28) and the total twist (G-29) at their levels', () => {
    expect(guards({ cases: tip('4') })('G-28')).toHaveLength(0)
    expect(guards({ cases: tip('10') })('G-28')).toMatchObject([{ severity: 'caution' }])
    expect(guards({ cases: tip('20') })('G-28')).toMatchObject([{ severity: 'stop' }])
    expect(guards({ cases: tip('10') })('G-29')).toHaveLength(0)
    expect(guards({ cases: tip('20') })('G-29')).toMatchObject([{ severity: 'caution' }])
  })
  it('judges compression with torque (G-41): caution, stop, and a question where the part is held along its length', () => {
    const pressed = (N: string, heldAlong = false) => guards({ cases: tip('10', { axial: { text: N, unit: 'N' } }), declarations: { ...channelBarInputs().declarations, heldAlong } })('G-41')
    expect(pressed('5000')).toEqual([])
    expect(pressed('-1000')).toEqual([])
    expect(pressed('-6000')).toMatchObject([{ severity: 'caution' }])
    expect(pressed('-60000')).toMatchObject([{ severity: 'stop' }])
    expect(pressed('-60000', true)).toMatchObject([{ severity: 'caution', ask: expect.stringMatching(/restraint along the length/) as string }])
  })
  it('tells of corners and walls as the open section does (G-02, G-10), and of materials (G-23)', () => {
    expect(guards()('G-10')).toHaveLength(2)
    expect(guards({ junctions: fillets })('G-10')).toHaveLength(0)
    expect(guards()('G-02')).toHaveLength(0)
    expect(guards()('G-23')).toHaveLength(0)
    expect(guards({ materials: [{ ...channelBarInputs().materials[0]!, source: '' }] })('G-23')).toHaveLength(1)
  })
})
