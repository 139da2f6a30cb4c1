import type { CalcResult, Guard } from '#shared/calc/types'
import { calculationsOf, type NoteCalculation } from '#shared/note/calculations'
import type { Issue } from '#server/database/entities/issue'
import { DomainError } from '#server/utils/domain-error'
import { documentOf, resultsOf } from './reading'

/** A calculation of the issue as saved. @throws DomainError not-found */
export function calculationIn(issue: Issue, calcId: string): NoteCalculation {
  const found = calculationsOf(documentOf(issue)).find(c => c.id === calcId)
  if (!found) throw new DomainError('not-found', 'This calculation is not in the saved note any more.')
  return found
}

/** Its result, where it has one. @throws DomainError something-remains */
export function resultIn(issue: Issue, calcId: string): CalcResult {
  const evaluation = resultsOf(issue)[calcId]
  if (!evaluation?.ok) throw new DomainError('something-remains', 'This calculation has no result yet; complete its inputs first.')
  return evaluation.result
}

/** One of its guards. @throws DomainError not-found */
export function guardIn(issue: Issue, calcId: string, guardKey: string): { guard: Guard, methodRevision: string } {
  const { guards, methodRevision } = resultIn(issue, calcId)
  const guard = guards.find(g => g.key === guardKey)
  if (!guard) throw new DomainError('not-found', 'This guard does not fire on the saved note any more.')
  return { guard, methodRevision }
}
