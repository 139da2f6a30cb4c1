import { noLinks, type Links } from '#shared/calc/links'
import { combinedStressSchema, type CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import { materialNamed, type ParsedModel } from '#shared/calc/parts/bar-fields'
import { judgeMargins, type JudgedMargins, type MarginMode, type MarginSet } from '#shared/calc/parts/margin-rows'
import type { CaseHead, FactorModel, MaterialModel, Refused, Unusual } from '#shared/calc/parts/model'
import { parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { knockdownOf, levelsOf } from '#shared/calc/parts/strength'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { Fault } from '#shared/calc/types'
import { atOneFibre, bendingWithShear, circleRule, compressionWithShear, powerRule, varyingOnly, vonMises } from '#shared/torsion/combined/interaction'
import type { Reserve } from '#shared/torsion/margins'
import type { Refusal } from '#shared/torsion/section'

export type Rule
  = | { by: 'circle' } | { by: 'none' } | { by: 'steady', steady: 'normal' | 'shear' } | { by: 'powers', a: number, b: number }
    | { by: 'panel', Fc: number, Fs: number, loaded: 'compression' | 'bending' }
export interface CombinedPoint extends CaseHead { place: string, material: MaterialModel, normal: { title: string, sigma: number }[], torsion: number, warping: number, direct: number }
export interface CombinedModel {
  units: 'SI' | 'US'
  rule: Rule
  points: CombinedPoint[]
  materials: MaterialModel[]
  factors: FactorModel
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean }
  refused: Refused[]
  unusual: Unusual[]
}
/** Ratios at ultimate with the factors in force, and their reserve by the rule. */
export interface CombinedState { point: CombinedPoint, sigma: number, tau: number, equivalent: number, toLimit: number, toUltimate: number, ratios: { Rn: number, Rs: number } | null, reserve: Reserve | Refusal | null, /** The steady part alone reaches the criterion: the reserve is that of all loads together. */ exhausted: boolean }
export interface CombinedSolution extends JudgedMargins { model: CombinedModel, states: CombinedState[] }

export function parseCombinedStress(value: unknown, links: Links = noLinks): ParsedModel<CombinedModel> {
  const checked = combinedStressSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const rule = readRule(inputs.rule, read)
  if (inputs.points.length === 0) read.fault('points', 'Add at least one point.')
  const ids = new Set<string>()
  const points = inputs.points.flatMap((_, i) => readPoint(inputs, i, materials, ids, read) ?? [])
  const factors = parseFactors(inputs.factors, read)
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  if (!rule || !factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  return { ok: true, model: { units: inputs.units, rule, points, materials, factors, declarations: { ...inputs.declarations, taper: taper?.value ?? null }, refused: read.refused, unusual: read.unusual } }
}

function readRule(rule: CombinedStressInputs['rule'], read: TypedReader): Rule | null {
  if (rule.by === 'powers') {
    const [a, b] = [read.positive(rule.a, 'rule.a', { label: 'the exponent of the normal ratio', dimension: 'number' }), read.positive(rule.b, 'rule.b', { label: 'the exponent of the shear ratio', dimension: 'number' })]
    return a && b ? { by: 'powers', a: a.value, b: b.value } : null
  }
  if (rule.by !== 'panel') return rule
  const [Fc, Fs] = [read.positive(rule.Fc, 'rule.Fc', { label: 'the allowable normal stress', dimension: 'stress', typical: 'strength' }), read.positive(rule.Fs, 'rule.Fs', { label: 'the allowable shear stress', dimension: 'stress', typical: 'strength' })]
  return Fc && Fs ? { by: 'panel', Fc: Fc.value, Fs: Fs.value, loaded: rule.loaded } : null
}

function readPoint(inputs: CombinedStressInputs, i: number, materials: readonly MaterialModel[], ids: Set<string>, read: TypedReader): CombinedPoint | null {
  const point = inputs.points[i]
  if (!point) return null
  const at = `points.${i}`
  if (ids.has(point.id)) read.fault(`${at}.id`, `Point ${point.id} is listed twice; names stay unique.`)
  ids.add(point.id)
  const material = materialNamed(point.material, `${at}.material`, `point ${point.id}`, inputs, materials, read)
  const temperature = read.optional(point.temperature, `${at}.temperature`, { label: `the temperature of point ${point.id}`, dimension: 'temperature' })
  const stress = (typed: typeof point.torsion, path: string, label: string) => read.number(typed, `${at}.${path}`, { label: `${label} at point ${point.id}`, dimension: 'stress' })
  const normal = point.normal.flatMap((one, k) => {
    const sigma = stress(one.sigma, `normal.${k}.sigma`, 'a normal stress')
    return sigma ? [{ title: one.title, sigma: sigma.value }] : []
  })
  const [torsion, warping, direct] = [stress(point.torsion, 'torsion', 'the shear of torsion'), stress(point.warping, 'warping', 'the shear of warping'), stress(point.direct, 'direct', 'the direct shear')]
  if (!material || !torsion || !warping || !direct) return null
  return { id: point.id, title: point.title, source: point.source, level: point.level, temperature, place: point.place, material, normal, torsion: torsion.value, warping: warping.value, direct: direct.value }
}

export const EQUIVALENT: MarginMode = { mode: 'equivalent-yield', label: 'Equivalent stress, yield', level: 'limit', dimension: 'stress' }
export const INTERACTION: MarginMode = { mode: 'interaction-ultimate', label: 'Interaction, ultimate', level: 'ultimate', dimension: 'ratio' }

export function solveCombinedStress(model: CombinedModel): { ok: true, solution: CombinedSolution } | { ok: false, faults: Fault[] } {
  const faults: Fault[] = []
  const states = model.points.flatMap((point, i): CombinedState[] => {
    const levels = levelsOf(model.factors, point.level)
    if (!levels.ok) {
      faults.push({ path: `points.${i}`, message: levels.reason })
      return []
    }
    const { sigma, tau } = atOneFibre(point.normal.map(one => one.sigma), { sv: point.torsion, omega: point.warping, direct: point.direct })
    const factor = levels.toUltimate * model.factors.special
    const ratios = ratiosOf(model.rule, point, Math.abs(sigma) * factor, tau * factor)
    const exhausted = ratios !== null && steadyAlone(model.rule, ratios)
    const reserve = ratios && (exhausted ? circleRule(ratios.Rn, ratios.Rs) : reserveOf(model.rule, ratios))
    if (reserve && !reserve.ok) faults.push({ path: `points.${i}`, message: reserve.reason })
    return [{ point, sigma, tau, equivalent: vonMises(sigma, tau), toLimit: levels.toLimit, toUltimate: levels.toUltimate, ratios, reserve, exhausted }]
  })
  return faults.length > 0 ? { ok: false, faults } : { ok: true, solution: { model, states, ...judgeMargins(marginSets(model, states)) } }
}

/** Applied over allowable at ultimate; null where an allowable is missing. */
function ratiosOf(rule: Rule, { material, temperature }: CombinedPoint, sigma: number, tau: number): CombinedState['ratios'] {
  if (rule.by === 'none') return null
  if (rule.by === 'panel') return { Rn: sigma / rule.Fc, Rs: tau / rule.Fs }
  const k = knockdownOf(material, temperature?.value)
  return material.Ftu === null || material.Fsu === null ? null : { Rn: sigma / (k * material.Ftu), Rs: tau / (k * material.Fsu) }
}

/** No multiplier of the varying part remains; what the loads together lack is still a number, and a negative margin. */
const steadyAlone = (rule: Rule, { Rn, Rs }: { Rn: number, Rs: number }): boolean => rule.by === 'steady' && (rule.steady === 'normal' ? Rn : Rs) >= 1

function reserveOf(rule: Rule, { Rn, Rs }: { Rn: number, Rs: number }): Reserve | Refusal {
  switch (rule.by) {
    case 'powers': return powerRule(Rn, Rs, rule.a, rule.b)
    case 'panel': return rule.loaded === 'compression' ? compressionWithShear(Rn, Rs) : bendingWithShear(Rn, Rs)
    case 'steady': return rule.steady === 'normal' ? varyingOnly(Rn, Rs, 2, 2) : varyingOnly(Rs, Rn, 2, 2)
    default: return circleRule(Rn, Rs)
  }
}

/** One place per point, since each stands for one fibre in one case. */
function marginSets(model: CombinedModel, states: readonly CombinedState[]): MarginSet[] {
  const { factors } = model
  return states.flatMap(({ point, equivalent, toLimit, reserve }) => {
    const place = point.place.trim() === '' ? `point ${point.id}` : point.place.trim()
    const strength = point.material.Fty
    const one = (mode: MarginMode, applied: number, allowable: number, unit: MarginSet['places'][number]['unit']): MarginSet =>
      ({ mode, places: [{ where: point.id, place, unit }], caseIds: [point.id], applied: Float64Array.of(applied), allowable: Float64Array.of(allowable) })
    return [
      ...(strength === null ? [] : [one(EQUIVALENT, equivalent * toLimit * factors.specialAtLimit, strength * knockdownOf(point.material, point.temperature?.value), point.material.units.strength)]),
      ...(reserve?.ok ? [one(INTERACTION, reserve.rf === null ? 0 : 1 / reserve.rf, 1, '')] : []),
    ]
  })
}
