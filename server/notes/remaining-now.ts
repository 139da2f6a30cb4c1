import type { IssueView } from '#shared/schemas/issue-view'
import type { Standing } from './standing'

export type RemainingNow = IssueView['remaining']

export function remainingNow(_standing: Standing): RemainingNow {
  return { submit: [], pass: [], release: [] }
}
