/**
 * A profile as its drawing gives it: the shape, how it is measured and made, and its typed dimensions.
 * Titles, symbols and help stand on the fields; the symbols are those of the conversion to the mid-line.
 */
import { z } from 'zod'
import { choice, identifier, quantity } from '#shared/calc/parts/fields'

const measured = choice('Dimensions are', ['outside', 'inside', 'mid-line'], 'Over the far faces, clear between the near faces, or between mid-lines. A free end is measured to its edge.')
const made = {
  measured,
  make: choice('Corners are', ['bent', 'machined'], 'Bent from one sheet, or machined, extruded or rolled with fillets.'),
  radius: quantity('Inside radius', 'length', { symbol: 'r', description: 'Of every corner; zero where it is sharp.' }),
}
const length = (title: string, symbol: string, description?: string) => quantity(title, 'length', { symbol, ...(description === undefined ? {} : { description }) })
const t = (of: string, symbol: string) => quantity(`Thickness of the ${of}`, 'length', { symbol })

const flanged = {
  lower: length('Lower flange', 'b_l'), height: length('Height', 'h'), upper: length('Upper flange', 'b_u'),
  tLower: t('lower flange', 't_l'), tWeb: t('web', 't_w'), tUpper: t('upper flange', 't_u'),
}

/** The dimensions of every shape, in the order in which they are asked for. */
export const profileShapes = {
  'angle': { ...made, width: length('Lying leg', 'b'), height: length('Upright leg', 'h'), tWidth: t('lying leg', 't_b'), tHeight: t('upright leg', 't_h') },
  'tee': { ...made, flange: length('Flange', 'b'), height: length('Height', 'h'), tFlange: t('flange', 't_f'), tStem: t('stem', 't_s') },
  'channel': { ...made, ...flanged },
  'zed': { ...made, ...flanged },
  'hat': {
    ...made, brim: length('Brim', 'b'), height: length('Height', 'h'), crown: length('Crown', 'c'), lean: quantity('Lean of the webs', 'angle', { symbol: '\\delta', description: 'From the upright, the feet wider than the crown; zero where the webs are upright.' }),
    tBrim: t('brims', 't_b'), tWeb: t('webs', 't_w'), tCrown: t('crown', 't_c'),
  },
  'J': { ...made, base: length('Base', 'b'), height: length('Height', 'h'), cap: length('Cap', 'c'), tBase: t('base', 't_b'), tWeb: t('web', 't_w'), tCap: t('cap', 't_c') },
  'lipped channel': { ...made, lip: length('Lip', 'c'), flange: length('Flange', 'b'), height: length('Height', 'h'), tLip: t('lips', 't_c'), tFlange: t('flanges', 't_f'), tWeb: t('web', 't_w') },
  'I': { ...made, ...flanged },
  'slit tube': { measured, diameter: length('Diameter', 'D'), t: quantity('Thickness', 'length', { symbol: 't' }) },
  'arc': { measured, radius: length('Radius', 'R'), angle: quantity('Swept angle', 'angle', { symbol: '\\alpha' }), t: quantity('Thickness', 'length', { symbol: 't' }) },
} as const

export type ProfileShape = keyof typeof profileShapes
export const profileShapeNames = Object.keys(profileShapes) as ProfileShape[]

/** All walls of a profile are of one material. */
const of = <Shape extends ProfileShape>(shape: Shape) => z.strictObject({ shape: z.literal(shape), material: identifier, ...profileShapes[shape] })

export const profile = z.discriminatedUnion('shape', [
  of('angle'), of('tee'), of('channel'), of('zed'), of('hat'), of('J'), of('lipped channel'), of('I'), of('slit tube'), of('arc'),
]).meta({ title: 'Profile', part: 'profile', description: 'Where it is given, the walls follow from it and the wall table is not read.' })

export type ProfileInput = z.infer<typeof profile>
