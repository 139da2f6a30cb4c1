import type { z } from 'zod'
import { evaluateMaterial } from '#shared/calc/kinds/material/evaluate'
import { METHOD_REVISION } from '#shared/calc/method'
import { materialRecord } from '#shared/calc/parts/material-fields'
import type { CalcKind } from '#shared/calc/types'
import type { UnitId } from '#shared/units/units'

/** A material record of the note: its calculations take it whole, or one property at a time. */
export const material: CalcKind<z.infer<typeof materialRecord>> = {
  kind: 'material',
  version: 1,
  title: 'Material',
  about: 'Properties and strengths with their basis and source.',
  record: true,
  methodRevision: METHOD_REVISION,
  schema: materialRecord,
  blank: () => blankMaterial('SI'),
  evaluate: evaluateMaterial,
}

/** A record with its fields left empty. */
export function blankMaterial(units: 'SI' | 'US'): z.infer<typeof materialRecord> {
  const empty = (unit: UnitId) => ({ text: '', unit })
  const [modulus, stress] = units === 'SI' ? ['GPa', 'MPa'] as const : ['Msi', 'ksi'] as const
  return {
    id: 'M1', name: '', specification: '', form: '', thicknessRange: '', family: 'aluminium', basis: 'none', loadPath: 'single', source: '', edition: '',
    E: empty(modulus), G: empty(modulus), nu: empty(''), Ftu: empty(stress), Fty: empty(stress), Fsu: empty(stress), Fsy: null,
    temperatureFrom: null, temperatureTo: null, knockdown: [], knockdownSource: '',
  }
}
