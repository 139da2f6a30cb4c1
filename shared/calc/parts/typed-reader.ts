/** Reads typed fields and gathers every fault with its path, so that a form can show all of them at once. */
import type { Fault, TypedQuantity } from '#shared/calc/types'
import type { Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { parseQuantity } from '#shared/units/quantity'
import type { Dimension } from '#shared/units/units'

/** Usual size of an input in engine units; three decades either way are let pass (G-44, common practice). */
export type Typical = 'thickness' | 'wall length' | 'radius' | 'torque' | 'rate' | 'modulus' | 'strength' | 'bar length' | 'twist'
const TYPICAL: Record<Typical, number> = {
  'thickness': 2, 'wall length': 50, 'radius': 5, 'torque': 1e5, 'rate': 1e-4, 'modulus': 7e4, 'strength': 300, 'bar length': 500, 'twist': 0.05,
}

/** What is asked of a field beside being readable. */
export interface Rule { label: string, dimension: Dimension, typical?: Typical }

export interface TypedReader {
  faults: Fault[]
  refused: Refused[]
  unusual: Unusual[]
  fault: (path: string, message: string) => void
  /** Any finite number; a fault where it cannot be read. */
  number: (typed: TypedQuantity, path: string, rule: Rule) => Measured | null
  /** Greater than zero; a fault otherwise, since nothing can be computed without it. */
  positive: (typed: TypedQuantity, path: string, rule: Rule) => Measured | null
  /** Empty is absent; not above zero is refused (G-01) and left out of the results. */
  optionalPositive: (typed: TypedQuantity | null, path: string, rule: Rule) => Measured | null
  /** Empty is absent; any sign. */
  optional: (typed: TypedQuantity | null, path: string, rule: Rule) => Measured | null
}

export function typedReader(): TypedReader {
  const faults: Fault[] = []
  const refused: Refused[] = []
  const unusual: Unusual[] = []
  const fault = (path: string, message: string) => {
    faults.push({ path, message })
  }

  function number(typed: TypedQuantity, path: string, rule: Rule): Measured | null {
    if (typed.text.trim() === '') {
      fault(path, `Give ${rule.label}.`)
      return null
    }
    const read = parseQuantity(typed, rule.dimension)
    if (!read.ok) {
      fault(path, read.message)
      return null
    }
    if (Math.abs(read.engine) > 1e15) {
      fault(path, `G-01: ${rule.label} is too large to compute with; check the number and its unit.`)
      return null
    }
    noteUnusual(read.engine, read.unit, path, rule)
    return { value: read.engine, unit: read.unit, typed: typed.text.trim() }
  }

  function noteUnusual(value: number, unit: Unusual['unit'], path: string, rule: Rule) {
    if (!rule.typical || value === 0) return
    const typical = TYPICAL[rule.typical]
    const ratio = Math.abs(value) / typical
    if (ratio < 1e-3 || ratio > 1e3) unusual.push({ path, label: rule.label, value, dimension: rule.dimension, unit, typical })
  }

  function positive(typed: TypedQuantity, path: string, rule: Rule): Measured | null {
    const read = number(typed, path, rule)
    if (read && read.value <= 0) {
      fault(path, `G-01: ${rule.label} must be greater than zero; “${read.typed}” is not.`)
      return null
    }
    return read && largeEnough(read, path, rule)
  }

  /** A ratio to something next to nothing leaves the range of numbers. */
  function largeEnough(read: Measured, path: string, rule: Rule): Measured | null {
    if (read.value >= 1e-9) return read
    fault(path, `G-01: ${rule.label} is too small to compute with; check the number and its unit.`)
    return null
  }

  function optional(typed: TypedQuantity | null, path: string, rule: Rule): Measured | null {
    return typed === null || typed.text.trim() === '' ? null : number(typed, path, rule)
  }

  function optionalPositive(typed: TypedQuantity | null, path: string, rule: Rule): Measured | null {
    const read = optional(typed, path, rule)
    if (read && read.value <= 0) {
      refused.push({ path, label: rule.label, typed: `${read.typed} ${read.unit}`.trim(), value: read.value })
      return null
    }
    return read && largeEnough(read, path, rule)
  }

  return { faults, refused, unusual, fault, number, positive, optionalPositive, optional }
}
