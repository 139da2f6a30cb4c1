/** The inputs of a calculation with a variable at another value; everything else stays the same object. */
import type { Variable } from '#shared/calc/inverse/variables'
import type { TypedQuantity } from '#shared/calc/types'
import { parseQuantity } from '#shared/units/quantity'
import { fromEngine } from '#shared/units/units'

/** The text of a number, with no more digits than a double holds. */
const written = (value: number): string => String(Number(value.toPrecision(15)))

/** @param value in the unit of the variable; several places are changed in the proportion of the first. */
export function withValue(inputs: unknown, variable: Variable, value: number): unknown {
  const by = value / variable.value
  return variable.paths.reduce((whole, path, i) => replaced(whole, path.split('.'), (typed) => {
    const read = parseQuantity(typed as TypedQuantity, variable.dimension)
    if (!read.ok) return typed
    return { text: written(i === 0 ? value : fromEngine(read.engine, read.unit) * by), unit: read.unit }
  }), inputs)
}

function replaced(value: unknown, [key, ...rest]: readonly string[], next: (now: unknown) => unknown): unknown {
  if (key === undefined) return next(value)
  if (Array.isArray(value)) return value.map((item: unknown, i) => (String(i) === key ? replaced(item, rest, next) : item))
  return { ...(value as object), [key]: replaced((value as Record<string, unknown>)[key], rest, next) }
}
