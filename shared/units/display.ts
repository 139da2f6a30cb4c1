/**
 * How values are shown (methods reference §10, rules 3 to 7). The only place
 * where a number is rounded; what decides always reads the full value.
 */
import type { Dimension, FittingUnit, UnitId } from '#shared/units/units'
import type { DecimalNumber, Rounding } from '#shared/units/round-decimal'
import { fromEngine } from '#shared/units/units'
import { decimalOf, positional, roundDigits, roundPlaces } from '#shared/units/round-decimal'

/** Between a number and its unit, and between groups of three digits. */
export const thinSpace = '\u2009'
export const minusSign = '\u2212'
/** Shown where there is no value; it is not zero. */
export const noValue = '–'

/** Significant figures by dimension. Length is for computed lengths: a typed one is shown as typed. */
const figures: Record<Exclude<Dimension, 'ratio' | 'margin' | 'temperature'>, number> = {
  length: 5, area: 5, firstMoment: 5, inertia: 5, warping: 5, sectorial: 5, torsionalStiffness: 5, rotationalStiffness: 5, warpingStiffness: 5, decay: 5, number: 5,
  force: 4, torque: 4, distributedTorque: 4, stress: 4, rateOfTwist: 4, rateGradient: 4, bimoment: 4, shearFlow: 4, density: 4,
  angle: 3,
}
const ratioPlaces = 3

interface Written { sign: string, whole: string, fraction: string, power: number }

/** Engineering notation outside 10⁻³…10⁶, judged on the rounded value. */
function write(number: DecimalNumber): Written {
  const zero = /^0*$/.test(number.digits)
  const power = zero || (number.exponent >= -3 && number.exponent < 6) ? 0 : Math.floor(number.exponent / 3) * 3
  return { sign: number.negative ? '-' : '', ...positional(number.digits, number.exponent - power), power }
}

const grouped = (whole: string, separator: string): string =>
  whole.length < 4 ? whole : whole.replaceAll(/\B(?=(\d{3})+$)/g, separator)

const raised = (power: number): string =>
  String(power).replaceAll(/[-\d]/g, sign => (sign === '-' ? '⁻' : '⁰¹²³⁴⁵⁶⁷⁸⁹'.charAt(Number(sign))))

function asText({ sign, whole, fraction, power }: Written): string {
  const head = `${sign === '-' ? minusSign : ''}${grouped(whole, thinSpace)}${fraction === '' ? '' : `.${fraction}`}`
  return power === 0 ? head : `${head}×10${raised(power)}`
}

/** `count` significant figures with grouping and power of ten, e.g. `152 400`, `2.7536×10⁶`. `up` and `down` are away from and towards zero. */
export function significant(value: number, count: number, rounding: Rounding = 'nearest'): string {
  if (!Number.isFinite(value)) return noValue
  if (value === 0) return '0'
  return asText(write(roundDigits(decimalOf(value), count, rounding)))
}

/** A fixed number of decimals. */
export function decimals(value: number, places: number, rounding: Rounding = 'nearest'): string {
  if (!Number.isFinite(value)) return noValue
  const number = roundPlaces(decimalOf(value), places, rounding)
  return asText({ sign: number.negative ? '-' : '', ...positional(number.digits, number.exponent), power: 0 })
}

/** The number alone. `value` is in engine units; it is shown in `unit`. */
export function showValue<D extends Dimension, U extends UnitId>(value: number, dimension: D, unit: FittingUnit<D, U>): string {
  return valueIn(value, dimension, unit)
}

function valueIn(value: number, dimension: Dimension, unit: UnitId): string {
  if (!Number.isFinite(value)) return noValue
  if (dimension === 'margin') return showMargin(value)
  const shown = fromEngine(value, unit)
  // A stress ratio is rounded up, so that 1 is never shown for what exceeds it.
  if (dimension === 'ratio') return decimals(shown, unit === '%' ? ratioPlaces - 2 : ratioPlaces, 'up')
  if (dimension === 'temperature') return decimals(shown, 1).replace(/\.0$/, '')
  return significant(shown, figures[dimension])
}

/** Number, thin space, unit; the degree sign closes up. `value` is in engine units. */
export function showQuantity<D extends Dimension, U extends UnitId>(value: number, dimension: D, unit: FittingUnit<D, U>): string {
  return withUnit(valueIn(value, dimension, unit), unit)
}

/** Sets a unit behind a number that is already text, such as a typed one. */
export function withUnit(number: string, unit: UnitId): string {
  if (unit === '') return number
  return unit === '°' ? `${number}°` : `${number}${thinSpace}${unit}`
}

/** Hundredths of a margin, truncated towards −∞; a nanohundredth absorbs the binary writing of 0.29. */
function marginHundredths(ms: number): number {
  return ms >= 0 ? Math.floor(100 * ms + 1e-9) : Math.min(-1, -Math.ceil(-100 * ms - 1e-9))
}

const hundredths = (count: number): string => {
  const digits = String(Math.abs(count)).padStart(3, '0')
  return `${grouped(digits.slice(0, -2), thinSpace)}.${digits.slice(-2)}`
}

/** A margin of safety: two decimals, truncated, always signed; null means nothing is loaded. */
export function showMargin(ms: number | null): string {
  if (ms === null) return 'high (no load)'
  if (!Number.isFinite(ms)) return noValue
  if (ms > 10) return '>+10'
  const count = marginHundredths(ms)
  return `${count < 0 ? minusSign : '+'}${hundredths(count)}`
}

/** The reserve factor beside that margin: 1 + the margin shown, so that the two never disagree. */
export function showReserve(ms: number | null): string {
  if (ms === null) return 'high (no load)'
  if (!Number.isFinite(ms)) return noValue
  return ms > 10 ? '>11' : hundredths(marginHundredths(ms) + 100)
}

/** A number as TeX at `count` significant figures, e.g. `2.753560\times 10^{6}`. */
export function texNumber(value: number, count: number): string {
  if (!Number.isFinite(value)) return '\\text{–}'
  if (value === 0) return '0'
  const { sign, whole, fraction, power } = write(roundDigits(decimalOf(value), count))
  const head = `${sign}${grouped(whole, '\\,')}${fraction === '' ? '' : `.${fraction}`}`
  return power === 0 ? head : `${head}\\times 10^{${power}}`
}

const texPowers: Record<string, string> = { '²': '^{2}', '³': '^{3}', '⁴': '^{4}', '⁶': '^{6}' }

/** A unit as TeX, upright: `\mathrm{N{\cdot}mm^{2}}`. */
export function texUnit(unit: UnitId): string {
  if (unit === '') return ''
  const set = unit
    .replaceAll('·', '{\\cdot}')
    .replaceAll(/[²³⁴⁶]/g, power => texPowers[power] ?? power)
    .replaceAll('°', '{}^{\\circ}')
    .replaceAll('%', '\\%')
  return `\\mathrm{${set}}`
}

/** Number and unit as TeX; `value` is in engine units. Six figures is what the working shows. */
export function texQuantity(value: number, unit: UnitId, count = 6): string {
  const number = texNumber(fromEngine(value, unit), count)
  if (unit === '') return number
  return unit === '°' ? `${number}^{\\circ}` : `${number}\\,${texUnit(unit)}`
}
