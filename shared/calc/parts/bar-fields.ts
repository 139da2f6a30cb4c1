/** What every section kind asks beside its section: material, loading, the bar's length and its twist, factors, declarations. */
import type { z } from 'zod'
import { declarations } from '#shared/calc/parts/declaration-fields'
import { optionalQuantity, source } from '#shared/calc/parts/fields'
import { factors, loading } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'
import type { Fault } from '#shared/calc/types'
import type { CaseModel, FactorModel, MaterialModel, Measured } from '#shared/calc/parts/model'
import { parseCases, parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import type { TypedReader } from '#shared/calc/parts/typed-reader'

export const barFields = {
  materials,
  loading,
  length: optionalQuantity('Length of the bar', 'length', { symbol: 'L' }),
  twistAllowed: optionalQuantity('Twist allowed', 'angle', { symbol: '\\varphi_a', description: 'Over the length, at limit load.' }),
  twistOrigin: source.meta({ title: 'Origin of the twist allowed' }),
  factors,
  declarations,
}
export type BarInputs = { [Field in keyof typeof barFields]: z.infer<(typeof barFields)[Field]> }

export interface BarModel {
  materials: MaterialModel[]
  cases: CaseModel[]
  by: 'torque' | 'rate'
  length: Measured | null
  twistAllowed: Measured | null
  twistOrigin: string
  factors: FactorModel
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean }
}

/** Null where a fault was noted that leaves nothing to compute. */
export function parseBar(inputs: BarInputs, read: TypedReader): BarModel | null {
  const ids = new Set<string>()
  inputs.materials.forEach((m, i) => {
    if (ids.has(m.id)) read.fault(`materials.${i}.id`, `Material ${m.id} is listed twice; keep one record of each name.`)
    ids.add(m.id)
  })
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const cases = parseCases(inputs.loading, read)
  const factors = parseFactors(inputs.factors, read)
  const length = read.optionalPositive(inputs.length, 'length', { label: 'the length of the bar', dimension: 'length', typical: 'bar length' })
  const twistAllowed = read.optionalPositive(inputs.twistAllowed, 'twistAllowed', { label: 'the twist allowed', dimension: 'angle', typical: 'twist' })
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  if (!factors) return null
  return {
    materials, cases, by: cases.some(c => c.rate !== null) ? 'rate' : 'torque', length, twistAllowed, twistOrigin: inputs.twistOrigin.trim(), factors,
    declarations: { ...inputs.declarations, taper: taper?.value ?? null },
  }
}

/** The record a part names, or a fault at the field that names it. */
export function materialNamed(id: string, path: string, what: string, inputs: Pick<BarInputs, 'materials'>, materials: readonly MaterialModel[], read: TypedReader): MaterialModel | null {
  if (!inputs.materials.some(m => m.id === id)) read.fault(path, `Choose the material of ${what}.`)
  return materials.find(m => m.id === id) ?? null
}

export type ParsedModel<Model> = { ok: true, model: Model } | { ok: false, faults: Fault[] }

/** Fields of a fresh bar: one material, one torque, nothing typed. */
export function blankBar(units: 'SI' | 'US', material: BarInputs['materials'][number]): BarInputs {
  return {
    materials: [material],
    loading: { by: 'torque', torque: { text: '', unit: units === 'SI' ? 'N·m' : 'lbf·in' }, level: 'limit', temperature: null, source: '' },
    length: null, twistAllowed: null, twistOrigin: '',
    factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: '' },
    declarations: { fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false },
  }
}
