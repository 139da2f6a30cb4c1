/** From typed inputs to numbers in N, mm, MPa, rad, °C; or every fault, each with the path of its field. */
import { noLinks, type Links } from '#shared/calc/links'
import type { Fault } from '#shared/calc/types'
import type { OpenSectionModel } from '#shared/calc/kinds/open-section/model'
import { parseProfile } from '#shared/calc/parts/parse-profile'
import { parseWalls } from '#shared/calc/parts/parse-walls'
import { parseCases, parseFactors } from '#shared/calc/parts/parse-loading'
import { parseMaterial } from '#shared/calc/parts/parse-material'
import { openSectionSchema, type OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader } from '#shared/calc/parts/typed-reader'

export type Parsed = { ok: true, model: OpenSectionModel } | { ok: false, faults: Fault[] }

export function parseOpenSection(value: unknown, links: Links = noLinks): Parsed {
  const checked = openSectionSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  return parseChecked(checked.data, links)
}

function parseChecked(inputs: OpenSectionInputs, links: Links): Parsed {
  const read = typedReader(links)
  checkMaterialNames(inputs, read.fault)
  const materials = inputs.materials.flatMap((m, i) => parseMaterial(m, i, read) ?? [])
  const cases = parseCases(inputs.loading, read)
  const factors = parseFactors(inputs.factors, read)
  const length = read.optionalPositive(inputs.length, 'length', { label: 'the length of the bar', dimension: 'length', typical: 'bar length' })
  const twistAllowed = read.optionalPositive(inputs.twistAllowed, 'twistAllowed', { label: 'the twist allowed', dimension: 'angle', typical: 'twist' })
  const taper = read.optional(inputs.declarations.taper, 'declarations.taper', { label: 'the half-angle of taper', dimension: 'angle' })
  const geometry = inputs.profile ? parseProfile(inputs.profile, inputs, materials, read) : parseWalls(inputs, materials, read)
  if (!geometry || !factors || read.faults.length > 0) return { ok: false, faults: read.faults }
  return {
    ok: true,
    model: {
      units: inputs.units, profile: null, ...geometry, materials, by: inputs.loading.by === 'rate' ? 'rate' : 'torque', cases,
      length, twistAllowed, twistOrigin: inputs.twistOrigin.trim(), factors, ends: inputs.ends,
      declarations: { ...inputs.declarations, taper: taper?.value ?? null },
      refused: read.refused, unusual: read.unusual,
    },
  }
}

function checkMaterialNames(inputs: OpenSectionInputs, fault: (path: string, message: string) => void) {
  const ids = new Set<string>()
  inputs.materials.forEach((m, i) => {
    if (ids.has(m.id)) fault(`materials.${i}.id`, `Material ${m.id} is listed twice; keep one record of each name.`)
    ids.add(m.id)
  })
}
