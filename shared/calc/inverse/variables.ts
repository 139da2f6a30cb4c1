/** What of a calculation may be varied: every typed number of its form that is greater than zero and not linked. */
import type { FormField } from '#shared/calc/form/form-fields'
import type { TypedQuantity } from '#shared/calc/types'
import { parseQuantity } from '#shared/units/quantity'
import { fromEngine, type Dimension, type UnitId } from '#shared/units/units'

export interface Variable {
  /** Places in the inputs that change together, in proportion. */
  paths: readonly string[]
  label: string
  dimension: Dimension
  /** The unit it was typed in, and its value there; of several places that of the first. */
  unit: UnitId
  value: number
}

const THICKNESS = /^Thickness/

/** One variable for each number, and one for all thicknesses together where there are several. */
export function variablesOf(fields: readonly FormField[], inputs: unknown): Variable[] {
  const each = fields.flatMap(field => within(field, inputs, ''))
  const thick = each.filter(({ label }) => THICKNESS.test(label))
  const [first] = thick
  const all = first && thick.length > 1 ? [{ ...first, paths: thick.flatMap(({ paths }) => paths), label: 'Thickness of all walls' }] : []
  return [...all, ...each]
}

const inside = (value: unknown, key: string): unknown => (typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[key] : undefined)
const join = (at: string, key: string): string => (at === '' ? key : key === '' ? at : `${at}.${key}`)
const asText = (value: unknown): string => (typeof value === 'string' ? value.trim() : '')

function within(field: FormField, holder: unknown, at: string): Variable[] {
  const value = field.path === '' ? holder : inside(holder, field.path)
  const path = join(at, field.path)
  switch (field.type) {
    case 'quantity': return quantityVariable(field.title, field.dimension, value, path)
    case 'group': return field.fields.flatMap(one => within(one, value, path))
    case 'ways': {
      const way = field.ways.find(one => one.value === inside(value, 'by'))
      return way ? way.fields.flatMap(one => within(one, value, path)) : []
    }
    case 'list': return Array.isArray(value) ? value.flatMap((row: unknown, i) => field.fields.flatMap(one => within(one, row, `${path}.${i}`)).map(one => ({ ...one, label: `${one.label}, ${rowName(row, i, field.title)}` }))) : []
    default: return []
  }
}

/** `Thickness, wall a (web)`: rows are named by what they call themselves. */
function rowName(row: unknown, i: number, title: string): string {
  const [id, name] = [asText(inside(row, 'id')) || asText(inside(row, 'node')), asText(inside(row, 'name')) || asText(inside(row, 'title'))]
  const of = `${title.toLowerCase().replace(/s$/, '')} ${id || i + 1}`
  return name === '' || name === id ? of : `${of} (${name})`
}

function quantityVariable(title: string, dimension: Dimension, typed: unknown, path: string): Variable[] {
  if (typeof typed !== 'object' || typed === null || !('text' in typed) || 'from' in typed) return []
  const read = parseQuantity(typed as TypedQuantity, dimension)
  return read.ok && read.engine > 0 ? [{ paths: [path], label: title, dimension, unit: read.unit, value: fromEngine(read.engine, read.unit) }] : []
}
