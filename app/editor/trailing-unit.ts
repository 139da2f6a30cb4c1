import { parseUnit } from '#shared/units/parse-unit'
import type { UnitId } from '#shared/units/units'

/** The unit a typed quantity ends with, such as `N·m` in `3.76 N·m`; null for a bare number. */
export function trailingUnit(text: string): UnitId | null {
  const tail = /^[+\u2212-]?[\d.,\u2009\u202f ]*\d(?:\s*[×x]\s*10[⁻⁰¹²³⁴-⁹^−-]*\d*|e[+-]?\d+)?\s*(?<unit>\D.*)$/iu.exec(text.trim())?.groups?.unit
  return tail ? parseUnit(tail.trim()) : null
}
