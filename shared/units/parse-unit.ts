/**
 * The many ways people write a unit, read as one of ours. Letter case counts
 * (mPa is not MPa); only spellings that cannot mean anything else are taken.
 */
import type { UnitId } from '#shared/units/units'
import { isUnit } from '#shared/units/units'

/** Written forms that the rules below do not reach. Left side: after `tidy`. */
const otherSpellings: Record<string, UnitId> = {
  'mpa': 'MPa', 'gpa': 'GPa', 'kpa': 'kPa', 'hpa': 'hPa', 'pa': 'Pa', 'PSI': 'psi', 'KSI': 'ksi', 'MSI': 'Msi', 'msi': 'Msi', 'MN/m²': 'MPa',
  'kn': 'kN', 'LBF': 'lbf', 'kips': 'kip', 'KIP': 'kip', 'klbf': 'kip',
  'in.': 'in', 'inch': 'in', 'inches': 'in', '″': 'in', '"': 'in', 'ft.': 'ft', '′': 'ft',
  'Nm': 'N·m', 'Nmm': 'N·mm', 'kNm': 'kN·m', 'm·N': 'N·m', 'mm·N': 'N·mm',
  'lb·in': 'lbf·in', 'in·lb': 'lbf·in', 'in·lbf': 'lbf·in', 'lb·ft': 'lbf·ft', 'ft·lb': 'lbf·ft', 'ft·lbf': 'lbf·ft',
  'in·kip': 'kip·in', 'ft·kip': 'kip·ft', 'kips·in': 'kip·in', 'kips·ft': 'kip·ft',
  'Nmm²': 'N·mm²', 'Nm²': 'N·m²', 'kNm²': 'kN·m²', 'lb·in²': 'lbf·in²', 'in²·lbf': 'lbf·in²', 'in²·lb': 'lbf·in²',
  'lb/in': 'lbf/in', 'lbf/in²': 'psi', 'lb/in²': 'psi',
  'deg': '°', 'degree': '°', 'degrees': '°', 'º': '°', 'radian': 'rad', 'radians': 'rad',
  'deg/mm': '°/mm', 'deg/m': '°/m', 'deg/in': '°/in', 'deg/ft': '°/ft',
  'º/mm': '°/mm', 'º/m': '°/m', 'º/in': '°/in', 'º/ft': '°/ft',
  'degC': '°C', '°c': '°C', 'ºC': '°C', '℃': '°C', 'C': '°C', 'degF': '°F', '°f': '°F', 'ºF': '°F', '℉': '°F', 'F': '°F',
  'percent': '%',
}

const powers: Record<string, string> = { 2: '²', 3: '³', 4: '⁴', 6: '⁶' }

/** One written form for products and powers: `kip - in` → `kip·in`, `mm^4` → `mm⁴`. */
function tidy(text: string): string {
  return text
    .normalize('NFC')
    .replaceAll(/[\s\u2009\u202F\u00A0]+/g, ' ')
    .trim()
    .replaceAll(/ ?\/ ?/g, '/')
    .replaceAll(/(?<=[a-z²³]) ?[*⋅∙•×.·\u2010\u2011-] ?(?=[a-z])/gi, '·')
    .replaceAll(/(?<=[a-z]) (?=[a-z])/gi, '·')
    .replaceAll(/(?<=[a-z])\^?([2346])(?![0-9])/gi, (_, power: string) => powers[power] ?? power)
}

/**
 * The unit that a text names, or null. The empty text is the unit of a bare
 * number. A bare `lb` is refused: it may be a mass or a force.
 */
export function parseUnit(text: string): UnitId | null {
  const tidied = tidy(text)
  if (isUnit(tidied)) return tidied
  return Object.hasOwn(otherSpellings, tidied) ? otherSpellings[tidied] ?? null : null
}
