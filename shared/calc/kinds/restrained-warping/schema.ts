/** An open section, the bar it makes with what holds its ends, and torques, bimoments and axial force case by case (methods §3). */
import { z } from 'zod'
import { declarationFields } from '#shared/calc/parts/declaration-fields'
import { choice, declared, identifier, optionalQuantity, quantity, source, unitSystem } from '#shared/calc/parts/fields'
import { caseHead, factors } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'
import { junctions, start, taperingWalls } from '#shared/calc/parts/wall-fields'

export const MAX_SUPPORTS = 40
export const MAX_LOADS = 60
export const MAX_BAR_CASES = 500

const station = quantity('Station', 'length', { symbol: 'z', description: 'From the start of the bar.' })
const held = ['held', 'free', 'spring'] as const

const support = z.strictObject({
  z: station,
  twist: choice('Twist', held, 'Whether the section may turn here.'),
  twistStiffness: optionalQuantity('Stiffness against twist', 'rotationalStiffness', { symbol: 'k_{\\varphi}', description: 'Of a spring only.' }),
  warping: choice('Warping', held, 'Whether the section may warp here: held by a built-in end or a stiff end plate, free at a fork.'),
  warpingStiffness: optionalQuantity('Stiffness against warping', 'warpingStiffness', { symbol: 'k_{\\omega}', description: 'Bimoment per rate of twist, of a spring only.' }),
})

const torque = z.strictObject({ z: station, T: quantity('Torque', 'torque', { symbol: 'T', description: 'Positive about +z by the right hand, about the shear centre.' }) })
const distributed = z.strictObject({
  from: quantity('From station', 'length', { symbol: 'z_1' }), to: quantity('To station', 'length', { symbol: 'z_2' }),
  m1: quantity('At its start', 'distributedTorque', { symbol: 'm_1' }), m2: quantity('At its end', 'distributedTorque', { symbol: 'm_2' }),
})
const eccentric = z.strictObject({
  z: station, node: identifier.meta({ title: 'Node of the section', description: 'Where the force acts on the section.' }),
  P: quantity('Axial force', 'force', { symbol: 'P', description: 'Along +z on the bar; it makes the bimoment P times the sectorial coordinate of the node.' }),
})

const loadCase = z.strictObject({
  ...caseHead,
  torques: z.array(torque).max(MAX_LOADS).meta({ title: 'Torques' }),
  distributed: z.array(distributed).max(MAX_LOADS).meta({ title: 'Distributed torques' }),
  eccentric: z.array(eccentric).max(MAX_LOADS).meta({ title: 'Eccentric axial forces' }),
  axial: optionalQuantity('Axial force through the centroid', 'force', { symbol: 'N', description: 'Tension positive, the same along the bar: its mean stress is added, and compression reduces the stiffness.' }),
})

export const restrainedWarpingSchema = z.strictObject({
  units: unitSystem,
  start,
  walls: taperingWalls,
  junctions,
  materials,
  length: quantity('Length of the bar', 'length', { symbol: 'L' }),
  supports: z.array(support).max(MAX_SUPPORTS).meta({ title: 'Supports' }),
  cases: z.array(loadCase).max(MAX_BAR_CASES).meta({ title: 'Cases' }),
  twistAllowed: optionalQuantity('Twist allowed', 'angle', { symbol: '\\varphi_a', description: 'Largest twist anywhere along the bar, at limit load.' }),
  twistOrigin: source.meta({ title: 'Origin of the twist allowed' }),
  factors,
  declarations: z.strictObject({
    ...declarationFields,
    builtIn: declared('A support holds the section', 'A support is built in, or holds the section in twist by more than a point.'),
    heldAlong: declared('Held along its length', 'The part is held in twist along its length to a stiffer structure.'),
  }),
})

export type RestrainedWarpingInputs = z.infer<typeof restrainedWarpingSchema>
