import { describe, expect, it } from 'vitest'
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { Guard } from '#shared/calc/types'
import { evaluateGeneralOutline } from '#shared/calc/kinds/general-outline/evaluate'
import { boredPlateInputs, corner, firstMethod, sharpBracketInputs, thickAngleInputs } from '../../../../factories/general-outline'
import { quantity } from '../../../../factories/open-section'

function guards(inputs: GeneralOutlineInputs, id: string): Guard[] {
  const evaluation = evaluateGeneralOutline(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result.guards.filter(guard => guard.id === id)
}
const angle = thickAngleInputs
const declared = (more: Partial<GeneralOutlineInputs['declarations']>): GeneralOutlineInputs => ({ ...angle(), declarations: { ...angle().declarations, ...more } })
const torque = (text: string): GeneralOutlineInputs['loading'] => ({ by: 'torque', torque: quantity(text, 'N·m') as never, level: 'limit', temperature: null, source: '' })

describe('guards of a general outline', () => {
  it('G-10 at every sharp re-entrant vertex, and nowhere else', () => {
    expect(guards(sharpBracketInputs(), 'G-10')).toMatchObject([{ key: 'G-10:vertex-1', severity: 'stop', deviable: true, values: { 'interior angle, °': expect.closeTo(270, 9), 'r, mm': 0 } }])
    expect(guards(angle(), 'G-10')).toEqual([])
  })

  it('G-32 beyond the expected difference, and a stop beyond three times', () => {
    // J of the solution is 116 360 mm⁴; expected within 0.5 % for a corrected open section.
    const given = (J: string) => guards({ ...angle(), first: firstMethod('open, corrected', { J }) }, 'G-32')
    expect(given('116500')).toEqual([])
    expect(given('117200')).toMatchObject([{ key: 'G-32:J', severity: 'caution' }])
    expect(given('119000')).toMatchObject([{ key: 'G-32:J', severity: 'stop' }])
    expect(guards({ ...angle(), first: firstMethod('open, mid-line only', { W: '6000', Gamma: '23000000' }) }, 'G-32')).toMatchObject([{ key: 'G-32:tau', severity: 'stop' }])
    expect(guards(boredPlateInputs(), 'G-32')).toMatchObject([{ message: expect.stringContaining('face factor above 0.1') }])
  })

  it('G-33 as information where the order is low and the uncertainty within its limit', () => {
    expect(guards(angle(), 'G-33')).toEqual([])
    for (const guard of guards(boredPlateInputs(), 'G-33')) expect(guard.severity).toBe('information')
    expect(guards(boredPlateInputs(), 'G-33').length).toBeGreaterThan(0)
  })

  it('G-16, G-17 and G-18 by the ends and kL', () => {
    expect(guards({ ...angle(), ends: 'restrained' }, 'G-17')).toMatchObject([{ values: { kL: expect.closeTo(17.6, 1) } }])
    expect(guards({ ...angle(), ends: 'restrained' }, 'G-16')).toEqual([])
    expect(guards({ ...angle(), ends: 'restrained', length: quantity('100', 'mm') as never }, 'G-16')).toMatchObject([{ severity: 'stop', values: { kL: expect.closeTo(4.4, 1) } }])
    expect(guards({ ...angle(), ends: 'unknown', length: null }, 'G-16')).toMatchObject([{ message: expect.stringContaining('length of the bar is not given') }])
    expect(guards(declared({ builtIn: true }), 'G-18')).toHaveLength(1)
    expect(guards(angle(), 'G-18')).toEqual([])
  })

  it('G-20 where a section with holes is held and highly stressed', () => {
    const plate = (text: string, ends: GeneralOutlineInputs['ends']): GeneralOutlineInputs => ({ ...boredPlateInputs(), loading: torque(text), ends })
    expect(guards(plate('1500', 'restrained'), 'G-20')).toMatchObject([{ caseId: 'T', severity: 'caution' }])
    expect(guards(plate('1500', 'free'), 'G-20')).toEqual([])
    expect(guards(plate('100', 'restrained'), 'G-20')).toEqual([])
    expect(guards(plate('1500', 'restrained'), 'G-16')).toEqual([])
  })

  it('G-39 for a bar shorter than its section', () => {
    expect(guards({ ...angle(), length: quantity('80', 'mm') as never }, 'G-39')).toMatchObject([{ values: { 'L/size': expect.closeTo(80 / (60 * Math.SQRT2), 9) } }])
    expect(guards({ ...angle(), length: quantity('90', 'mm') as never }, 'G-39')).toEqual([])
  })

  it('G-26, G-27 and G-34 by stresses and margins', () => {
    expect(guards({ ...angle(), loading: torque('790') }, 'G-26')).toMatchObject([{ severity: 'stop' }])
    expect(guards({ ...angle(), loading: torque('790') }, 'G-34')).toMatchObject([{ key: 'G-34:shear-ultimate', severity: 'stop' }, { key: 'G-34:shear-yield' }, { key: 'G-34:twist', severity: 'caution' }])
    expect(guards({ ...angle(), loading: torque('250') }, 'G-27')).toEqual([])
    expect(guards(angle(), 'G-27')).toMatchObject([{ key: 'G-27:stress' }])
    expect(guards(declared({ repeated: true }), 'G-27').map(({ key }) => key)).toContain('G-27:repeated')
  })

  it('G-28 and G-29 where the twist is large', () => {
    const blade: GeneralOutlineInputs = {
      ...angle(), first: { by: 'none' }, loading: torque('8'), length: quantity('400', 'mm') as never,
      outer: { by: 'vertices', vertices: [corner('0', '0'), corner('100', '0'), corner('100', '2'), corner('0', '2')] },
    }
    expect(guards(blade, 'G-28')).toMatchObject([{ severity: 'stop' }])
    expect(guards(blade, 'G-29')).toMatchObject([{ severity: 'stop' }])
    expect(guards(angle(), 'G-28')).toEqual([])
    expect(guards(angle(), 'G-29')).toEqual([])
  })

  it('those of material, factors, declarations and inputs that every kind has', () => {
    expect(guards({ ...angle(), materials: angle().materials.map(m => ({ ...m, basis: 'none' as const })) }, 'G-23')).toHaveLength(1)
    expect(guards({ ...angle(), factors: { ...angle().factors, ultimate: '1.25' } }, 'G-35')).toHaveLength(1)
    expect(guards(declared({ layered: true }), 'G-37')).toHaveLength(1)
    expect(guards(declared({ taper: quantity('12', '°') as never }), 'G-38')).toHaveLength(1)
    expect(guards(declared({ cutOut: 'at the peak' }), 'G-40')).toMatchObject([{ severity: 'stop' }])
    expect(guards({ ...angle(), length: quantity('-3', 'mm') as never }, 'G-01')).toHaveLength(1)
  })
})
