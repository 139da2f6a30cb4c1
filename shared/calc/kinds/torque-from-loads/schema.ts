/** Forces with their points, and couples, case by case; the torque is taken about the shear centre (methods §5.3). */
import { z } from 'zod'
import { choice, identifier, name, quantity, unitSystem } from '#shared/calc/parts/fields'
import { caseHead } from '#shared/calc/parts/loading-fields'

export const MAX_FORCES = 50
export const MAX_LOAD_CASES = 2000

const point = z.strictObject({
  id: identifier, title: name,
  x: quantity('x of the point', 'length', { symbol: 'x_P' }), y: quantity('y of the point', 'length', { symbol: 'y_P' }),
}).meta({ title: 'Point of application' })

const force = z.strictObject({ point: identifier.meta({ title: 'At point' }), Vx: quantity('Force along x', 'force', { symbol: 'V_x' }), Vy: quantity('Force along y', 'force', { symbol: 'V_y' }) })

export const torqueFromLoadsSchema = z.strictObject({
  units: unitSystem,
  reference: z.strictObject({
    is: choice('The reference is', ['shear centre', 'centroid', 'another point'], 'Torque acts about the shear centre; about any other point it is another torque (G-22).'),
    x: quantity('x of the shear centre', 'length', { symbol: 'x_S' }), y: quantity('y of the shear centre', 'length', { symbol: 'y_S' }),
  }).meta({ title: 'Reference point' }),
  points: z.array(point).max(MAX_FORCES).meta({ title: 'Points' }),
  cases: z.array(z.strictObject({
    ...caseHead, couple: quantity('Couple', 'torque', { symbol: 'T_0', description: 'A torque of its own, zero where there is none.' }), forces: z.array(force).max(MAX_FORCES).meta({ title: 'Forces' }),
  })).max(MAX_LOAD_CASES).meta({ title: 'Cases' }),
})

export type TorqueFromLoadsInputs = z.infer<typeof torqueFromLoadsSchema>
