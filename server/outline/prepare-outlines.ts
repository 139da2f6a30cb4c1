import { outlineOfInputs } from '#shared/calc/kinds/general-outline/parse'
import { noLinks, type Links } from '#shared/calc/links'
import { rememberOutline } from '#shared/torsion/outline/solved-outlines'
import { solveOutline } from './solve-outline'
import type { PoolRefusal } from './thread-pool'

/** A calculation of a note, with what its inputs are linked to. */
export interface HeavyCalculation { kind: string, inputs: unknown, links?: Links }

/**
 * Solves the outlines of these calculations on threads, so that evaluating
 * them afterwards costs no request any time. Null when all are known; a
 * refusal when the pool is busy or gave one up, and the caller answers with it
 * instead of evaluating.
 */
export async function prepareOutlines(calculations: readonly HeavyCalculation[], signal?: AbortSignal): Promise<PoolRefusal | null> {
  const outlines = calculations.flatMap(({ kind, inputs, links = noLinks }) => (kind === 'general-outline' ? outlineOfInputs(inputs, links) ?? [] : []))
  const answers = await Promise.all(outlines.map(async outline => ({ outline, answer: await solveOutline({ outline }, signal) })))
  for (const { outline, answer } of answers) {
    if ('code' in answer) return answer
    rememberOutline(outline, answer)
  }
  return null
}
