import { z } from 'zod'
import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { choice } from '#shared/calc/parts/fields'
import { output } from '#shared/calc/parts/output'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import type { CalcKind, Evaluation, Fault, MarginRow, Output, ResultTable } from '#shared/calc/types'
import { showQuantity } from '#shared/units/display'

export const marginTableSchema = z.strictObject({
  rows: choice('Rows', ['least of each mode', 'least of each calculation and mode', 'every margin'], 'Which margins of the note are listed; the least always stands first.'),
})
export type MarginTableInputs = z.infer<typeof marginTableSchema>

interface Gathered { label: string, title: string, row: MarginRow }

/** Every margin of the note, sorted; a calculation without a result is named instead of left out. Never throws. */
export function evaluateMarginTable(inputs: unknown, links: Links = noLinks): Evaluation {
  const checked = marginTableSchema.safeParse(inputs)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const calculations = links.gathered()
  const faults = calculations.flatMap(({ label, title, evaluation }): Fault[] =>
    evaluation.ok ? [] : [{ path: 'rows', message: `Not evaluated, because ${title.trim() === '' ? label : `${label} (${title.trim()})`} gives no result; correct it first.` }])
  if (faults.length > 0) return { ok: false, faults }
  const all = calculations.flatMap(({ label, title, evaluation }) => (evaluation.ok ? evaluation.result.margins.map((row): Gathered => ({ label, title, row })) : []))
  if (all.length === 0) return { ok: false, faults: [{ path: 'rows', message: 'No calculation of this note gives a margin yet; insert one, or load the ones that are there.' }] }
  const sorted = all.sort((a, b) => (a.row.rf ?? Infinity) - (b.row.rf ?? Infinity))
  return {
    ok: true,
    result: {
      kind: 'margin-table', methodRevision: METHOD_REVISION, outputs: outputs(sorted), walls: [], cases: [], tables: [table(kept(sorted, checked.data.rows))],
      // The margins stay those of their calculations, so that none is counted twice.
      margins: [], governing: null, guards: [], working: [], drawing: null,
    },
  }
}

function kept(sorted: readonly Gathered[], rows: MarginTableInputs['rows']): Gathered[] {
  if (rows === 'every margin') return [...sorted]
  const seen = new Set<string>()
  return sorted.filter(({ label, row }) => {
    const group = rows === 'least of each mode' ? row.modeLabel : `${label} ${row.modeLabel}`
    return row.loaded && !seen.has(group) && seen.add(group)
  })
}

function table(rows: readonly Gathered[]): ResultTable {
  const words = (key: string, label: string) => ({ key, label, dimension: null, unit: '' as const })
  return {
    key: 'margins', title: 'Margins of the note, least first',
    columns: [words('mode', 'Failure mode'), words('level', 'Level'), words('case', 'Case'), words('calculation', 'Calculation'), words('place', 'Place'), words('applied', 'Applied'), words('allowable', 'Allowed'), { key: 'ms', label: 'Margin', dimension: 'margin', unit: '' }],
    rows: rows.map(({ label, row }) => ({
      id: `${label} ${row.key}`,
      cells: [row.modeLabel, row.level, row.caseId, label, row.place, showQuantity(row.applied, row.dimension, row.unit), showQuantity(row.allowable, row.dimension, row.unit), row.ms],
    })),
  }
}

/** The least margin of the note and of each mode, under names that stay while margins move. */
function outputs(sorted: readonly Gathered[]): Output[] {
  const seen = new Set<string>()
  const least = sorted.filter(({ row }) => row.loaded && !seen.has(row.mode) && seen.add(row.mode))
  const of = (key: string, { label, row }: Gathered) => output(key, 'MS', `Least margin, ${row.modeLabel.charAt(0).toLowerCase()}${row.modeLabel.slice(1)} (${label}, case ${row.caseId})`, row.ms, 'margin', '', '§8', { primary: true })
  return [...least.slice(0, 1).flatMap(one => of('MS', one)), ...least.flatMap(one => of(`MS:${one.row.mode}`, one))]
}

/** Margin table: gathers every margin of the note. */
export const marginTable: CalcKind<MarginTableInputs> = {
  kind: 'margin-table',
  version: 1,
  title: 'Margin table',
  about: 'Every margin of the note in one table, least first, with its case, calculation and allowable.',
  gathers: true,
  methodRevision: METHOD_REVISION,
  schema: marginTableSchema,
  blank: () => ({ rows: 'least of each mode' }),
  evaluate: evaluateMarginTable,
}
