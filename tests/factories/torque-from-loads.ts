/** Offset loads as they are stored: invented figures. */
import type { TorqueFromLoadsInputs } from '#shared/calc/kinds/torque-from-loads/schema'
import { quantity } from './open-section'

const mm = (text: string) => quantity(text, 'mm')
const head = (id: string, title: string) => ({ id, title, source: 'EX-L-20 page 3', level: 'limit' as const, temperature: null })

/** A force in the plane of a channel web, taken about its shear centre 15.238 mm behind it. */
export const webLoadInputs = (): TorqueFromLoadsInputs => ({
  units: 'SI', reference: { is: 'shear centre', x: mm('-15.238095238095'), y: mm('50') },
  points: [{ id: 'web', title: 'Web mid-line', x: mm('0'), y: mm('50') }, { id: 'lug', title: 'Lug on the upper flange', x: mm('30'), y: mm('104') }],
  cases: [
    { ...head('L01', 'Down load'), couple: quantity('0', 'N·m'), forces: [{ point: 'web', Vx: quantity('0', 'N'), Vy: quantity('10', 'kN') }] },
    { ...head('L02', 'Side load'), couple: quantity('-12', 'N·m'), forces: [{ point: 'lug', Vx: quantity('850', 'N'), Vy: quantity('-2.2', 'kN') }, { point: 'web', Vx: quantity('0', 'N'), Vy: quantity('400', 'N') }] },
  ],
})
export const inchLoadsInputs = (): TorqueFromLoadsInputs => ({
  units: 'US', reference: { is: 'centroid', x: quantity('0', 'in'), y: quantity('0', 'in') },
  points: [{ id: 'A', title: '', x: quantity('2', 'in'), y: quantity('1', 'in') }],
  cases: [{ ...head('L01', ''), couple: quantity('0', 'lbf·in'), forces: [{ point: 'A', Vx: quantity('100', 'lbf'), Vy: quantity('300', 'lbf') }] }],
})
