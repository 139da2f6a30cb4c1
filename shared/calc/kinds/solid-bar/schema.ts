/** Stored inputs of a solid bar: one of the shapes that closed forms know, and the bar tail. */
import { z } from 'zod'
import { barFields } from '#shared/calc/parts/bar-fields'
import { choice, identifier, quantity, typedNumber, unitSystem } from '#shared/calc/parts/fields'

const radius = quantity('Radius', 'length', { symbol: 'R' })
const way = <Name extends string, Fields extends z.ZodRawShape>(by: Name, title: string, fields: Fields) => z.strictObject({ by: z.literal(by), ...fields }).meta({ title })

const shape = z.discriminatedUnion('by', [
  way('circle', 'solid circle', { radius: quantity('Radius', 'length', { symbol: 'R', description: 'Half of the diameter.' }) }),
  way('tube', 'circular tube', { outer: quantity('Outside radius', 'length', { symbol: 'R_o', description: 'Half of the outside diameter.' }), inner: quantity('Inside radius', 'length', { symbol: 'R_i' }) }),
  way('ellipse', 'ellipse', { major: quantity('Semi-axis along x', 'length', { symbol: 'a', description: 'Half of the axis.' }), minor: quantity('Semi-axis along y', 'length', { symbol: 'b', description: 'Half of the axis.' }) }),
  way('hollow-ellipse', 'hollow ellipse, similar hole', {
    major: quantity('Semi-axis along x', 'length', { symbol: 'a' }), minor: quantity('Semi-axis along y', 'length', { symbol: 'b' }),
    ratio: typedNumber.meta({ title: 'Inner over outer', description: 'The hole has the same centre and proportions; an elliptical tube of constant thickness is a closed section.' }),
  }),
  way('rectangle', 'rectangle', { width: quantity('Width', 'length', { symbol: 'a', description: 'Full side.' }), height: quantity('Height', 'length', { symbol: 'b', description: 'Full side.' }) }),
  way('equilateral', 'equilateral triangle', { side: quantity('Side', 'length', { symbol: 'a' }) }),
  way('isosceles', 'right isosceles triangle', { leg: quantity('Leg', 'length', { symbol: 'a' }) }),
  way('sector', 'circular sector', { radius, angle: quantity('Included angle', 'angle', { symbol: '\\alpha' }) }),
  way('semicircle', 'semicircle', { radius }),
  way('segment', 'circle with one flat', { radius, depth: quantity('Depth of the flat', 'length', { symbol: 'h', description: 'What the flat takes off the radius; at most the radius.' }) }),
  way('polygon', 'regular polygon', { sides: choice('Sides', ['pentagon', 'hexagon', 'octagon']), flats: quantity('Twice the apothem', 'length', { symbol: 'd', description: 'Across flats where the number of sides is even.' }) }),
]).meta({ title: 'Shape' })

export const solidBarSchema = z.strictObject({
  units: unitSystem,
  shape,
  material: identifier.meta({ title: 'Material of the bar' }),
  ...barFields,
})

export type SolidBarInputs = z.infer<typeof solidBarSchema>
export type ShapeInput = SolidBarInputs['shape']
