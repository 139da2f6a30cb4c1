import { noLinks, type Links } from '#shared/calc/links'
import { imposedTwistSchema, type ImposedTwistInputs } from '#shared/calc/kinds/imposed-twist/schema'
import { materialNamed, type ParsedModel } from '#shared/calc/parts/bar-fields'
import { judgeMargins, marginSet, type MarginMode } from '#shared/calc/parts/margin-rows'
import type { CaseHead, FactorModel, MaterialModel, Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { knockdownOf, levelsOf, strengthUnit, type StrengthName } from '#shared/calc/parts/strength'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { Fault, MarginRow } from '#shared/calc/types'
import { vonMises } from '#shared/torsion/combined/interaction'
import { followTwist, shareTwist, type FollowingPart, type FollowingResponse } from '#shared/torsion/imposed/imposed-twist'

export interface ImposedCase extends CaseHead { rate: Measured, gradient: Measured | null }
export interface ImposedModel {
  units: 'SI' | 'US'
  by: 'open' | 'other'
  J: Measured, t: Measured | null, K: number, WT: Measured | null
  material: MaterialModel
  materials: MaterialModel[]
  Gamma: Measured | null, omega: Measured | null, offset: Measured | null, fibre: Measured | null, structure: Measured | null
  cases: ImposedCase[]
  factors: FactorModel
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean }
  refused: Refused[]
  unusual: Unusual[]
}
export interface SolvedImposed { model: ImposedCase, response: FollowingResponse, sigma: number, equivalent: number, toLimit: number, toUltimate: number }
export interface ImposedSolution { model: ImposedModel, part: FollowingPart, ratio: number | null, cases: SolvedImposed[], margins: MarginRow[], governing: MarginRow | null }

export function parseImposedTwist(value: unknown, links: Links = noLinks): ParsedModel<ImposedModel> {
  const checked = imposedTwistSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const material = materialNamed(inputs.material, 'material', 'the part', inputs, materials, read)
  const section = readSection(inputs, read)
  const positive = (field: 'Gamma' | 'omega' | 'fibre' | 'structure', label: string, dimension: 'warping' | 'sectorial' | 'length' | 'torsionalStiffness') => read.optionalPositive(inputs[field], field, { label, dimension })
  const [Gamma, omega] = [positive('Gamma', 'the warping constant', 'warping'), positive('omega', 'the largest sectorial coordinate', 'sectorial')]
  const [fibre, structure] = [positive('fibre', 'the outermost fibre', 'length'), positive('structure', 'the stiffness of the structure', 'torsionalStiffness')]
  const offset = read.optional(inputs.offset, 'offset', { label: 'the offset of the attachment', dimension: 'length' })
  const cases = readCases(inputs, read)
  const factors = parseFactors(inputs.factors, read)
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  if (!material || !section || !factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  return { ok: true, model: { units: inputs.units, by: inputs.section.by, ...section, material, materials, Gamma, omega, offset, fibre, structure, cases, factors, declarations: { ...inputs.declarations, taper: taper?.value ?? null }, refused: read.refused, unusual: read.unusual } }
}

function readSection({ section }: ImposedTwistInputs, read: TypedReader): Pick<ImposedModel, 'J' | 't' | 'K' | 'WT'> | null {
  const J = read.positive(section.J, 'section.J', { label: 'the torsion constant', dimension: 'inertia' })
  if (section.by === 'open') {
    const t = read.positive(section.t, 'section.t', { label: 'the thickness', dimension: 'length', typical: 'thickness' })
    const K = read.optionalPositive(section.K, 'section.K', { label: 'the corner factor', dimension: 'number' })
    return J && t ? { J, t, K: Math.max(K?.value ?? 1, 1), WT: null } : null
  }
  const WT = read.positive(section.WT, 'section.WT', { label: 'the torsional modulus', dimension: 'firstMoment' })
  return J && WT ? { J, t: null, K: 1, WT } : null
}

function readCases({ cases }: ImposedTwistInputs, read: TypedReader): ImposedCase[] {
  if (cases.length === 0) read.fault('cases', 'Add at least one load case.')
  const ids = new Set<string>()
  return cases.flatMap((row, i): ImposedCase[] => {
    const at = `cases.${i}`
    if (ids.has(row.id)) read.fault(`${at}.id`, `Case ${row.id} is listed twice; case names stay unique.`)
    ids.add(row.id)
    const temperature = read.optional(row.temperature, `${at}.temperature`, { label: `the temperature of case ${row.id}`, dimension: 'temperature' })
    const rate = read.number(row.rate, `${at}.rate`, { label: `the rate of twist of case ${row.id}`, dimension: 'rateOfTwist', typical: 'rate' })
    const gradient = read.optional(row.gradient, `${at}.gradient`, { label: `the change of the rate of case ${row.id}`, dimension: 'rateGradient' })
    return rate ? [{ id: row.id, title: row.title, source: row.source, level: row.level, temperature, rate, gradient }] : []
  })
}

export const SHEAR_ULTIMATE: MarginMode = { mode: 'shear-ultimate', label: 'Shear, ultimate', level: 'ultimate', dimension: 'stress' }
export const SHEAR_YIELD: MarginMode = { mode: 'shear-yield', label: 'Shear, yield', level: 'limit', dimension: 'stress' }
export const EQUIVALENT: MarginMode = { mode: 'equivalent-yield', label: 'Equivalent stress, yield', level: 'limit', dimension: 'stress' }

export function solveImposedTwist(model: ImposedModel): { ok: true, solution: ImposedSolution } | { ok: false, faults: Fault[] } {
  const { material, J, t, K, WT, Gamma, omega, fibre, offset } = model
  const E = material.E ?? 0
  const GJ = material.G * J.value
  const part: FollowingPart = {
    GJ, shearPerRate: t ? K * material.G * t.value : GJ / (WT?.value ?? 1),
    warping: Gamma && material.E !== null ? { EG: material.E * Gamma.value, E: material.E, omega: omega?.value ?? 0 } : null,
  }
  const faults: Fault[] = []
  const cases = model.cases.flatMap((one, i): SolvedImposed[] => {
    const response = followTwist(part, { rate: one.rate.value, gradient: one.gradient?.value ?? 0, offset: offset?.value ?? 0, fibre: fibre?.value ?? 0, E })
    const levels = levelsOf(model.factors, one.level)
    if (!response.ok || !levels.ok) {
      faults.push({ path: `cases.${i}`, message: response.ok ? levels.ok ? '' : levels.reason : response.reason })
      return []
    }
    const sigma = Math.abs(response.sigmaWarping) + Math.abs(response.sigmaBending)
    return [{ model: one, response, sigma, equivalent: vonMises(sigma, response.tau), toLimit: levels.toLimit, toUltimate: levels.toUltimate }]
  })
  const shared = model.structure ? shareTwist(GJ, model.structure.value) : null
  if (shared && !shared.ok) faults.push({ path: 'structure', message: shared.reason })
  if (faults.length > 0) return { ok: false, faults }
  const { rows, governing } = judgeMargins(marginSets(model, cases))
  return { ok: true, solution: { model, part, ratio: shared?.ok ? shared.ratio : null, cases, margins: rows, governing } }
}

function marginSets({ material, factors }: ImposedModel, cases: readonly SolvedImposed[]) {
  const place = [{ where: '', place: 'the part', unit: strengthUnit([material]) }]
  const caseIds = cases.map(c => c.model.id)
  const set = (mode: MarginMode, name: StrengthName, stress: (c: SolvedImposed) => number, factor: (c: SolvedImposed) => number) => marginSet(mode, place, caseIds, (_, i) => {
    const [c, strength] = [cases[i], material[name]]
    return c && strength !== null ? { applied: stress(c) * factor(c), allowable: strength * knockdownOf(material, c.model.temperature?.value) } : null
  })
  return [
    set(SHEAR_ULTIMATE, 'Fsu', c => c.response.tau, c => c.toUltimate * factors.special), set(SHEAR_YIELD, 'Fsy', c => c.response.tau, c => c.toLimit * factors.specialAtLimit),
    ...(cases.some(c => c.sigma > 0) ? [set(EQUIVALENT, 'Fty', c => c.equivalent, c => c.toLimit * factors.specialAtLimit)] : []),
  ]
}
