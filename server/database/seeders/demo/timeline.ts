/** The story as one row of moments: what is told note by note happens in the order of time. */
import type { DemoAct, DemoNote, DemoRemark } from './demo-note'
import type { PersonKey } from './people'

export type Moment = { at: string, note: DemoNote } & (
  | { what: 'create', by: PersonKey }
  | { what: 'open', by: PersonKey, letter: string }
  | { what: 'remark', by: PersonKey, remark: DemoRemark }
  | { what: 'reply', by: PersonKey, remark: DemoRemark, text: string }
  | { what: 'close', by: PersonKey, remark: DemoRemark }
  | { what: 'act', by: PersonKey, act: Exclude<DemoAct, { act: 'remark' }> }
)

function remarkMoments(note: DemoNote, remark: DemoRemark): Moment[] {
  return [
    { at: remark.at, note, what: 'remark', by: remark.by, remark },
    ...remark.replies.map((reply): Moment => ({ at: reply.at, note, what: 'reply', by: reply.by, remark, text: reply.text })),
    ...(remark.closedAt === undefined ? [] : [{ at: remark.closedAt, note, what: 'close', by: remark.by, remark } satisfies Moment]),
  ]
}

function momentsOf(note: DemoNote): Moment[] {
  return note.issues.flatMap((issue, index): Moment[] => [
    index === 0
      ? { at: note.createdAt, note, what: 'create', by: note.createdBy }
      : { at: issue.openedAt, note, what: 'open', by: issue.openedBy, letter: issue.letter },
    ...issue.acts.flatMap((act): Moment[] => act.act === 'remark' ? remarkMoments(note, act.remark) : [{ at: act.at, note, what: 'act', by: act.by, act }]),
  ])
}

/** Every moment of the notes, earliest first; what stands at the same minute keeps its order. */
export function timelineOf(notes: DemoNote[]): Moment[] {
  return notes.flatMap(momentsOf).sort((a, b) => a.at < b.at ? -1 : a.at > b.at ? 1 : 0)
}
