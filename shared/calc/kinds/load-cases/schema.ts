/**
 * A table of load cases of the note. A column says its quantity and unit once; cells hold the typed text,
 * which may name a unit of its own.
 */
import { z } from 'zod'
import { choice, identifier, name, source, unitId } from '#shared/calc/parts/fields'
import { level } from '#shared/calc/parts/loading-fields'

export const MAX_TABLE_CASES = 2000
export const MAX_COLUMNS = 20
const cell = z.string().max(40)

/** What a load may be. */
export const loadDimension = choice('Quantity', ['torque', 'force', 'distributedTorque', 'shearFlow', 'rateOfTwist', 'angle', 'stress', 'length', 'bimoment', 'rateGradient', 'number'])

const column = z.strictObject({ key: identifier, title: name, dimension: loadDimension, unit: unitId })
const row = z.strictObject({ id: identifier, title: name, source, level, temperature: cell, cells: z.array(cell).max(MAX_COLUMNS) })

export const loadCasesSchema = z.strictObject({
  document: source.meta({ title: 'Loads document', description: 'Number and issue of the document that the cases come from.' }),
  temperatureUnit: unitId.meta({ title: 'Unit of temperature' }),
  columns: z.array(column).min(1).max(MAX_COLUMNS),
  rows: z.array(row).max(MAX_TABLE_CASES),
})

export type LoadCasesInputs = z.infer<typeof loadCasesSchema>
