import type { IssueSummary } from '#shared/schemas/issue-view'
import type { IssueState } from '#shared/review/states'

interface Summarised { id: string, letter: string, state: IssueState, releasedAt?: Date | null, pdfFileId?: string | null }

export const summaryOfIssue = (issue: Summarised): IssueSummary => ({
  id: issue.id, letter: issue.letter, state: issue.state, releasedAt: issue.releasedAt?.toISOString() ?? null, hasPdf: Boolean(issue.pdfFileId),
})
