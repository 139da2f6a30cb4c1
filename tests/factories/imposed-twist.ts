/** Parts that follow their structure, as they are stored: invented figures. */
import type { ImposedTwistInputs } from '#shared/calc/kinds/imposed-twist/schema'
import { blankBar } from '#shared/calc/parts/bar-fields'
import { quantity } from './open-section'
import { materialInputs } from './records'

const head = (id: string) => ({ id, title: '', source: 'EX-L-40', level: 'limit' as const, temperature: null })

/** The channel of flanges 40×4 and web 100×3 riveted to a spar. */
export const followingChannelInputs = (): ImposedTwistInputs => {
  const { factors, declarations } = blankBar('SI', materialInputs())
  return {
    units: 'SI', section: { by: 'open', J: quantity('2606.666666666667', 'mm⁴'), t: quantity('4', 'mm'), K: null }, material: 'QM-31',
    Gamma: quantity('182857142.857143', 'mm⁶'), omega: quantity('1238.0952380952', 'mm²'), offset: quantity('15', 'mm'), fibre: quantity('50', 'mm'), structure: quantity('2000', 'N·m²'),
    materials: [materialInputs()],
    cases: [{ ...head('L01'), rate: quantity('4e-5', 'rad/mm'), gradient: quantity('2e-8', 'rad/mm²') }, { ...head('L02'), level: 'ultimate', rate: quantity('-3.2', '°/m'), gradient: null }],
    factors, declarations,
  }
}
export const followingTubeInputs = (): ImposedTwistInputs => ({
  ...followingChannelInputs(), units: 'US', section: { by: 'other', J: quantity('0.87', 'in⁴'), WT: quantity('0.88', 'in³') }, Gamma: null, omega: null, offset: null, fibre: null, structure: null,
  cases: [{ ...head('L01'), rate: quantity('0.01', '°/in'), gradient: null }],
})
