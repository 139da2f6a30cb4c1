/**
 * The slips by which a typed number comes to differ from the result it stands for.
 * Each is undone on the typed number, and what then equals a result is a candidate.
 * The list is what makes *near* exact: anything else is unrelated.
 */
import type { Fact, FactIndex } from '#shared/note/loose/facts'
import { factsBetween, factsIn } from '#shared/note/loose/facts'
import type { NumberToken } from '#shared/note/loose/number-tokens'
import { isValue } from '#shared/note/loose/precision'
import { toEngine, unitFits, unitsOf } from '#shared/units/units'
import type { UnitId } from '#shared/units/units'

export type SlipKind = 'transposed' | 'digit' | 'sign' | 'unit' | 'power' | 'factor' | 'angle' | 'kind'
export interface Slip { kind: SlipKind, fact: Fact, how: string }

/** Digits that must have been typed before a slip of that kind is believed, by how closely the words speak of the result (none, its case, its name). */
export const NEEDED_DIGITS: Record<SlipKind, readonly [number, number, number]> = {
  transposed: [4, 3, 3],
  digit: [5, 4, 3],
  sign: [4, 3, 2],
  unit: [4, 4, 3],
  power: [4, 4, 3],
  factor: [5, 4, 3],
  angle: [4, 4, 3],
  kind: [5, 4, 3],
}

interface Variant { kind: SlipKind, how: string, value: number, place: number, unit: UnitId }

/** Factors that are applied once too often or forgotten: safety, fitting, both, safety twice, and half for whole. */
const FACTORS: [number, string][] = [[1.5, 'a factor of 1.5'], [1.15, 'a factor of 1.15'], [1.725, 'factors of 1.5 and 1.15'], [2.25, 'a factor of 1.5 twice'], [2, 'a factor of 2']]
const POWERS = [-9, -6, -4, -3, -2, -1, 1, 2, 3, 4, 6, 9]

const numberOf = (digits: string, place: number) => Number(digits) * place

function digitVariants(token: NumberToken, unit: UnitId): Variant[] {
  const { digits, place } = token
  if (digits.length < 2 || digits.length > 12) return []
  const sign = token.value < 0 ? -1 : 1
  const variants: Variant[] = []
  const add = (kind: SlipKind, how: string, changed: string) => variants.push({ kind, how, value: sign * numberOf(changed, place), place, unit })
  for (let at = 0; at < digits.length; at += 1) {
    const [digit = '', next = ''] = [digits[at], digits[at + 1]]
    if (next !== '' && next !== digit) add('transposed', 'two digits have changed places', digits.slice(0, at) + next + digit + digits.slice(at + 2))
    // A difference of one in the last place is a rounding, not a slip.
    for (let other = 0; other <= 9; other += 1) {
      const close = at === digits.length - 1 && Math.abs(other - Number(digit)) <= 1
      if (String(other) !== digit && !close && !(at === 0 && other === 0)) add('digit', 'one digit differs', digits.slice(0, at) + String(other) + digits.slice(at + 1))
    }
  }
  return variants
}

function scaleVariants(token: NumberToken, unit: UnitId): Variant[] {
  const { value, place } = token
  const scaled = (kind: SlipKind, how: string, factor: number): Variant => ({ kind, how, value: value * factor, place: place * Math.abs(factor), unit })
  return [
    scaled('sign', 'its sign is turned', -1),
    ...FACTORS.flatMap(([factor, name]) => [scaled('factor', `it holds ${name} too much`, 1 / factor), scaled('factor', `it lacks ${name}`, factor)]),
    scaled('angle', 'degrees were taken for radians', Math.PI / 180),
    scaled('angle', 'radians were taken for degrees', 180 / Math.PI),
    ...POWERS.map(power => scaled('power', `it is off by a power of ten`, 10 ** power)),
  ]
}

/** The same digits in every other unit of the same kind. */
function unitVariants(token: NumberToken, unit: UnitId, index: FactIndex): Variant[] {
  const kinds = [...index.byDimension.keys()].filter(dimension => unitFits(unit, dimension))
  const others = new Set(kinds.flatMap(dimension => unitsOf(dimension)))
  others.delete(unit)
  return [...others].map(other => ({ kind: 'unit', how: `it is right in ${other || 'no unit'}, not in ${unit || 'no unit'}`, value: token.value, place: token.place, unit: other }))
}

function hits(variant: Variant, index: FactIndex, sameKind: readonly Fact[][]): Fact[] {
  const found: Fact[] = []
  const middle = Math.abs(toEngine(variant.value, variant.unit))
  const spread = Math.abs(toEngine(variant.place, variant.unit) - toEngine(0, variant.unit))
  for (const sorted of factsIn(variant.unit, index)) {
    if (!sameKind.includes(sorted)) continue
    found.push(...factsBetween(sorted, middle - spread, middle + spread).filter(fact => !fact.truncated && isValue(variant.value, variant.place / 2, fact, variant.unit)))
  }
  return found
}

/** The right number with a unit of another kind: mm² for mm⁴. */
function kindSlips(token: NumberToken, unit: UnitId, index: FactIndex): Slip[] {
  if (unit === '') return []
  const middle = Math.abs(token.value)
  return factsBetween(index.byOwn, middle - token.place, middle + token.place, fact => Math.abs(fact.own))
    .filter(fact => !unitFits(unit, fact.dimension) && fact.unit !== '' && !fact.truncated && isValue(token.value, token.place / 2, fact, fact.unit))
    .map(fact => ({ kind: 'kind', fact, how: `it is right in ${fact.unit}, which is another kind of quantity than ${unit}` }))
}

/** Every slip that would explain the number, in the order in which they are believed. */
export function slipsOf(token: NumberToken, unit: UnitId, index: FactIndex): Slip[] {
  if (token.digits.length < 2 || token.value === 0) return []
  const sameKind = factsIn(unit, index)
  const variants = [...unitVariants(token, unit, index), ...digitVariants(token, unit), ...scaleVariants(token, unit)]
  return [...variants.flatMap(variant => hits(variant, index, sameKind).map(fact => ({ kind: variant.kind, fact, how: variant.how }))), ...kindSlips(token, unit, index)]
}
