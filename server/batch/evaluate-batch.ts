import { evaluateNote } from '#shared/calc/evaluate-note'
import { ENGINE_VERSION } from '#shared/calc/registry'
import { batchResult } from './batch-result'
import type { Batch, BatchFault } from './read-batch'

type Answer = { calculation: number, title: string, kind: string, kindVersion: number, engine: string }
  & (({ ok: true } & ReturnType<typeof batchResult>) | { ok: false, faults: { path: string, message: string }[] })

/** Evaluates as a note does: calculations may take values from one another. A fault of one leaves the others as they are. */
export function evaluateBatch({ calculations }: Batch, more: { working: boolean }): { answers: Answer[], faults: BatchFault[] } {
  const { results } = evaluateNote(calculations.map((calculation, i) => ({ ...calculation, label: `Calculation ${i + 1}` })))
  const faults: BatchFault[] = []
  const answers = calculations.map(({ id, title, kind, kindVersion }, i): Answer => {
    const head = { calculation: i + 1, title, kind, kindVersion, engine: ENGINE_VERSION }
    const evaluation = results[id]
    if (evaluation?.ok) return { ...head, ok: true, ...batchResult(evaluation.result, more) }
    const own = evaluation?.faults ?? []
    faults.push(...own.map(({ path, message }) => ({ calculation: i + 1, title, path: path === 'kindVersion' ? path : `inputs.${path}`, message })))
    return { ...head, ok: false, faults: own }
  })
  return { answers, faults }
}
