/**
 * The form of a calculation kind, read from the schema of its inputs: what stands there is asked for, under
 * the labels and with the help that the schema carries. A new kind needs no form of its own.
 */
import { z } from 'zod'
import type { Dimension } from '#shared/units/units'
import { blankOf, type JsonSchema } from '#shared/calc/form/blank-value'

interface Head { /** Relative to the group, row or way it stands in. */ path: string, title: string, help?: string }

export type FormField
  = | Head & { type: 'quantity', dimension: Dimension, symbol?: string, optional: boolean }
    | Head & { type: 'choice', options: { value: string, label: string }[] }
    | Head & { type: 'switch' }
    | Head & { type: 'text', long: boolean }
    | Head & { type: 'group', fields: FormField[], /** A part with a form of its own, e.g. the materials. */ part?: string }
    | Head & { type: 'list', fields: FormField[], most: number, least: number, part?: string, /** A row to begin with, in the units of a system. */ blank: (units: 'SI' | 'US') => unknown }
    | Head & { type: 'ways', part?: string, ways: { value: string, label: string, fields: FormField[], blank: (units: 'SI' | 'US') => unknown }[] }

/** Above this many letters a text is asked for in several lines. */
const LONG_TEXT = 500

/** @param schema zod schema of the inputs of a kind: a strict object without transforms. */
export function formFields(schema: z.ZodType): FormField[] {
  return fieldsOf(z.toJSONSchema(schema) as JsonSchema)
}

function fieldsOf(schema: JsonSchema): FormField[] {
  return Object.entries(schema.properties ?? {}).flatMap(([key, inside]) => key === 'by' && inside.const !== undefined ? [] : fieldOf(key, inside) ?? [])
}

function fieldOf(path: string, schema: JsonSchema): FormField | null {
  const whole = schema.anyOf?.find(each => each.type !== 'null')
  const inside: JsonSchema = whole ? { ...whole, ...outer(schema) } : schema
  const head: Head = { path, title: inside.title ?? wordsOf(path), ...(inside.description === undefined ? {} : { help: inside.description }) }
  const part = inside.part === undefined ? {} : { part: inside.part }
  if (inside.dimension !== undefined && inside.properties?.text) {
    return { ...head, type: 'quantity', dimension: inside.dimension, optional: whole !== undefined, ...(inside.symbol === undefined ? {} : { symbol: inside.symbol }) }
  }
  if (inside.enum) return { ...head, type: 'choice', options: inside.enum.map(value => ({ value, label: wordsOf(value) })) }
  if (inside.type === 'boolean') return { ...head, type: 'switch' }
  if (inside.format === 'uuid') return null
  if (inside.type === 'string') return { ...head, type: 'text', long: (inside.maxLength ?? 0) > LONG_TEXT }
  if (inside.oneOf) return { ...head, ...part, type: 'ways', ways: inside.oneOf.map(wayOf) }
  if (inside.type === 'array' && inside.items) return { ...head, ...part, ...listOf(inside.items, inside, head.title) }
  return inside.type === 'object' ? { ...head, ...part, type: 'group', fields: fieldsOf(inside) } : null
}

/** What a nullable schema says outside of its two cases. */
const outer = ({ anyOf: _cases, ...rest }: JsonSchema): JsonSchema => rest

function listOf(item: JsonSchema, list: JsonSchema, title: string): Omit<Extract<FormField, { type: 'list' }>, keyof Head> {
  const fields = item.type === 'object' && item.dimension === undefined ? fieldsOf(item) : [fieldOf('', { title, ...item })].filter(field => field !== null)
  return { type: 'list', fields, most: list.maxItems ?? Infinity, least: list.minItems ?? 0, blank: units => blankOf(item, units) }
}

function wayOf(schema: JsonSchema) {
  const value = String(schema.properties?.by?.const ?? '')
  return { value, label: schema.title ?? wordsOf(value), fields: fieldsOf(schema), blank: (units: 'SI' | 'US') => blankOf(schema, units) }
}

/** `firstMoment` → `First moment`; words of a choice are written as they are. */
function wordsOf(name: string): string {
  const spaced = name.replaceAll(/([a-z])([A-Z])/g, (_, before: string, after: string) => `${before} ${after.toLowerCase()}`).replaceAll('-', ' ')
  return spaced.charAt(0).toUpperCase() + spaced.slice(1)
}
