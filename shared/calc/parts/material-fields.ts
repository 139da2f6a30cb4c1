/** A material record as a calculation holds it. */
import { z } from 'zod'
import { identifier, name, optionalQuantity, quantity, source, typedNumber, typedQuantity } from '#shared/calc/parts/fields'

export const MAX_MATERIALS = 20
export const MAX_KNOCKDOWN = 20

/** The record itself: what a material of the note holds, and what controlled data will hold. */
export const materialRecord = z.strictObject({
  id: identifier,
  name,
  specification: source,
  form: name,
  thicknessRange: name,
  /** Aluminium alloys need a knock-down above 70 °C; others are judged by their own range. */
  family: z.enum(['aluminium', 'other']),
  basis: z.enum(['A', 'B', 'S', 'none']),
  loadPath: z.enum(['single', 'redundant']),
  source,
  edition: name,
  E: quantity('Modulus of elasticity', 'stress', { symbol: 'E' }),
  G: quantity('Shear modulus', 'stress', { symbol: 'G' }),
  nu: quantity('Poisson’s ratio', 'ratio', { symbol: '\\nu' }),
  Ftu: optionalQuantity('Ultimate tension strength', 'stress', { symbol: 'F_{tu}' }),
  Fty: optionalQuantity('Yield strength in tension', 'stress', { symbol: 'F_{ty}' }),
  Fsu: optionalQuantity('Ultimate shear strength', 'stress', { symbol: 'F_{su}' }),
  Fsy: optionalQuantity('Yield strength in shear', 'stress', { symbol: 'F_{sy}', description: 'Where absent, Fty divided by the square root of three.' }),
  temperatureFrom: optionalQuantity('Data valid from', 'temperature'),
  temperatureTo: optionalQuantity('Data valid to', 'temperature'),
  /** Factor on all strengths against temperature, linear between points. */
  knockdown: z.array(z.strictObject({ temperature: typedQuantity, factor: typedNumber })).max(MAX_KNOCKDOWN),
  knockdownSource: source,
})

/** As a calculation holds it: typed here, or taken whole from a record of the note (what was typed before is then not read). */
const material = materialRecord.extend({ record: z.uuid().optional() })

export const materials = z.array(material).max(MAX_MATERIALS).meta({ title: 'Materials', part: 'materials' })
export type MaterialInput = z.infer<typeof material>
