import type { IssueState } from '#shared/review/states'
import type { Issue } from '#server/database/entities/issue'
import { DomainError } from '#server/utils/domain-error'

/** The act is for what the person saw: the loser of a race is told, and keeps their words. @throws DomainError stale */
export function expectSeen(issue: Issue, expect: { state: IssueState, save: number }): void {
  if (issue.state === expect.state && issue.saveNumber === expect.save) return
  throw new DomainError('stale', 'The issue has moved on since you loaded it. Look at it as it is now, then decide again.', { details: { state: issue.state, save: issue.saveNumber } })
}
