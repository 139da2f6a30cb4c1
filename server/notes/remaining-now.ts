import { remaining, type RemainingLists } from '#shared/review/remaining'
import { presentAnswers, presentCheckSheet, presentLoose, presentRemarks, presentTicks } from '#server/presenters/issue-parts'
import { documentOf, looseNumbersOf, resultsOf } from './reading'
import type { Standing } from './standing'

export type RemainingNow = RemainingLists

/** What stands between the issue as saved and its next act. */
export function remainingNow(standing: Standing): RemainingNow {
  const { issue, content } = standing
  const results = resultsOf(issue)
  return remaining({
    doc: documentOf(issue), results,
    answers: presentAnswers(standing, results), loose: presentLoose(standing, looseNumbersOf(issue)), remarks: presentRemarks(standing, new Map()),
    ticks: presentTicks(standing), sheet: presentCheckSheet(standing),
    changeNoted: issue.changeNote.trim() !== '', contentAsPassed: issue.state === 'for approval' ? issue.contentHash === content.hash : null,
  })
}
