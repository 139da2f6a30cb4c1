import { noLinks, type Links } from '#shared/calc/links'
import { loadCasesSchema, type LoadCasesInputs } from '#shared/calc/kinds/load-cases/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import { output } from '#shared/calc/parts/output'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { CalcResult, Evaluation, Output, ResultTable } from '#shared/calc/types'
import { envelope } from '#shared/torsion/margins'
import { unitFits } from '#shared/units/units'

type Heads = NonNullable<CalcResult['heads']>
type Column = LoadCasesInputs['columns'][number]

/** The cases as values under `T@L04`, with the largest, smallest and largest magnitude of every column. */
export function evaluateLoadCases(inputs: unknown, links: Links = noLinks): Evaluation {
  const checked = loadCasesSchema.safeParse(inputs)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const read = typedReader(links)
  const table = checked.data
  checkNames(table, read)
  const heads = readHeads(table, read)
  const values = table.columns.map((column, c) => table.rows.map((row, r) => cellValue(column, row.cells[c] ?? '', row.id, `rows.${r}.cells.${c}`, read)))
  if (table.rows.length === 0) read.fault('rows', 'Add at least one load case.')
  if (read.faults.length > 0) return { ok: false, faults: read.faults }
  const outputs = table.columns.flatMap((column, c) => columnOutputs(column, table, values[c] ?? []))
  return { ok: true, result: { kind: 'load-cases', methodRevision: METHOD_REVISION, outputs, heads, tables: [rowsTable(table, heads, values)], walls: [], cases: [], margins: [], governing: null, guards: [], working: [], drawing: null } }
}

function checkNames(table: LoadCasesInputs, read: TypedReader) {
  const twice = (names: string[], path: (i: number) => string, what: string) => {
    const seen = new Set<string>()
    names.forEach((one, i) => {
      if (seen.has(one)) read.fault(path(i), `${what} ${one} is listed twice; names stay unique.`)
      seen.add(one)
    })
  }
  twice(table.rows.map(r => r.id), i => `rows.${i}.id`, 'Case')
  twice(table.columns.map(c => c.key), i => `columns.${i}.key`, 'Column')
  table.columns.forEach((column, i) => {
    if (!unitFits(column.unit, column.dimension)) read.fault(`columns.${i}.unit`, `Choose a unit that fits column ${column.key}.`)
  })
}

function readHeads(table: LoadCasesInputs, read: TypedReader): Heads {
  return table.rows.map(({ id, title, source, level, temperature }, r) => ({
    id, title, source: source === '' ? table.document : source, level,
    temperature: read.optional({ text: temperature, unit: table.temperatureUnit }, `rows.${r}.temperature`, { label: `the temperature of case ${id}`, dimension: 'temperature' })?.value ?? null,
  }))
}

/** An empty cell is no load of that kind in that case: it has no value, and is never taken for zero. */
function cellValue(column: Column, text: string, id: string, path: string, read: TypedReader): number | null {
  return read.optional({ text, unit: column.unit }, path, { label: `${column.title || column.key} of case ${id}`, dimension: column.dimension })?.value ?? null
}

/** Every case with its values, as a checker compares them with the loads document. */
function rowsTable(table: LoadCasesInputs, heads: Heads, values: readonly (number | null)[][]): ResultTable {
  const words = (key: string, label: string) => ({ key, label, dimension: null, unit: '' as const })
  const hot = heads.some(({ temperature }) => temperature !== null)
  return {
    key: 'cases', title: 'Cases of the table',
    columns: [
      words('id', 'Case'), words('title', 'Title'), words('level', 'Level'), ...(hot ? [{ key: 'temperature', label: 'Temperature', dimension: 'temperature' as const, unit: table.temperatureUnit }] : []),
      ...table.columns.map(({ key, title, dimension, unit }) => ({ key, label: title || key, dimension, unit })),
    ],
    rows: heads.map(({ id, title, level, temperature }, r) => ({ id, cells: [id, title, level, ...(hot ? [temperature] : []), ...values.map(column => column[r] ?? null)] })),
  }
}

function columnOutputs(column: Column, table: LoadCasesInputs, values: (number | null)[]): Output[] {
  const { key, dimension, unit } = column
  const label = column.title || key
  const given = values.flatMap((value, r) => value === null ? [] : [{ caseId: table.rows[r]?.id ?? '', value }])
  const outer = envelope(given)
  const over = (suffix: string, words: string, one: { caseId: string, value: number } | null | undefined, primary = false) =>
    one ? output(`${key}:${suffix}`, key, `${label}, ${words} (${one.caseId})`, one.value, dimension, unit, '§8', { primary }) : []
  return [
    ...over('max', 'largest of all cases', outer?.max), ...over('min', 'smallest of all cases', outer?.min),
    ...over('largest', 'largest magnitude', outer && (Math.abs(outer.min.value) > Math.abs(outer.max.value) ? outer.min : outer.max), true),
    ...given.flatMap(({ caseId, value }) => output(`${key}@${caseId}`, key, `${label}, case ${caseId}`, value, dimension, unit, '§8', { caseId })),
  ]
}
