import { evaluateLoadCases } from '#shared/calc/kinds/load-cases/evaluate'
import { loadCasesSchema, type LoadCasesInputs } from '#shared/calc/kinds/load-cases/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import type { CalcKind } from '#shared/calc/types'

/** A table of load cases of the note: calculations take one value, an envelope, or all cases. */
export const loadCases: CalcKind<LoadCasesInputs> = {
  kind: 'load-cases',
  version: 1,
  title: 'Load cases',
  about: 'A table of cases with their torques and forces, typed, pasted or read from a CSV file.',
  record: true,
  methodRevision: METHOD_REVISION,
  schema: loadCasesSchema,
  blank: () => ({ document: '', temperatureUnit: '°C', columns: [{ key: 'T', title: 'Torque', dimension: 'torque', unit: 'N·m' }], rows: [] }),
  evaluate: evaluateLoadCases,
}
