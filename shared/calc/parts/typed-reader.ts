/** Reads typed fields and gathers every fault with its path, so that a form can show all of them at once. */
import { fitsDimension, noLinks, type LinkSource, type Links } from '#shared/calc/links'
import type { Fault, TypedQuantity } from '#shared/calc/types'
import type { Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { parseQuantity } from '#shared/units/quantity'
import { showQuantity } from '#shared/units/display'
import { unitFits, engineUnit, type Dimension } from '#shared/units/units'

/** Usual size of an input in engine units; three decades either way are let pass (G-44, common practice). */
export type Typical = 'thickness' | 'wall length' | 'radius' | 'torque' | 'rate' | 'modulus' | 'strength' | 'bar length' | 'twist'
const TYPICAL: Record<Typical, number> = {
  'thickness': 2, 'wall length': 50, 'radius': 5, 'torque': 1e5, 'rate': 1e-4, 'modulus': 7e4, 'strength': 300, 'bar length': 500, 'twist': 0.05,
}

/** What is asked of a field beside being readable. */
export interface Rule { label: string, dimension: Dimension, typical?: Typical }

export interface TypedReader {
  links: Links
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

type Got = { ok: true, read: Measured } | { ok: false, message: string }
const unread = (message: string): Got => ({ ok: false, message })

/** The value of one field, linked or typed, in engine units. */
function readValue(typed: TypedQuantity, rule: Rule, links: Links): Got {
  const got = typed.from ? linkedValue(typed.from, typed, rule, links) : typedValue(typed, rule)
  return got.ok && Math.abs(got.read.value) > 1e15 ? unread(`G-01: ${rule.label} is too large to compute with; check the number and its unit.`) : got
}

function typedValue(typed: TypedQuantity, rule: Rule): Got {
  if (typed.text.trim() === '') return unread(`Give ${rule.label}.`)
  const read = parseQuantity(typed, rule.dimension)
  return read.ok ? { ok: true, read: { value: read.engine, unit: read.unit, typed: typed.text.trim() } } : unread(read.message)
}

function linkedValue(source: LinkSource, typed: TypedQuantity, rule: Rule, links: Links): Got {
  const got = links.value(source)
  if (!got.ok) return unread(got.reason)
  if (!fitsDimension(got.dimension, rule.dimension)) return unread(`What is linked for ${rule.label} is of another dimension; choose a value that fits, or type one.`)
  const unit = unitFits(typed.unit, rule.dimension) ? typed.unit : engineUnit(rule.dimension)
  return { ok: true, read: { value: got.value, unit, typed: showQuantity(got.value, rule.dimension, unit) } }
}

/** `links` gives the values of fields that are linked instead of typed. */
export function typedReader(links: Links = noLinks): TypedReader {
  const faults: Fault[] = []
  const refused: Refused[] = []
  const unusual: Unusual[] = []
  const fault = (path: string, message: string) => {
    faults.push({ path, message })
  }

  function number(typed: TypedQuantity, path: string, rule: Rule): Measured | null {
    const got = readValue(typed, rule, links)
    if (!got.ok) {
      fault(path, got.message)
      return null
    }
    noteUnusual(got.read.value, got.read.unit, path, rule)
    return got.read
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
    return typed === null || (!typed.from && typed.text.trim() === '') ? null : number(typed, path, rule)
  }

  function optionalPositive(typed: TypedQuantity | null, path: string, rule: Rule): Measured | null {
    const read = optional(typed, path, rule)
    if (read && read.value <= 0) {
      refused.push({ path, label: rule.label, typed: `${read.typed} ${read.unit}`.trim(), value: read.value })
      return null
    }
    return read && largeEnough(read, path, rule)
  }

  return { links, faults, refused, unusual, fault, number, positive, optionalPositive, optional }
}
