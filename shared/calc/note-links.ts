/** The links of a note's calculations, resolved against its results: values, records, whole tables, and circles. */
import { linksOf, type FoundLink, type LinkedCase, type Links, type LinkedValue } from '#shared/calc/links'
import { evaluateCalculation, gathers, isRecordKind } from '#shared/calc/registry'
import type { CalcResult, Evaluation } from '#shared/calc/types'

export type Results = Record<string, Evaluation>

/** A calculation or record as it stands in the note. */
export interface NoteCalc { id: string, label: string, title: string, kind: string, kindVersion: number, inputs: unknown }

export interface NoteState { byId: ReadonlyMap<string, NoteCalc>, results: Results }

const named = ({ label, title }: NoteCalc) => title.trim() === '' ? label : `${label} (${title.trim()})`
const gone = 'What this was linked to is no longer in the note; choose another value or type one.'
const missing = (reason: string) => ({ ok: false, reason }) as const

/** The result of a calculation, or why there is none. */
function resultOf({ byId, results }: NoteState, id: string): { ok: true, calculation: NoteCalc, result: CalcResult } | { ok: false, reason: string } {
  const calculation = byId.get(id)
  if (!calculation) return missing(gone)
  const evaluation = results[id]
  if (!evaluation?.ok) return missing(`Not evaluated, because ${named(calculation)} gives no result; correct it first.`)
  return { ok: true, calculation, result: evaluation.result }
}

function valueOf(state: NoteState, id: string, key: string): LinkedValue {
  const got = resultOf(state, id)
  if (!got.ok) return got
  const found = got.result.outputs.find(o => o.key === key)
  return found ? { ok: true, value: found.value, dimension: found.dimension } : missing(`${named(got.calculation)} gives no value “${key}” any more; choose another value or type one.`)
}

function casesOf(state: NoteState, id: string, quantity: string): ReturnType<Links['cases']> {
  const got = resultOf(state, id)
  if (!got.ok) return got
  const outputs = new Map(got.result.outputs.map(o => [o.key, o]))
  const cases = (got.result.heads ?? []).flatMap((head): LinkedCase[] => {
    const output = outputs.get(`${quantity}@${head.id}`)
    return output ? [{ ...head, value: output.value, dimension: output.dimension }] : []
  })
  return cases.length > 0 ? { ok: true, cases } : missing(`${named(got.calculation)} gives no load cases with “${quantity}”; choose another table or type the cases.`)
}

/** The links as one calculation sees them. */
export const linksFor = (state: NoteState): Links => ({
  value: ({ calculation, key }) => valueOf(state, calculation, key),
  record: (id, kind) => {
    const calculation = state.byId.get(id)
    return calculation?.kind === kind ? { ok: true, inputs: calculation.inputs } : missing(gone)
  },
  cases: (id, quantity) => casesOf(state, id, quantity),
  gathered: () => [...state.byId.values()].filter(c => !isRecordKind(c.kind) && !gathers(c.kind)).flatMap((c) => {
    const evaluation = state.results[c.id]
    return evaluation ? [{ id: c.id, label: c.label, title: c.title, evaluation }] : []
  }),
})

/** What the links of a calculation give now, as text that is equal exactly when every linked value is. */
export function linkState(calculation: NoteCalc, state: NoteState): string {
  const links = linksFor(state)
  return JSON.stringify(linksOf(calculation.inputs).map(({ calculation: id, key }) => {
    if (key !== undefined) return links.value({ calculation: id, key })
    const record = state.byId.get(id)
    return record && isRecordKind(record.kind) ? record.inputs : state.results[id] ?? null
  }))
}

/** The circle of links that leads from a calculation back to itself, or null. */
export function circleThrough(start: NoteCalc, byId: ReadonlyMap<string, NoteCalc>): NoteCalc[] | null {
  const seen = new Set<string>()
  function search(from: NoteCalc, path: NoteCalc[]): NoteCalc[] | null {
    for (const { calculation: id } of linksOf(from.inputs)) {
      if (id === start.id) return path
      const next = byId.get(id)
      if (!next || seen.has(id)) continue
      seen.add(id)
      const found = search(next, [...path, next])
      if (found) return found
    }
    return null
  }
  return search(start, [start])
}

/** The fault of a member of a circle, at every link of it that is part of the circle. */
export function circleFault(circle: readonly NoteCalc[], links: readonly FoundLink[]): Evaluation {
  const members = new Set(circle.map(c => c.id))
  const round = [...circle, circle[0]].map(c => c?.label ?? '').join(' → ')
  const at = links.filter(l => members.has(l.calculation))
  return { ok: false, faults: at.map(({ path }) => ({ path, message: `${round} take values from one another in a circle; type one of them.` })) }
}

/** @see evaluateCalculation */
export const computeLinked = (calculation: NoteCalc, state: NoteState): Evaluation => evaluateCalculation(calculation, linksFor(state))
