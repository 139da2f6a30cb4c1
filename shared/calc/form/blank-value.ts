/** A value to begin with for what a schema asks: texts empty, first choices taken, units of the system. */
import { usualUnit } from '#shared/units/usual-unit'
import type { Dimension } from '#shared/units/units'

/** The part of JSON Schema that `z.toJSONSchema` writes for inputs, with the metadata of the fields. */
export interface JsonSchema {
  type?: string
  title?: string
  description?: string
  dimension?: Dimension
  symbol?: string
  part?: string
  properties?: Record<string, JsonSchema>
  required?: string[]
  items?: JsonSchema
  enum?: string[]
  const?: unknown
  oneOf?: JsonSchema[]
  anyOf?: JsonSchema[]
  format?: string
  maxLength?: number
  maxItems?: number
  minItems?: number
}

export function blankOf(schema: JsonSchema, units: 'SI' | 'US'): unknown {
  if (schema.const !== undefined) return schema.const
  if (schema.anyOf) return null
  if (schema.oneOf) return blankOf(schema.oneOf[0] ?? {}, units)
  if (schema.dimension !== undefined) return { text: '', unit: usualUnit(schema.dimension, units) }
  if (schema.enum) return schema.enum[0]
  if (schema.type === 'boolean') return false
  if (schema.type === 'array') return Array.from({ length: schema.minItems ?? 0 }, () => blankOf(schema.items ?? {}, units))
  if (schema.type !== 'object') return ''
  const required = Object.entries(schema.properties ?? {}).filter(([key]) => schema.required?.includes(key))
  return Object.fromEntries(required.map(([key, inside]) => [key, blankOf(inside, units)]))
}
