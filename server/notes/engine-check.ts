import { evaluateNote } from '#shared/calc/evaluate-note'
import { compareEvaluations } from '#shared/calc/result-compare'
import { calculationsOf } from '#shared/note/calculations'
import type { Issue } from '#server/database/entities/issue'
import { DomainError } from '#server/utils/domain-error'
import { documentOf, resultsOf } from './reading'

/** Calculations that the engine of today computes otherwise than the frozen results say, by label. */
export function movedCalculations(issue: Issue): { label: string, keys: string[] }[] {
  const results = resultsOf(issue)
  const calculations = calculationsOf(documentOf(issue))
  const { results: now } = evaluateNote(calculations)
  return calculations.flatMap((calculation) => {
    const [stored, again] = [results[calculation.id], now[calculation.id]]
    const keys = stored && again ? compareEvaluations(stored, again).map(d => d.key) : ['no stored result']
    return keys.length ? [{ label: calculation.label, keys }] : []
  })
}

/** Pass and release stand on what the engine of today would give too. @throws DomainError engine-moved */
export function refuseMovedEngine(issue: Issue): void {
  const moved = movedCalculations(issue)
  if (!moved.length) return
  const named = moved.map(({ label, keys }) => `${label} (${keys.slice(0, 3).join(', ')})`).join(', ')
  throw new DomainError('engine-moved', `The engine has been revised since this was computed and gives other values in ${named}. Return the issue, so that it is computed again.`, { details: { moved } })
}
