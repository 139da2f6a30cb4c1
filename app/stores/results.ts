import { defineStore } from 'pinia'
import { shallowReactive } from 'vue'
import type { CalcResult, Evaluation, Output } from '#shared/calc/types'

/** Outputs whose preview in the browser and result from the server are further apart than this are shown. */
const SAME = 1e-9

/**
 * Results by calculation: what the server computed at the last save and, while
 * inputs are newer than that save, the preview of the same engine in the browser.
 * They stand outside the document, so they are never undone, copied or saved.
 */
export const useResultsStore = defineStore('results', () => {
  const fromServer = shallowReactive(new Map<string, Evaluation>())
  const preview = shallowReactive(new Map<string, Evaluation>())
  const differing = shallowReactive(new Map<string, string[]>())

  function evaluationOf(calcId: string): Evaluation | undefined {
    return preview.get(calcId) ?? fromServer.get(calcId)
  }
  function resultOf(calcId: string): CalcResult | null {
    const evaluation = evaluationOf(calcId)
    return evaluation?.ok ? evaluation.result : null
  }
  function outputOf(calcId: string, key: string): Output | null {
    return resultOf(calcId)?.outputs.find(output => output.key === key) ?? null
  }
  function setPreview(calcId: string, evaluation: Evaluation) {
    preview.set(calcId, Object.freeze(evaluation))
  }
  function dropPreview(calcId: string) {
    preview.delete(calcId)
  }
  /** `stillNewer` names the calculations whose inputs moved on while the save was under way. */
  function takeServer(results: Record<string, Evaluation>, stillNewer: (calcId: string) => boolean = () => false) {
    for (const id of [...fromServer.keys()]) if (!(id in results)) fromServer.delete(id)
    for (const [id, evaluation] of Object.entries(results)) {
      const previewed = preview.get(id)
      if (previewed && !stillNewer(id)) {
        const keys = apart(previewed, evaluation)
        if (keys.length) differing.set(id, keys)
        else differing.delete(id)
        preview.delete(id)
      }
      fromServer.set(id, Object.freeze(evaluation))
    }
  }
  function all(): Record<string, Evaluation> {
    return Object.fromEntries([...fromServer, ...preview])
  }
  function clear() {
    fromServer.clear()
    preview.clear()
    differing.clear()
  }
  return { fromServer, preview, differing, evaluationOf, resultOf, outputOf, setPreview, dropPreview, takeServer, all, clear }
})

/** Keys of the outputs on which two evaluations of the same inputs do not agree. */
export function apart(a: Evaluation, b: Evaluation): string[] {
  if (a.ok !== b.ok) return ['*']
  if (!a.ok || !b.ok) return []
  const before = new Map(a.result.outputs.map(output => [output.key, output.value]))
  const keys = b.result.outputs.filter((output) => {
    const value = before.get(output.key)
    return value === undefined || Math.abs(value - output.value) > SAME * Math.max(Math.abs(value), Math.abs(output.value))
  }).map(output => output.key)
  const now = new Set(b.result.outputs.map(output => output.key))
  return [...keys, ...[...before.keys()].filter(key => !now.has(key))]
}
