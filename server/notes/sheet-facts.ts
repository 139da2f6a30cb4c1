import { calculationsOf } from '#shared/note/calculations'
import { FIRST_LETTER } from '#shared/review/letters'
import type { SheetFacts } from '#shared/review/check-sheet'
import type { Issue } from '#server/database/entities/issue'
import { documentOf } from './reading'

/** What the check sheet of an issue depends on. */
export function sheetFactsOf(issue: Pick<Issue, 'id' | 'document' | 'results' | 'title' | 'letter'>): SheetFacts {
  const calculations = calculationsOf(documentOf(issue))
  return { kinds: [...new Set(calculations.map(c => c.kind))], laterIssue: issue.letter !== FIRST_LETTER }
}
