/**
 * The fields that stored inputs are made of. Each carries its label, dimension and help as metadata of the
 * schema, so that the form, the PDF and the published JSON Schema all say the same.
 */
import { z } from 'zod'
import { dimensions, unitsOf, type Dimension, type UnitId } from '#shared/units/units'

/** What a field says of itself. */
export interface FieldMeta {
  /** Label of the field, e.g. `Outside radius`. */
  title: string
  /** TeX, e.g. `R_o`. */
  symbol?: string
  /** One sentence of help. */
  description?: string
  dimension?: Dimension
  /** Smallest and largest sensible value in engine units, for the help text only: parsing decides what is refused. */
  range?: { from?: number, to?: number }
}

const allUnits = [...new Set(dimensions.flatMap(unitsOf))] as [UnitId, ...UnitId[]]
export const unitId = z.enum(allUnits, { error: 'Choose one of the listed units.' })

/** Where a value comes from that is not typed: an output of another calculation or record of the note. */
export const linkSource = z.strictObject({ calculation: z.uuid(), key: z.string().min(1).max(120) })

/** A number as typed, with its unit; linked, the unit is the one it is shown in and the text is what was typed before. */
export const typedQuantity = z.strictObject({ text: z.string().max(40), unit: unitId, from: linkSource.optional() })

/** Only units of the dimension are taken, so that a published schema says which. */
const ofDimension = (dimension: Dimension) =>
  typedQuantity.extend({ unit: z.enum(unitsOf(dimension) as [UnitId, ...UnitId[]], { error: 'Choose one of the listed units.' }) })

/** A typed quantity of one dimension, with what the form says of it. */
export const quantity = (title: string, dimension: Dimension, more: Omit<FieldMeta, 'title' | 'dimension'> = {}) =>
  ofDimension(dimension).meta({ title, dimension, ...more })

/** The same, where the field may be left out. */
export const optionalQuantity = (title: string, dimension: Dimension, more: Omit<FieldMeta, 'title' | 'dimension'> = {}) =>
  ofDimension(dimension).nullable().meta({ title, dimension, ...more })

/** A choice among words. */
export const choice = <const Words extends readonly [string, ...string[]]>(title: string, words: Words, description?: string) =>
  z.enum(words).meta({ title, ...(description === undefined ? {} : { description }) })

/** A yes or no. */
export const declared = (title: string, description?: string) =>
  z.boolean().meta({ title, ...(description === undefined ? {} : { description }) })

/** Names that appear in output keys and in equations: plain letters, digits and a few joining signs. */
export const identifier = z.string().regex(/^[A-Za-z0-9][A-Za-z0-9._+/-]{0,19}$/, 'Use up to 20 letters, digits, dots, dashes or slashes.')
export const name = z.string().max(80)
export const source = z.string().max(240)
export const paragraph = z.string().max(2000)
/** A pure number, typed: kept as text like every other input. */
export const typedNumber = z.string().max(20)
export const unitSystem = choice('Units of the results', ['SI', 'US'])
