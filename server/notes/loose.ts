import { scanLooseNumbers, type LooseNumber } from '#shared/note/loose-numbers'
import { readDocument } from '#shared/note/schema'
import type { Issue } from '#server/database/entities/issue'
import { resultsOf } from './current-results'

/** The typed quantities of the saved note that are tied to nothing. The same module marks them in the editor; this is the authority. */
export function looseNumbersOf(issue: Issue): LooseNumber[] {
  return scanLooseNumbers(readDocument(JSON.parse(issue.document)), resultsOf(issue), { noteTitle: issue.title })
}
