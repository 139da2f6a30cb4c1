/** The states an issue of a note can be in, in the order of its life. */
export const ISSUE_STATES = ['draft', 'in check', 'for approval', 'released', 'superseded', 'withdrawn', 'abandoned'] as const
export type IssueState = (typeof ISSUE_STATES)[number]

/** An issue in one of these is on its way: a note has at most one of them. */
export const ON_ITS_WAY = ['draft', 'in check', 'for approval'] as const satisfies readonly IssueState[]
export type OnItsWay = (typeof ON_ITS_WAY)[number]

export const isOnItsWay = (state: IssueState): state is OnItsWay => (ON_ITS_WAY as readonly IssueState[]).includes(state)

/** Whether the issue was released once: its content and PDF stay as they are for good. */
export const wasReleased = (state: IssueState): boolean => state === 'released' || state === 'superseded' || state === 'withdrawn'

/** The state inside a sentence: `This issue is in check.` */
export const inWords: Record<IssueState, string> = {
  'draft': 'a draft',
  'in check': 'in check',
  'for approval': 'for approval',
  'released': 'released',
  'superseded': 'superseded',
  'withdrawn': 'withdrawn',
  'abandoned': 'abandoned',
}
