import { noLinks, type Links } from '#shared/calc/links'
import { torqueAlongBarSchema, type TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import type { ParsedModel } from '#shared/calc/parts/bar-fields'
import type { CaseHead, FactorModel, MaterialModel, Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { Segment } from '#shared/torsion/span/segment'
import type { SpanCase, SpanSupport } from '#shared/torsion/span/span-bar'

export interface BarSegment { id: string, title: string, material: MaterialModel, engine: Segment, /** Largest shear per torque at the slimmer end, 1/mm³; null where no modulus is given. */ perTorque: number | null, taper: number }
export interface BarSupport extends SpanSupport { clearance: number | null }
export interface BarCaseModel extends CaseHead { load: SpanCase }
export interface TorqueAlongBarModel {
  units: 'SI' | 'US'
  segments: BarSegment[]
  supports: BarSupport[]
  materials: MaterialModel[]
  cases: BarCaseModel[]
  twistAllowed: Measured | null
  factors: FactorModel
  declarations: { fitting: boolean, repeated: boolean, cutOut: 'none' | 'away from the peak' | 'at the peak', taper: number | null, layered: boolean, welded: boolean }
  refused: Refused[]
  unusual: Unusual[]
}

export function parseTorqueAlongBar(value: unknown, links: Links = noLinks): ParsedModel<TorqueAlongBarModel> {
  const checked = torqueAlongBarSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const segments = inputs.segments.flatMap((_, i) => readSegment(inputs, i, materials, read) ?? [])
  twice(inputs.segments.map(s => s.id), i => `segments.${i}.id`, 'Segment', read)
  const supports = readSupports(inputs, read)
  const cases = readCases(inputs, read)
  const factors = parseFactors(inputs.factors, read)
  const twistAllowed = read.optionalPositive(inputs.twistAllowed, 'twistAllowed', { label: 'the twist allowed', dimension: 'angle', typical: 'twist' })
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  if (!factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  return { ok: true, model: { units: inputs.units, segments, supports, materials, cases, twistAllowed, factors, declarations: { ...inputs.declarations, taper: taper?.value ?? null }, refused: read.refused, unusual: read.unusual } }
}

function twice(names: string[], path: (i: number) => string, what: string, read: TypedReader) {
  names.forEach((one, i) => {
    if (names.indexOf(one) !== i) read.fault(path(i), `${what} ${one} is listed twice; names stay unique.`)
  })
}

function readSegment(inputs: TorqueAlongBarInputs, i: number, materials: readonly MaterialModel[], read: TypedReader): BarSegment | null {
  const segment = inputs.segments[i]
  if (!segment) return null
  const at = (field: string) => `segments.${i}.${field}`
  const length = read.positive(segment.length, at('length'), { label: `the length of segment ${segment.id}`, dimension: 'length', typical: 'bar length' })
  if (!inputs.materials.some(m => m.id === segment.material)) read.fault(at('material'), `Choose the material of segment ${segment.id}.`)
  const material = materials.find(m => m.id === segment.material)
  const { section } = segment
  const head = { id: segment.id, title: segment.title }
  if (section.by === 'constants') {
    const J = read.positive(section.J, at('section.J'), { label: `the torsion constant of segment ${segment.id}`, dimension: 'inertia' })
    const WT = read.optionalPositive(section.WT, at('section.WT'), { label: `the torsional modulus of segment ${segment.id}`, dimension: 'firstMoment' })
    return length && J && material ? { ...head, material, taper: 0, perTorque: WT ? 1 / WT.value : null, engine: { length: length.value, stiffness: { along: 'uniform', GJ: material.G * J.value } } } : null
  }
  const d1 = read.positive(section.d1, at('section.d1'), { label: `the first diameter of segment ${segment.id}`, dimension: 'length', typical: 'radius' })
  const d2 = read.positive(section.d2, at('section.d2'), { label: `the second diameter of segment ${segment.id}`, dimension: 'length', typical: 'radius' })
  if (!length || !d1 || !d2 || !material) return null
  return {
    ...head, material, taper: Math.atan(Math.abs(d1.value - d2.value) / 2 / length.value), perTorque: 16 / (Math.PI * Math.min(d1.value, d2.value) ** 3),
    engine: { length: length.value, stiffness: { along: 'tapering circle', G: material.G, d1: d1.value, d2: d2.value } },
  }
}

/** A node by its number; a fault where there is no such node. */
function nodeOf(text: string, path: string, count: number, read: TypedReader): number | null {
  const node = /^\d{1,3}$/.test(text.trim()) ? Number(text.trim()) : Number.NaN
  if (node >= 0 && node <= count) return node
  read.fault(path, `Give a node from 0 to ${count}: node 0 is the start of the bar.`)
  return null
}

function readSupports({ supports, segments }: TorqueAlongBarInputs, read: TypedReader): BarSupport[] {
  if (supports.length === 0) read.fault('supports', 'Add a support that holds the bar against turning.')
  return supports.flatMap((support, i): BarSupport[] => {
    const node = nodeOf(support.node, `supports.${i}.node`, segments.length, read)
    const stiffness = read.optionalPositive(support.stiffness, `supports.${i}.stiffness`, { label: 'the stiffness of the support', dimension: 'rotationalStiffness' })
    const clearance = read.optional(support.clearance, `supports.${i}.clearance`, { label: 'the clearance of the support', dimension: 'angle' })
    return node === null ? [] : [{ node, stiffness: stiffness ? stiffness.value : 'rigid', clearance: clearance && clearance.value !== 0 ? clearance.value : null }]
  })
}

function readCases(inputs: TorqueAlongBarInputs, read: TypedReader): BarCaseModel[] {
  const count = inputs.segments.length
  if (inputs.cases.length === 0) read.fault('cases', 'Add at least one load case.')
  twice(inputs.cases.map(c => c.id), i => `cases.${i}.id`, 'Case', read)
  return inputs.cases.map((row, i): BarCaseModel => {
    const at = `cases.${i}`
    const temperature = read.optional(row.temperature, `${at}.temperature`, { label: `the temperature of case ${row.id}`, dimension: 'temperature' })
    const torques = row.torques.flatMap((one, k) => {
      const node = nodeOf(one.node, `${at}.torques.${k}.node`, count, read)
      const T = read.number(one.T, `${at}.torques.${k}.T`, { label: `torque ${k + 1} of case ${row.id}`, dimension: 'torque', typical: 'torque' })
      return node !== null && T ? [{ node, T: T.value }] : []
    })
    const distributed = row.distributed.flatMap((one, k) => {
      const segment = inputs.segments.findIndex(s => s.id === one.segment)
      if (segment < 0) read.fault(`${at}.distributed.${k}.segment`, `Choose a segment of the list for distributed torque ${k + 1} of case ${row.id}.`)
      const m1 = read.number(one.m1, `${at}.distributed.${k}.m1`, { label: 'the distributed torque at the start', dimension: 'distributedTorque' })
      const m2 = read.number(one.m2, `${at}.distributed.${k}.m2`, { label: 'the distributed torque at the end', dimension: 'distributedTorque' })
      return segment >= 0 && m1 && m2 ? [{ segment, m1: m1.value, m2: m2.value }] : []
    })
    return { id: row.id, title: row.title, source: row.source, level: row.level, temperature, load: { torques, distributed } }
  })
}
