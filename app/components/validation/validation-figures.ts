import type { ValidationCase } from '#shared/schemas/validation'
import { noValue, significant } from '#shared/units/display'
import { decimalOf } from '#shared/units/round-decimal'

/** An expected value is shown as it was published; the engine's in as many figures, three at the least. */
export function figuresOf({ expected, got }: Pick<ValidationCase, 'expected' | 'got'>): { expected: string, got: string } {
  const count = expected === 0 ? 3 : Math.max(3, decimalOf(expected).digits.replace(/0+$/, '').length)
  return { expected: significant(expected, count), got: got === null ? noValue : significant(got, count) }
}

/** Relative differences have no unit; an absolute one has that of the row. */
export const differenceText = ({ difference }: Pick<ValidationCase, 'difference'>): string => difference === null ? noValue : significant(difference, 2)
export const toleranceText = ({ tolerance }: Pick<ValidationCase, 'tolerance'>): string => `${significant(tolerance.value, 1)} ${tolerance.kind === 'rel' ? 'rel.' : 'abs.'}`

/** Whether every word occurs in what the row says. */
export function holdsWords({ id, section, quantity, inputs, source, unit }: ValidationCase, words: string): boolean {
  const text = [id, `§${section}`, quantity, inputs, source, unit].join(' ').toLowerCase()
  return words.toLowerCase().split(/\s+/).every(word => text.includes(word))
}
