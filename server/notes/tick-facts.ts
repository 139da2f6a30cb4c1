import { createHash } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { tickHash } from '#shared/calc/tick-hash'
import type { NoteCalculation } from '#shared/note/calculations'
import { GuardAnswerSchema, type GuardAnswer } from '#server/database/entities/guard-answer'
import type { Issue } from '#server/database/entities/issue'
import { calculationIn, resultIn } from './current-results'
import { resultsOf } from './reading'

/** SHA-256 over what a tick stands on. */
export function tickHashOf(issue: Issue, calculation: NoteCalculation, answers: Pick<GuardAnswer, 'calcId' | 'guardKey' | 'kind' | 'text'>[]): string {
  const evaluation = resultsOf(issue)[calculation.id]
  const text = tickHash({
    kind: calculation.kind, kindVersion: calculation.kindVersion, title: calculation.title, inputs: calculation.inputs,
    result: evaluation ?? { ok: false, faults: [] }, answers: answers.filter(a => a.calcId === calculation.id),
    methodRevision: evaluation?.ok ? evaluation.result.methodRevision : '',
  })
  return createHash('sha256').update(text).digest('hex')
}

/** The hash to tick a calculation at. @throws DomainError when it is not in the note or has no result */
export async function hashForTick(em: EntityManager, issue: Issue, calcId: string): Promise<string> {
  resultIn(issue, calcId)
  return tickHashOf(issue, calculationIn(issue, calcId), await em.find(GuardAnswerSchema, { issue, calcId }))
}
