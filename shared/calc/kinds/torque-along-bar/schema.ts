/** A bar of segments between numbered nodes, its supports, and its torques case by case (methods §5.1, §5.2). */
import { z } from 'zod'
import { declarations } from '#shared/calc/parts/declaration-fields'
import { identifier, name, optionalQuantity, quantity, source, typedNumber, unitSystem } from '#shared/calc/parts/fields'
import { caseHead, factors } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'

export const MAX_SEGMENTS = 100
export const MAX_BAR_CASES = 500

const stiffness = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('constants'), J: quantity('Torsion constant', 'inertia', { symbol: 'J' }), WT: optionalQuantity('Torsional modulus', 'firstMoment', { symbol: 'W_T', description: 'Torque over largest shear stress; without it no stress is given.' }) }).meta({ title: 'its constants' }),
  z.strictObject({ by: z.literal('circle'), d1: quantity('Diameter at the start', 'length', { symbol: 'd_1' }), d2: quantity('Diameter at the end', 'length', { symbol: 'd_2', description: 'The same for a straight shaft.' }) }).meta({ title: 'solid circle' }),
]).meta({ title: 'Section' })

const segment = z.strictObject({ id: identifier, title: name, length: quantity('Length', 'length', { symbol: 'L' }), material: identifier, section: stiffness })

const support = z.strictObject({
  node: typedNumber.meta({ title: 'Node', description: 'Node 0 is the start of the first segment, node 1 its end, and so on.' }),
  stiffness: optionalQuantity('Stiffness', 'rotationalStiffness', { symbol: 'k', description: 'Empty for a rigid support.' }),
  clearance: optionalQuantity('Clearance', 'angle', { description: 'Angle before the support takes hold; any clearance is a caution.' }),
})

const torque = z.strictObject({ node: typedNumber.meta({ title: 'Node' }), T: quantity('Torque', 'torque', { symbol: 'T', description: 'Positive about +z by the right hand.' }) })
const distributed = z.strictObject({ segment: identifier.meta({ title: 'On segment' }), m1: quantity('At its start', 'distributedTorque', { symbol: 'm_1' }), m2: quantity('At its end', 'distributedTorque', { symbol: 'm_2' }) })

export const torqueAlongBarSchema = z.strictObject({
  units: unitSystem,
  segments: z.array(segment).min(1).max(MAX_SEGMENTS).meta({ title: 'Segments' }),
  supports: z.array(support).max(MAX_SEGMENTS + 1).meta({ title: 'Supports' }),
  materials,
  cases: z.array(z.strictObject({ ...caseHead, torques: z.array(torque).max(MAX_SEGMENTS).meta({ title: 'Torques' }), distributed: z.array(distributed).max(MAX_SEGMENTS).meta({ title: 'Distributed torques' }) })).max(MAX_BAR_CASES).meta({ title: 'Cases' }),
  twistAllowed: optionalQuantity('Twist allowed', 'angle', { symbol: '\\varphi_a', description: 'Largest twist at any node, at limit load.' }),
  twistOrigin: source.meta({ title: 'Origin of the twist allowed' }),
  factors,
  declarations,
})

export type TorqueAlongBarInputs = z.infer<typeof torqueAlongBarSchema>
