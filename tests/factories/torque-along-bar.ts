/** Bars along a span as they are stored: invented parts. */
import type { TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import { blankBar } from '#shared/calc/parts/bar-fields'
import { quantity } from './open-section'
import { materialInputs } from './records'

const mm = (text: string) => quantity(text, 'mm')
const steel = () => ({ ...materialInputs(), id: 'ST', family: 'other' as const, E: quantity('205', 'GPa'), G: quantity('79', 'GPa'), nu: quantity('0.29', ''), Fsu: quantity('390', 'MPa'), Fty: quantity('517', 'MPa') })
const head = (id: string, title: string) => ({ id, title, source: 'EX-L-30', level: 'limit' as const, temperature: null })
const shaft = (id: string, title: string, length: string, d1: string, d2 = d1) => ({ id, title, length: mm(length), material: 'ST', section: { by: 'circle' as const, d1: mm(d1), d2: mm(d2) } })
const torque = (node: string, T: string) => ({ node, T: quantity(T, 'N·m') })

/** A stepped shaft held at its first end. */
export const steppedShaftInputs = (): TorqueAlongBarInputs => {
  const { factors, declarations } = blankBar('SI', steel())
  return {
    units: 'SI', segments: [shaft('a', 'Drive end', '400', '30'), shaft('b', '', '500', '24'), shaft('c', 'Output', '300', '20')],
    supports: [{ node: '0', stiffness: null, clearance: null }], materials: [steel()],
    cases: [{ ...head('L01', 'Drive'), torques: [torque('1', '120'), torque('2', '-50'), torque('3', '80')], distributed: [] }],
    twistAllowed: quantity('3', '°'), twistOrigin: 'EX-R-3', factors, declarations,
  }
}
/** Two ends that share, one on a spring with clearance; a taper and a distributed torque in the second case. */
export const sharedShaftInputs = (): TorqueAlongBarInputs => ({
  ...steppedShaftInputs(), segments: [shaft('a', '', '400', '30'), shaft('b', 'Taper', '300', '30', '20'), { id: 'c', title: 'Tube', length: mm('200'), material: 'ST', section: { by: 'constants', J: quantity('15000', 'mm⁴'), WT: null } }],
  supports: [{ node: '0', stiffness: null, clearance: null }, { node: '3', stiffness: quantity('40', 'kN·m/rad'), clearance: quantity('0.2', '°') }],
  cases: [
    { ...head('L01', 'At the step'), torques: [torque('1', '250')], distributed: [] },
    { ...head('L02', 'Distributed'), torques: [], distributed: [{ segment: 'b', m1: quantity('100', 'N·m/m'), m2: quantity('300', 'N·m/m') }] },
  ],
})
export const inchShaftInputs = (): TorqueAlongBarInputs => ({
  ...steppedShaftInputs(), units: 'US', segments: [{ id: 'a', title: '', length: quantity('12', 'in'), material: 'ST', section: { by: 'circle', d1: quantity('1', 'in'), d2: quantity('7/8', 'in') } }],
  cases: [{ ...head('L01', ''), level: 'ultimate', torques: [{ node: '1', T: quantity('900', 'lbf·in') }], distributed: [] }],
})
