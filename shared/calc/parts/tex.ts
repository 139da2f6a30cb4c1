/** TeX of the working: six figures, engine units, negative numbers in brackets. */
import type { WorkingLine } from '#shared/calc/types'
import { texNumber, texQuantity } from '#shared/units/display'
import { fromEngine, type UnitId } from '#shared/units/units'

export const FIGURES = 6

/** Six figures; zeros at the end are left out where the value is exact without them, so that 2.5 mm stays 2.5 mm. */
function figures(value: number): number {
  for (let count = 1; count < FIGURES; count++) {
    if (Math.abs(Number(value.toPrecision(count)) - value) <= 1e-12 * Math.abs(value)) return Math.max(count, wholeDigits(value))
  }
  return FIGURES
}

const wholeDigits = (value: number) => Math.abs(value) >= 1 && Math.abs(value) < 1e6 ? Math.min(Math.floor(Math.log10(Math.abs(value))) + 1, FIGURES) : 1

/** A number inside a formula. */
export const num = (value: number): string => value < 0 ? `(${texNumber(value, figures(value))})` : texNumber(value, figures(value))

/** A number with its unit inside a formula; the value is in engine units and the unit one of them. */
export const qty = (value: number, unit: UnitId): string => value < 0 ? `(${res(value, unit)})` : res(value, unit)

/** The result at the end of a line, in any unit of its dimension; the value is in engine units. */
export const res = (value: number, unit: UnitId): string => texQuantity(value, unit, figures(fromEngine(value, unit)))

/** Names inside TeX indices; ids hold only letters, digits and . _ + / -. */
export const sub = (id: string): string => `\\text{${id.replaceAll('_', '\\_')}}`

/** A symbol with a name as its index, e.g. `t_{\text{a}}`. */
export const sym = (letter: string, id: string): string => `${letter}_{${sub(id)}}`

export const line = (symbols: string, numbers: string, result: string): WorkingLine => ({ symbols, numbers, result })

/** At most this many terms are written out in a sum. */
const MOST_TERMS = 12

/** Terms added up, or the sum sign where they would run off the page. */
export function addends(terms: string[], short: string): string {
  return terms.length > MOST_TERMS ? short : terms.map((term, i) => i > 0 && term.startsWith('(-') ? `- ${term.slice(2, -1)}` : `${i > 0 ? '+ ' : ''}${term}`).join(' ')
}
