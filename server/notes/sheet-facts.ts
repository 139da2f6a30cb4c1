import { calculationsOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { FIRST_LETTER } from '#shared/review/letters'
import type { SheetFacts } from '#shared/review/check-sheet'
import type { Issue } from '#server/database/entities/issue'

/** What the check sheet of an issue depends on. */
export function sheetFactsOf(issue: Pick<Issue, 'document' | 'letter'>): SheetFacts {
  const calculations = calculationsOf(readDocument(JSON.parse(issue.document)))
  return { kinds: [...new Set(calculations.map(c => c.kind))], laterIssue: issue.letter !== FIRST_LETTER }
}
