/** From typed inputs to numbers in N, mm, MPa, rad, °C; or every fault, each with the path of its field. */
import type { FirstInput, GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { FirstResult, GeneralOutlineModel } from '#shared/calc/kinds/general-outline/model'
import type { Fault } from '#shared/calc/types'
import { parseOutline } from '#shared/calc/kinds/general-outline/parse-outline'
import { generalOutlineSchema } from '#shared/calc/kinds/general-outline/schema'
import { noLinks, type Links } from '#shared/calc/links'
import { parseCases, parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { Outline } from '#shared/torsion/outline/outline'

export type Parsed = { ok: true, model: GeneralOutlineModel } | { ok: false, faults: Fault[] }

export function parseGeneralOutline(value: unknown, links: Links = noLinks): Parsed {
  const checked = generalOutlineSchema.safeParse(value)
  return checked.success ? parseChecked(checked.data, links) : { ok: false, faults: schemaFaults(checked.error) }
}

/** The outline of inputs alone, for whoever solves it beforehand; null where it cannot be read. */
export function outlineOfInputs(value: unknown, links: Links = noLinks): Outline | null {
  const checked = generalOutlineSchema.safeParse(value)
  return checked.success ? parseOutline(checked.data, typedReader(links))?.outline ?? null : null
}

function parseChecked(inputs: GeneralOutlineInputs, links: Links): Parsed {
  const read = typedReader(links)
  if (inputs.materials.length !== 1) read.fault('materials', 'A general outline is of one material; keep one.')
  const [material] = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const cases = parseCases(inputs.loading, read)
  const factors = parseFactors(inputs.factors, read)
  const length = read.optionalPositive(inputs.length, 'length', { label: 'the length of the bar', dimension: 'length', typical: 'bar length' })
  const twistAllowed = read.optionalPositive(inputs.twistAllowed, 'twistAllowed', { label: 'the twist allowed', dimension: 'angle', typical: 'twist' })
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  const first = parseFirst(inputs.first, read)
  const drawn = parseOutline(inputs, read)
  if (!drawn || !material || !factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  return {
    ok: true,
    model: {
      units: inputs.units, ...drawn, material, by: cases.some(c => c.rate) ? 'rate' : 'torque', cases,
      length, twistAllowed, twistOrigin: inputs.twistOrigin.trim(), factors, ends: inputs.ends, first,
      declarations: { ...inputs.declarations, taper: taper?.value ?? null }, refused: read.refused, unusual: read.unusual,
    },
  }
}

/** What the first method gave. A closed section needs its face factor, without which no difference is expected. */
function parseFirst(input: FirstInput, read: TypedReader): FirstResult | null {
  if (input.by === 'none') return null
  const J = read.optionalPositive(input.J, 'first.J', { label: 'the torsion constant of the first method', dimension: 'inertia' })
  const W = read.optionalPositive(input.W, 'first.W', { label: 'the torsional modulus of the first method', dimension: 'firstMoment' })
  const Gamma = read.optionalPositive(input.Gamma, 'first.Gamma', { label: 'the warping constant of the first method', dimension: 'warping' })
  if (!J && !W && !Gamma) read.fault('first.J', 'Give at least one value of the first method, or choose that there is none.')
  const chi = input.method === 'closed' ? read.positive({ text: input.chi, unit: '' }, 'first.chi', { label: 'the largest face factor χ', dimension: 'ratio' }) : null
  return { method: input.method === 'closed' ? { kind: 'closed', chi: chi?.value ?? Infinity } : { kind: input.method }, J, W, Gamma, source: input.source.trim() }
}
