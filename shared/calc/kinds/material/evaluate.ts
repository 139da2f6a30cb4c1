import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { materialRecord } from '#shared/calc/parts/material-fields'
import type { MaterialModel } from '#shared/calc/parts/model'
import { output } from '#shared/calc/parts/output'
import { readMaterial } from '#shared/calc/parts/parse-material'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader } from '#shared/calc/parts/typed-reader'
import type { Evaluation, Output } from '#shared/calc/types'

/** The record as values that texts may be tied to and calculations linked to. Guards are raised where it is used. */
export function evaluateMaterial(inputs: unknown, links: Links = noLinks): Evaluation {
  const checked = materialRecord.safeParse(inputs)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const read = typedReader(links)
  const model = readMaterial(checked.data, 'material', read)
  if (!model || read.faults.length > 0) return { ok: false, faults: read.faults.map(f => ({ ...f, path: f.path.replace(/^material\./, '') })) }
  return {
    ok: true,
    result: {
      kind: 'material', methodRevision: METHOD_REVISION, outputs: propertyOutputs(model), walls: [], cases: [], margins: [], governing: null, guards: [], working: [], drawing: null,
    },
  }
}

function propertyOutputs(m: MaterialModel): Output[] {
  const of = (key: string, symbol: string, label: string, value: number | null, primary = false) =>
    output(key, symbol, `${label}, ${m.id}`, value, 'stress', key === 'E' ? m.units.E : key === 'G' ? m.units.G : m.units.strength, '§9', { primary })
  return [
    ...of('E', 'E', 'Modulus of elasticity', m.E), ...of('G', 'G', 'Shear modulus', m.G, true),
    ...output('nu', '\\nu', `Poisson’s ratio, ${m.id}`, m.nu, 'number', '', '§9'),
    ...of('Ftu', 'F_{tu}', 'Ultimate tension strength', m.Ftu), ...of('Fty', 'F_{ty}', 'Yield strength in tension', m.Fty),
    ...of('Fsu', 'F_{su}', 'Ultimate shear strength', m.Fsu, true),
    ...of('Fsy', 'F_{sy}', m.FsyGiven ? 'Yield strength in shear' : 'Yield strength in shear, Fty/√3', m.Fsy, true),
  ]
}
