import { noLinks, type Links } from '#shared/calc/links'
import { restrainedWarpingSchema, type RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'
import type { OpenSectionModel } from '#shared/calc/kinds/open-section/model'
import type { ParsedModel } from '#shared/calc/parts/bar-fields'
import type { CaseHead, FactorModel, Measured } from '#shared/calc/parts/model'
import { parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { parseWalls } from '#shared/calc/parts/parse-walls'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { Restraint } from '#shared/torsion/warping/warping-bar'

export interface SupportModel { z: number, twist: Restraint, warping: Restraint }
export interface WarpingCaseModel extends CaseHead {
  torques: { z: number, T: Measured }[]
  distributed: { from: number, to: number, m1: number, m2: number }[]
  eccentric: { z: number, node: string, P: Measured }[]
  /** N, tension positive. */
  axial: number
}
export interface RestrainedWarpingModel {
  units: 'SI' | 'US'
  /** The section as the open-section kind takes it, without loads. */
  section: OpenSectionModel
  length: Measured
  supports: SupportModel[]
  cases: WarpingCaseModel[]
  twistAllowed: Measured | null
  factors: FactorModel
  declarations: { fitting: boolean, repeated: boolean, builtIn: boolean, heldAlong: boolean }
}

type Case = RestrainedWarpingInputs['cases'][number]

export function parseRestrainedWarping(value: unknown, links: Links = noLinks): ParsedModel<RestrainedWarpingModel> {
  const checked = restrainedWarpingSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  twice(inputs.materials.map(m => m.id), i => `materials.${i}.id`, 'Material', read)
  twice(inputs.cases.map(c => c.id), i => `cases.${i}.id`, 'Case', read)
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const length = read.positive(inputs.length, 'length', { label: 'the length of the bar', dimension: 'length', typical: 'bar length' })
  const at = stationReader(length?.value ?? Number.NaN, read)
  const supports = inputs.supports.flatMap((_, i) => readSupport(inputs, i, at, read) ?? [])
  if (supports.some(({ z }, i) => supports.findIndex(one => Math.abs(one.z - z) <= 1e-9 * (length?.value ?? 0)) !== i)) read.fault('supports', 'Two supports stand at one station; keep one.')
  if (!inputs.supports.some(one => one.twist !== 'free')) read.fault('supports', 'Add a support that holds the bar against turning.')
  if (inputs.cases.length === 0) read.fault('cases', 'Add at least one load case.')
  const cases = inputs.cases.map((one, i) => readCase(one, `cases.${i}`, at, read))
  const factors = parseFactors(inputs.factors, read)
  const twistAllowed = read.optionalPositive(inputs.twistAllowed, 'twistAllowed', { label: 'the twist allowed', dimension: 'angle', typical: 'twist' })
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  const geometry = parseWalls(inputs, materials, read)
  geometry?.walls.forEach((wall, i) => {
    if (wall.E === null) read.fault(`walls.${i}.material`, `Restrained warping needs the modulus of elasticity: give it for material ${wall.material.id}.`)
  })
  if (!length || !geometry || !factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  const { heldAlong, ...declared } = inputs.declarations
  return {
    ok: true,
    model: {
      units: inputs.units, length, supports, cases, twistAllowed, factors, declarations: { ...declared, heldAlong },
      section: {
        units: inputs.units, profile: null, ...geometry, materials, by: 'torque', cases: [], length, twistAllowed: null, twistOrigin: '', factors, ends: 'free',
        declarations: { ...declared, taper: taper?.value ?? null }, refused: read.refused, unusual: read.unusual,
      },
    },
  }
}

function twice(names: string[], path: (i: number) => string, what: string, read: TypedReader) {
  names.forEach((one, i) => {
    if (names.indexOf(one) !== i) read.fault(path(i), `${what} ${one} is listed twice; names stay unique.`)
  })
}

type StationReader = (typed: Case['torques'][number]['z'], path: string, what: string) => number | null

/** A station on the bar: within its length to rounding, since the end may be typed in another unit. */
function stationReader(length: number, read: TypedReader): StationReader {
  return (typed, path, what) => {
    const z = read.number(typed, path, { label: `the station of ${what}`, dimension: 'length' })
    if (!z || Number.isNaN(length)) return null
    if (z.value >= 0 && z.value <= length * (1 + 1e-9)) return Math.min(z.value, length)
    read.fault(path, 'Give a station on the bar: from zero to its length.')
    return null
  }
}

function readSupport(inputs: RestrainedWarpingInputs, i: number, at: StationReader, read: TypedReader): SupportModel | null {
  const one = inputs.supports[i]
  if (!one) return null
  const path = `supports.${i}`
  const z = at(one.z, `${path}.z`, `support ${i + 1}`)
  const twist = restraintOf(one.twist, () => read.positive(one.twistStiffness ?? empty, `${path}.twistStiffness`, { label: `the stiffness against twist of support ${i + 1}`, dimension: 'rotationalStiffness' }))
  const warping = restraintOf(one.warping, () => read.positive(one.warpingStiffness ?? empty, `${path}.warpingStiffness`, { label: `the stiffness against warping of support ${i + 1}`, dimension: 'warpingStiffness' }))
  return z === null || twist === null || warping === null ? null : { z, twist, warping }
}

const empty = { text: '', unit: '' as const }

function restraintOf(choice: 'held' | 'free' | 'spring', stiffness: () => Measured | null): Restraint | null {
  if (choice === 'spring') return stiffness()?.value ?? null
  return choice === 'held' ? 'fixed' : 'free'
}

function readCase(one: Case, path: string, at: StationReader, read: TypedReader): WarpingCaseModel {
  const temperature = read.optional(one.temperature, `${path}.temperature`, { label: `the temperature of case ${one.id}`, dimension: 'temperature' })
  const axial = read.optional(one.axial, `${path}.axial`, { label: `the axial force of case ${one.id}`, dimension: 'force' })
  const torques = one.torques.flatMap((load, k) => {
    const z = at(load.z, `${path}.torques.${k}.z`, `torque ${k + 1} of case ${one.id}`)
    const T = read.number(load.T, `${path}.torques.${k}.T`, { label: `torque ${k + 1} of case ${one.id}`, dimension: 'torque', typical: 'torque' })
    return z !== null && T ? [{ z, T }] : []
  })
  const eccentric = one.eccentric.flatMap((load, k) => {
    const z = at(load.z, `${path}.eccentric.${k}.z`, `axial force ${k + 1} of case ${one.id}`)
    const P = read.number(load.P, `${path}.eccentric.${k}.P`, { label: `axial force ${k + 1} of case ${one.id}`, dimension: 'force' })
    return z !== null && P ? [{ z, P, node: load.node }] : []
  })
  const distributed = one.distributed.flatMap((_, k) => readDistributed(one, k, path, at, read) ?? [])
  return { id: one.id, title: one.title, source: one.source, level: one.level, temperature, torques, distributed, eccentric, axial: axial?.value ?? 0 }
}

function readDistributed(one: Case, k: number, base: string, at: StationReader, read: TypedReader): WarpingCaseModel['distributed'][number] | null {
  const load = one.distributed[k]
  if (!load) return null
  const path = `${base}.distributed.${k}`
  const what = `distributed torque ${k + 1} of case ${one.id}`
  const [from, to] = [at(load.from, `${path}.from`, `the start of ${what}`), at(load.to, `${path}.to`, `the end of ${what}`)]
  const m1 = read.number(load.m1, `${path}.m1`, { label: `the start value of ${what}`, dimension: 'distributedTorque' })
  const m2 = read.number(load.m2, `${path}.m2`, { label: `the end value of ${what}`, dimension: 'distributedTorque' })
  if (from === null || to === null || !m1 || !m2) return null
  if (to > from) return { from, to, m1: m1.value, m2: m2.value }
  read.fault(`${path}.to`, 'A distributed torque ends after its start: give a larger station.')
  return null
}
