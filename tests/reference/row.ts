/** One published or independently computed value and how the engine is asked for it. */
import type { Engine } from './engine'

export interface Tolerance { readonly kind: 'rel' | 'abs', readonly value: number }
export const rel = (value: number): Tolerance => ({ kind: 'rel', value })
export const abs = (value: number): Tolerance => ({ kind: 'abs', value })

export interface ReferenceRow {
  /** C-nn of the methods reference, or a section of it, or the independent program's section. */
  readonly id: string
  readonly quantity: string
  readonly inputs: string
  readonly expected: number
  readonly unit: string
  readonly tolerance: Tolerance
  readonly source: string
  readonly actual: (engine: Engine) => number
  /** Section of the method that computes it, where the id does not say it: `4.1` for an outline that checks C-44. */
  readonly section?: string
}

/** How far a value is from the expected one, in tolerances: up to 1 it agrees. */
export function deviation({ expected, tolerance }: ReferenceRow, value: number): number {
  const allowed = tolerance.kind === 'rel' ? tolerance.value * Math.abs(expected) : tolerance.value
  return Math.abs(value - expected) / allowed
}

/** A row in one line. */
export const row = (id: string, quantity: string, inputs: string, expected: number, unit: string, tolerance: Tolerance, source: string, actual: (engine: Engine) => number): ReferenceRow =>
  ({ id, quantity, inputs, expected, unit, tolerance, source, actual })

/** The same rows, filed under the section of the method that computes them. */
export const provenBy = (section: string, rows: readonly ReferenceRow[]): ReferenceRow[] => rows.map(one => ({ ...one, section }))
