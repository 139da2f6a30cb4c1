/**
 * A quantity as a person typed it, read as a number with its unit. The typed
 * text is what is stored; this is how browser and server both read it.
 */
import type { Dimension, UnitId } from '#shared/units/units'
import { dimensionOf, isUnit, toEngine, unitFits, unitsOf } from '#shared/units/units'
import { parseUnit } from '#shared/units/parse-unit'

/** The same shape as `TypedQuantity` of the calculations; its unit is untrusted here. */
export interface TypedText { readonly text: string, readonly unit: string }

export type ParsedQuantity
  = | {
    ok: true
    /** In `unit`. */
    value: number
    /** The unit inside the text, or else that of the field. */
    unit: UnitId
    /** The same value in engine units (N, mm, MPa, rad, °C). */
    engine: number
  }
  | { ok: false, message: string }

const refuse = (message: string): ParsedQuantity => ({ ok: false, message })

/** Longer than any quantity a person writes; a bound on what untrusted text may cost. */
const longest = 80

const dimensionNames: Record<Dimension, string> = {
  length: 'a length', area: 'an area', inertia: 'a fourth power of length', warping: 'a sixth power of length',
  sectorial: 'a sectorial coordinate', force: 'a force', torque: 'a torque', stress: 'a stress', angle: 'an angle',
  rateOfTwist: 'a rate of twist', temperature: 'a temperature', ratio: 'a ratio', density: 'a density', bimoment: 'a bimoment',
  shearFlow: 'a shear flow', torsionalStiffness: 'a torsional stiffness', margin: 'a margin', number: 'a bare number',
  firstMoment: 'a third power of length', distributedTorque: 'a distributed torque', rotationalStiffness: 'a rotational stiffness',
  warpingStiffness: 'a stiffness against warping', decay: 'a reciprocal length', rateGradient: 'a change of the rate of twist',
}

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹'
const decimal = String.raw`(?:\d+(?: \d{3})*(?:\.\d*)?|\.\d+)`
const numberPattern = new RegExp(
  `^([+-]?) ?(?:(?:(\\d+)[ -])?(\\d+) ?/ ?(\\d+)(?![\\d.])|(${decimal})(?:[eE]([+-]?\\d{1,3})(?![\\d.])| ?[×*x] ?10(?:\\^([+-]?\\d{1,3})|([⁺⁻]?[${superscripts}]{1,3})))?)`,
)
/** A group of three after a space is a thousand only if no further digit follows. */
const strayDigit = /^ ?[\d.]/

function tidy(text: string): string {
  return text
    .replaceAll(/[\s\u2009\u202F\u00A0]+/g, ' ')
    .replaceAll(/[\u2212\u2013](?=[ \d.])/g, '-')
    .trim()
}

function exponentOf(plain: string | undefined, raised: string | undefined): string {
  if (plain) return plain
  if (!raised) return '0'
  return raised.replace('⁻', '-').replace('⁺', '').replaceAll(new RegExp(`[${superscripts}]`, 'g'), digit => String(superscripts.indexOf(digit)))
}

/** The number at the head of the text and what follows it, or null. */
function readNumber(text: string): { value: number, rest: string } | null {
  const match = numberPattern.exec(text)
  if (!match) return null
  const [all, sign, whole, upper, lower, digits, plainExponent, caretExponent, raisedExponent] = match
  const rest = text.slice(all.length)
  if (strayDigit.test(rest)) return null
  const size = upper !== undefined
    ? Number(whole ?? 0) + Number(upper) / Number(lower)
    : Number(`${(digits ?? '').replaceAll(' ', '')}e${exponentOf(plainExponent ?? caretExponent, raisedExponent)}`)
  return { value: sign === '-' ? -size : size, rest: rest.trim() }
}

const asked = (dimension: Dimension): string => {
  const units = unitsOf(dimension).filter(unit => unit !== '')
  return units.length === 0 ? 'Write a number without a unit.' : `Write it in ${units.slice(0, 4).join(', ')}.`
}

/** The unit that holds: the one inside the text, else that of the field. */
function chooseUnit(written: string, field: string, dimension: Dimension): { ok: true, unit: UnitId } | { ok: false, message: string } {
  const unit = written === '' ? (isUnit(field) ? field : null) : parseUnit(written)
  if (unit === null) return { ok: false, message: `The unit “${(written || field).slice(0, 20)}” is not known here. ${asked(dimension)}` }
  if (unitFits(unit, dimension)) return { ok: true, unit }
  const is = unit === '' ? 'A number without a unit was given' : `${unit} is ${dimensionNames[dimensionOf(unit)]}`
  return { ok: false, message: `${is}; ${dimensionNames[dimension]} is asked for. ${asked(dimension)}` }
}

/**
 * Reads typed text as a quantity of the dimension asked for. Accepts `12.5`,
 * `1.2e3`, `1.2×10³`, `3/16`, `1 3/16`, thousands set off by a space, and a
 * unit inside the text, which then overrides that of the field. A comma is
 * refused, because it is a decimal sign to some and a thousand to others.
 */
export function parseQuantity(typed: TypedText, dimension: Dimension): ParsedQuantity {
  if (typed.text.length > longest) return refuse('This is too long for a quantity. Write a number and, if it differs, its unit.')
  const text = tidy(typed.text)
  if (text === '') return refuse('Write a value.')
  if (/\d,\d|^,|,$/.test(text)) return refuse('A comma can mean a decimal sign or a thousand. Write the decimal sign as a point, and thousands with a space or nothing.')
  const read = readNumber(text)
  if (!read) return refuse(`“${text.slice(0, 20)}” is not a number. Write, for example, 12.5 or 3/16.`)
  if (!Number.isFinite(read.value)) return refuse('This number is not finite. Check the fraction or the power of ten.')
  const chosen = chooseUnit(read.rest, typed.unit, dimension)
  if (!chosen.ok) return chosen
  const engine = toEngine(read.value, chosen.unit)
  if (!Number.isFinite(engine)) return refuse('This number is too large. Check its power of ten and its unit.')
  return { ok: true, value: read.value, unit: chosen.unit, engine }
}
