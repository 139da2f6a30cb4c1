/**
 * Rounding on the decimal string of a value, half away from zero, so that
 * 0.285 shows as people expect and no floating multiplication moves a digit.
 */

/** A value as ± digits × 10^(exponent − digits.length + 1); `digits` has no leading zero unless the value is zero. */
export interface DecimalNumber { readonly negative: boolean, readonly digits: string, readonly exponent: number }

/** `up` and `down` are away from and towards zero. */
export type Rounding = 'nearest' | 'up' | 'down'

/** The shortest decimal that names this double. The value must be finite. */
export function decimalOf(value: number): DecimalNumber {
  const [mantissa = '0', exponent = '0'] = Math.abs(value).toExponential().split('e')
  return { negative: value < 0, digits: mantissa.replace('.', ''), exponent: Number(exponent) }
}

/** `digits` + 1 in its last place; 999 becomes 1000. */
function increment(digits: string): string {
  return (BigInt(digits === '' ? '0' : digits) + 1n).toString().padStart(digits.length, '0')
}

function roundsUp(dropped: string, rounding: Rounding): boolean {
  if (rounding === 'down') return false
  return rounding === 'up' ? /[1-9]/.test(dropped) : dropped >= '5'
}

/** Keeps `count` leading digits (padding with zeros), rounding the rest. `count` may be zero or less: the result is then 0 or one unit of that place. */
export function roundDigits(number: DecimalNumber, count: number, rounding: Rounding = 'nearest'): DecimalNumber {
  const digits = count < 0 ? '0'.repeat(-count) + number.digits : number.digits
  const kept = digits.slice(0, Math.max(count, 0)).padEnd(Math.max(count, 0), '0')
  const grown = roundsUp(digits.slice(Math.max(count, 0)), rounding) ? increment(kept) : kept
  if (/^0*$/.test(grown)) return { negative: false, digits: '0'.repeat(Math.max(count, 1)), exponent: 0 }
  if (count <= 0) return { ...number, digits: grown, exponent: number.exponent - count + 1 }
  const carried = grown.length > kept.length
  return { ...number, digits: carried ? grown.slice(0, count) : grown, exponent: carried ? number.exponent + 1 : number.exponent }
}

/** Rounds to `places` decimals. */
export function roundPlaces(number: DecimalNumber, places: number, rounding: Rounding = 'nearest'): DecimalNumber {
  const rounded = roundDigits(number, number.exponent + 1 + places, rounding)
  if (/^0*$/.test(rounded.digits)) return { negative: false, digits: '0'.repeat(places + 1), exponent: 0 }
  // A carry adds a digit in front, and the last place must stay where it was.
  return { ...rounded, digits: rounded.digits.padEnd(rounded.exponent + 1 + places, '0') }
}

/** Plain positional writing without sign: digits with a point after `shift + 1` of them. */
export function positional(digits: string, exponent: number): { whole: string, fraction: string } {
  if (exponent < 0) return { whole: '0', fraction: '0'.repeat(-exponent - 1) + digits }
  return { whole: digits.slice(0, exponent + 1).padEnd(exponent + 1, '0'), fraction: digits.slice(exponent + 1) }
}
