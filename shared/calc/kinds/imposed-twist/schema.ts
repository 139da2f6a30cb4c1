/** A part that follows its structure: its own section, and the rate of twist it is given case by case (methods §6). */
import { z } from 'zod'
import { declarations } from '#shared/calc/parts/declaration-fields'
import { identifier, optionalQuantity, quantity, unitSystem } from '#shared/calc/parts/fields'
import { caseHead, factors, MAX_CASES } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'

const section = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('open'), J: quantity('Torsion constant', 'inertia', { symbol: 'J' }), t: quantity('Thickest wall', 'length', { symbol: 't', description: 'Thickness of the wall with the highest stress.' }), K: optionalQuantity('Corner factor', 'number', { symbol: 'K_c', description: 'Of the worst inside corner; empty for none.' }) }).meta({ title: 'open walls' }),
  z.strictObject({ by: z.literal('other'), J: quantity('Torsion constant', 'inertia', { symbol: 'J' }), WT: quantity('Torsional modulus', 'firstMoment', { symbol: 'W_T' }) }).meta({ title: 'solid or closed' }),
]).meta({ title: 'Section' })

export const imposedTwistSchema = z.strictObject({
  units: unitSystem,
  section,
  material: identifier.meta({ title: 'Material of the part' }),
  Gamma: optionalQuantity('Warping constant', 'warping', { symbol: '\\Gamma', description: 'Where the part warps and the rate of twist changes along it.' }),
  omega: optionalQuantity('Largest sectorial coordinate', 'sectorial', { symbol: '\\omega_{max}' }),
  offset: optionalQuantity('Offset of the attachment', 'length', { symbol: 'e', description: 'Distance of the line of attachment from the shear centre.' }),
  fibre: optionalQuantity('Outermost fibre', 'length', { symbol: 'c', description: 'Distance from the axis about which the offset bends the part.' }),
  structure: optionalQuantity('Stiffness of the structure', 'torsionalStiffness', { symbol: 'GJ_s', description: 'Empty where it is not known; then its share cannot be judged.' }),
  materials,
  cases: z.array(z.strictObject({ ...caseHead, rate: quantity('Rate of twist', 'rateOfTwist', { symbol: '\\theta\'' }), gradient: optionalQuantity('Change of the rate', 'rateGradient', { symbol: '\\varphi\'\'' }) })).max(MAX_CASES).meta({ title: 'Cases' }),
  factors,
  declarations,
})

export type ImposedTwistInputs = z.infer<typeof imposedTwistSchema>
