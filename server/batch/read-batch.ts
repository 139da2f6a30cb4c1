/** What the batch takes: one calculation or an array of them, as JSON. */
import { z } from 'zod'
import { calcKind, calcKindNames, isCalcKind } from '#shared/calc/registry'

/** A fault of the input and where it is: `calculation` counts from 1, and is null for the file as a whole. */
export interface BatchFault { calculation: number | null, title: string, path: string, message: string }

export interface BatchCalculation { id: string, title: string, kind: string, kindVersion: number, inputs: unknown }

/** Whether the answer is a list: as it was asked. */
export interface Batch { many: boolean, calculations: BatchCalculation[] }

const entry = z.strictObject({
  id: z.uuid('Give an id only where another calculation links to this one, as a UUID.').optional(),
  title: z.string().max(200).optional(),
  kind: z.string('Name the kind of calculation.').refine(isCalcKind, { error: `This is no kind of calculation; choose one of ${calcKindNames().join(', ')}.` }),
  kindVersion: z.int().positive().optional(),
  inputs: z.looseObject({}, 'Give the inputs as an object; --schema prints what it holds.'),
})
const batchSchema = z.array(entry).min(1, 'Give at least one calculation.').max(10_000)

/** The fault of one issue of the schema, at its calculation. */
function faultOf(issue: z.core.$ZodIssue, raw: readonly unknown[]): BatchFault {
  const [index, ...path] = issue.path
  if (typeof index !== 'number') return { calculation: null, title: '', path: path.join('.'), message: issue.message }
  const { title } = (raw[index] ?? {}) as { title?: unknown }
  return { calculation: index + 1, title: typeof title === 'string' ? title : '', path: path.join('.'), message: issue.message }
}

/** Every fault of the file as read; what a kind says of its inputs comes with the evaluation. */
export function readBatch(text: string): { ok: true, batch: Batch } | { ok: false, faults: BatchFault[] } {
  let raw: unknown
  try {
    raw = JSON.parse(text)
  } catch (error) {
    return { ok: false, faults: [{ calculation: null, title: '', path: '', message: `This is not valid JSON: ${error instanceof Error ? error.message : String(error)}` }] }
  }
  const many = Array.isArray(raw)
  const list = many ? raw as unknown[] : [raw]
  const read = batchSchema.safeParse(list)
  if (!read.success) return { ok: false, faults: read.error.issues.map(issue => faultOf(issue, list)) }
  const twice = read.data.flatMap(({ id, title = '' }, index): BatchFault[] => id !== undefined && read.data.findIndex(other => other.id === id) < index
    ? [{ calculation: index + 1, title, path: 'id', message: 'Another calculation has this id; ids stay unique.' }]
    : [])
  if (twice.length > 0) return { ok: false, faults: twice }
  const calculations = read.data.map(({ id, title, kind, kindVersion, inputs }, index): BatchCalculation => ({
    id: id ?? String(index + 1), title: title ?? '', kind, kindVersion: kindVersion ?? calcKind(kind).version, inputs,
  }))
  return { ok: true, batch: { many, calculations } }
}
