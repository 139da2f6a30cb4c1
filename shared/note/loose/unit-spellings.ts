/** The unit behind a number in running text. */
import { parseUnit } from '#shared/units/parse-unit'
import type { UnitId } from '#shared/units/units'
import { dimensions, unitsOf } from '#shared/units/units'

const SPACE = /[ \u00a0\u2009\u202f]/
const POWERS: Record<string, string> = { '²': '2', '³': '3', '⁴': '4', '⁶': '6' }
/** Written forms beyond the symbols themselves; what the units know of these is asked of them below. */
const WORDS = ['deg', 'degree', 'degrees', 'radian', 'radians', 'inch', 'inches', 'in.', '″', 'ft.', 'kips', 'deg/m', 'deg/mm', 'deg/in', 'deg/ft', 'degC', 'degF', '℃', '℉', 'percent',
  'MN/m²', 'lbf/in²', 'lb·in', 'in·lb', 'in·lbf', 'lb·ft', 'ft·lb', 'ft·lbf', 'lb/in', 'm·N', 'in·kip', 'Nm', 'Nmm', 'kNm', 'KSI', 'PSI', 'kips·in']
const SPELT: Record<string, UnitId> = {
  'per cent': '%', 'millimetres': 'mm', 'millimetre': 'mm', 'metres': 'm', 'metre': 'm', 'newtons': 'N', 'newton metres': 'N·m', 'newton millimetres': 'N·mm',
  'megapascals': 'MPa', 'gigapascals': 'GPa', 'degrees per metre': '°/m', 'radians per metre': 'rad/m', 'radians per millimetre': 'rad/mm', 'degrees per inch': '°/in',
  'degrees Celsius': '°C', 'degrees Fahrenheit': '°F',
}

function variants(symbol: string): string[] {
  const products = symbol.includes('·') ? ['·', '⋅', '*', '-', ' ', '\u2009', '.', '•'].map(dot => symbol.replaceAll('·', dot)) : [symbol]
  return products.flatMap((form) => {
    if (!/[²³⁴⁶]/.test(form)) return [form]
    return [form, form.replace(/[²³⁴⁶]/g, power => `^${POWERS[power] ?? ''}`), form.replace(/[²³⁴⁶]/g, power => POWERS[power] ?? '')]
  })
}

function buildSpellings(): Map<string, UnitId> {
  const found = new Map<string, UnitId>(Object.entries(SPELT))
  const symbols = dimensions.flatMap(dimension => unitsOf(dimension)).filter(symbol => symbol !== '')
  for (const spelling of [...symbols, ...WORDS].flatMap(variants)) {
    const unit = parseUnit(spelling)
    if (unit !== null) found.set(spelling, unit)
  }
  return found
}

const SPELLINGS = buildSpellings()
const LONGEST = Math.max(...[...SPELLINGS.keys()].map(spelling => spelling.length))
const FIRST = new Set([...SPELLINGS.keys()].map(spelling => spelling[0]))
const GOES_ON = /[\p{L}\p{N}/·⋅^°²³⁴⁶⁻_]/u

/** `3 in` is three inches before these, and the preposition before anything else. */
const AFTER_INCH = /^(?:[\s-]*(?:$|[.,;:)\]×+/=|]|and\b|or\b|to\b|by\b|x\b|from\b|off\b|at\b|thick|long|wide|deep|high|apart|inside|outside|radius|diameter|gap|pitch|is\b|are\b|was\b|on\b|per\b|above|below|over\b|under\b|plate|sheet|wall|bar|tube|rod|bolt|shim))/

export interface FoundUnit { unit: UnitId, to: number }

/** Reads the unit that follows a number at `at`, or null. `decimal` says that the number cannot be a mere count. */
export function unitAt(text: string, at: number, decimal: boolean): FoundUnit | null {
  const gap = SPACE.test(text[at] ?? '') ? 1 : text[at] === '-' && /[a-z]/i.test(text[at + 1] ?? '') ? 1 : 0
  const start = at + gap
  if (!FIRST.has(text[start])) return null
  for (let length = Math.min(LONGEST, text.length - start); length > 0; length -= 1) {
    const unit = SPELLINGS.get(text.slice(start, start + length))
    if (unit === undefined) continue
    const to = start + length
    if (GOES_ON.test(text[to] ?? '')) continue
    if (unit === 'in' && !isInch(text, start, to, gap, decimal)) return null
    return { unit, to }
  }
  return null
}

function isInch(text: string, start: number, to: number, gap: number, decimal: boolean): boolean {
  if (text[start] !== 'i' || to - start > 2 || gap === 0) return true
  const rest = text.slice(to, to + 14)
  return AFTER_INCH.test(rest) || (decimal && !/^\s+(?:the|a|an|this|that|case|cases|section|table|figure|both|each|all|any|[A-Z]+\d)/.test(rest))
}

/** The unit named in a heading of a table: `τ, MPa`, `J (mm⁴)`, `T [N·m]`. */
export function unitInHeading(heading: string): UnitId | null {
  const named = /[,([]\s*([^\s,()[\]][^,()[\]]{0,16}?)\s*[)\]]?\s*$/.exec(heading.slice(-40))
  return named?.[1] === undefined ? null : SPELLINGS.get(named[1]) ?? null
}
