/**
 * Stored inputs of a general outline: loops of typed vertices or circles, one material, loads, and what a first
 * method gave for the same section. Nothing here is a converted number.
 */
import { z } from 'zod'
import { declarationFields } from '#shared/calc/parts/declaration-fields'
import { choice, declared, identifier, name, optionalQuantity, quantity, source, typedNumber, unitSystem } from '#shared/calc/parts/fields'
import { factors, loading } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'

export const MAX_VERTICES = 120
export const MAX_HOLES = 24

const vertex = z.strictObject({
  x: quantity('x', 'length'),
  y: quantity('y', 'length'),
  radius: optionalQuantity('Corner radius', 'length', { symbol: 'r', description: 'Rounds the corner here between its two straight edges; empty for a sharp corner.' }),
  sweep: optionalQuantity('Swept angle', 'angle', { description: 'Of the edge to the next vertex where it is an arc, positive counter-clockwise; empty for a straight edge.' }),
  name: name.meta({ title: 'Name of the edge', description: 'Of the edge from here to the next vertex; empty to number it.' }),
})

const loop = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('vertices'), vertices: z.array(vertex).max(MAX_VERTICES).meta({ title: 'Vertices', description: 'In order round the loop, either way; the last joins the first.' }) }).meta({ title: 'vertices' }),
  z.strictObject({ by: z.literal('circle'), x: quantity('Centre, x', 'length'), y: quantity('Centre, y', 'length'), radius: quantity('Radius', 'length', { symbol: 'R' }) }).meta({ title: 'circle' }),
])

/** What the closed or thin-walled method gave for this section; its values may be linked to that calculation. */
const first = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('none') }).meta({ title: 'no first method' }),
  z.strictObject({
    by: z.literal('given'),
    method: choice('First method', ['exact shape', 'open, corrected', 'open, mid-line only', 'closed'], 'Decides how far the two methods may differ.'),
    J: optionalQuantity('Torsion constant', 'inertia', { symbol: 'J_1' }),
    W: optionalQuantity('Torsional modulus', 'firstMoment', { symbol: 'W_1', description: 'Torque over the peak shear it causes.' }),
    Gamma: optionalQuantity('Warping constant', 'warping', { symbol: '\\Gamma_1' }),
    chi: typedNumber.meta({ title: 'Largest face factor', symbol: '\\chi', description: 'Of a closed section by the first method.' }),
    source: source.meta({ title: 'Where it is computed' }),
  }).meta({ title: 'a first method' }),
])

const declarations = z.strictObject({
  ...declarationFields,
  builtIn: declared('A support holds the section', 'A support is built in, or holds the section in twist by more than a point.'),
})

export const generalOutlineSchema = z.strictObject({
  units: unitSystem,
  outer: loop.meta({ title: 'Outer loop' }),
  holes: z.array(z.strictObject({ id: identifier.meta({ title: 'Hole' }), shape: loop.meta({ title: 'Shape' }) })).max(MAX_HOLES).meta({ title: 'Holes' }),
  materials,
  loading,
  length: optionalQuantity('Length of the bar', 'length', { symbol: 'L' }),
  twistAllowed: optionalQuantity('Twist allowed', 'angle', { symbol: '\\varphi_a' }),
  twistOrigin: source.meta({ title: 'Origin of the twist allowed' }),
  factors,
  ends: choice('Ends', ['free', 'restrained', 'unknown'], 'Whether the ends are free to warp.'),
  first: first.meta({ title: 'First method', description: 'This is the second method: what the first gave is compared with it.' }),
  declarations,
})

export type GeneralOutlineInputs = z.infer<typeof generalOutlineSchema>
export type LoopInput = z.infer<typeof loop>
export type FirstInput = z.infer<typeof first>
