import type { FactorsInput, LoadingInput } from '#shared/calc/parts/loading-fields'
import type { CaseModel, FactorModel, Measured } from '#shared/calc/parts/model'
import type { TypedReader } from '#shared/calc/parts/typed-reader'
import { specialFactor } from '#shared/torsion/factors'
import { showValue } from '#shared/units/display'
import { engineUnit, type Dimension } from '#shared/units/units'

/** The id under which results of a single torque stand. */
export const SINGLE_CASE = 'T'

export function parseCases(loading: LoadingInput, read: TypedReader): CaseModel[] {
  if (loading.by === 'torque') {
    const torque = read.number(loading.torque, 'loading.torque', { label: 'the torque', dimension: 'torque', typical: 'torque' })
    const temperature = read.optional(loading.temperature, 'loading.temperature', { label: 'the temperature', dimension: 'temperature' })
    return torque ? [{ id: SINGLE_CASE, title: 'Applied torque', source: loading.source, level: loading.level, torque, rate: null, temperature }] : []
  }
  if (loading.by === 'table') return linkedCases(loading.table, loading.quantity, read)
  if (loading.cases.length === 0) read.fault('loading.cases', 'Add at least one load case.')
  const ids = new Set<string>()
  return loading.cases.flatMap((row, i): CaseModel[] => {
    const at = `loading.cases.${i}`
    if (ids.has(row.id)) read.fault(`${at}.id`, `Case ${row.id} is listed twice; case names stay unique.`)
    ids.add(row.id)
    const temperature = read.optional(row.temperature, `${at}.temperature`, { label: `the temperature of case ${row.id}`, dimension: 'temperature' })
    const head = { id: row.id, title: row.title, source: row.source, level: row.level, temperature }
    if ('torque' in row) {
      const torque = read.number(row.torque, `${at}.torque`, { label: `the torque of case ${row.id}`, dimension: 'torque', typical: 'torque' })
      return torque ? [{ ...head, torque, rate: null }] : []
    }
    const rate = read.number(row.rate, `${at}.rate`, { label: `the rate of twist of case ${row.id}`, dimension: 'rateOfTwist', typical: 'rate' })
    return rate ? [{ ...head, torque: null, rate }] : []
  })
}

/** Torques or rates of twist of another calculation, case by case. */
function linkedCases(table: string, quantity: string, read: TypedReader): CaseModel[] {
  const got = read.links.cases(table, quantity)
  if (!got.ok) {
    read.fault('loading.table', got.reason)
    return []
  }
  return got.cases.flatMap(({ id, title, source, level, temperature, value, dimension }): CaseModel[] => {
    const head = { id, title, source, level, temperature: temperature === null ? null : measured(temperature, 'temperature') }
    if (dimension === 'torque') return [{ ...head, torque: measured(value, dimension), rate: null }]
    if (dimension === 'rateOfTwist') return [{ ...head, torque: null, rate: measured(value, dimension) }]
    read.fault('loading.quantity', `Case ${id} gives neither a torque nor a rate of twist; choose another quantity.`)
    return []
  })
}

/** What would have been typed is written only where it is asked for: of a thousand cases for a few. */
const measured = (value: number, dimension: Dimension): Measured => {
  const unit = engineUnit(dimension)
  return { value, unit, get typed() { return showValue(value, dimension, unit) } }
}

const SPECIALS = ['fitting', 'casting', 'bearing'] as const

/** Factors in force: the highest special factor, never a product of two (methods §7.1). */
export function parseFactors(input: FactorsInput, read: TypedReader): FactorModel | null {
  const ultimate = read.positive({ text: input.ultimate, unit: '' }, 'factors.ultimate', { label: 'the factor of safety', dimension: 'ratio' })
  const specials = SPECIALS.flatMap((name) => {
    const factor = read.optionalPositive({ text: input[name], unit: '' }, `factors.${name}`, { label: `the ${name} factor`, dimension: 'ratio' })
    return factor ? [{ name, value: factor.value }] : []
  })
  if (ultimate && ultimate.value < 1) read.fault('factors.ultimate', 'The factor of safety must be at least 1.')
  if (!ultimate) return null
  const special = specialFactor(Object.fromEntries(specials.map(s => [s.name, s.value]))).value
  return {
    ultimate: ultimate.value, specials, special, specialAtLimit: input.onLimit ? special : 1,
    onLimit: input.onLimit, divideUltimate: input.divideUltimate, partial: input.partial, reason: input.reason.trim(),
  }
}
