/** What checkers and approvers of the story do. */
import { addRemark } from '#server/commands/add-remark'
import { fillCheckItems } from '#server/commands/fill-check-item'
import { judgeAnswer } from '#server/commands/judge-answer'
import { replyToRemark } from '#server/commands/reply-to-remark'
import { setRemarkState } from '#server/commands/set-remark-state'
import { tickCalculation } from '#server/commands/tick-calculation'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { RemarkSchema } from '#server/database/entities/remark'
import { sheetFactsOf } from '#server/notes/sheet-facts'
import { calculationsOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { checkItems } from '#shared/review/check-sheet'
import type { DemoAct, DemoNote, DemoRemark } from './demo-note'
import { findPlace } from './find-place'
import type { PersonKey } from './people'
import { contextOf, issueOf, type Stage } from './stage'

type ActOf<Name extends DemoAct['act']> = Extract<DemoAct, { act: Name }>

export async function playRemark(stage: Stage, note: DemoNote, remark: DemoRemark): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const anchor = findPlace(note.number, JSON.parse(issue.document), remark.on)
  await addRemark(contextOf(stage, remark.by, remark.at), issue.id, { anchor, text: remark.text, proposed: null, fileId: null })
  const made = await stage.em.fork().findOneOrFail(RemarkSchema, { issue: issue.id }, { orderBy: { number: 'desc' } })
  stage.remarks.set(remark, made.id)
}

function remarkIdOf(stage: Stage, remark: DemoRemark): string {
  const id = stage.remarks.get(remark)
  if (id === undefined) throw new Error(`"${remark.text}" was not said yet`)
  return id
}

export async function playReply(stage: Stage, note: DemoNote, remark: DemoRemark, reply: { by: PersonKey, at: string, text: string }): Promise<void> {
  const { id } = await issueOf(stage, note.number)
  await replyToRemark(contextOf(stage, reply.by, reply.at), id, remarkIdOf(stage, remark), { text: reply.text, fileId: null })
}

export async function playClosing(stage: Stage, note: DemoNote, remark: DemoRemark, at: string): Promise<void> {
  const { id } = await issueOf(stage, note.number)
  await setRemarkState(contextOf(stage, remark.by, at), id, remarkIdOf(stage, remark), { state: 'closed' })
}

export async function playTicks(stage: Stage, note: DemoNote, act: ActOf<'tick'>): Promise<void> {
  const { id, document } = await issueOf(stage, note.number)
  for (const one of calculationsOf(readDocument(JSON.parse(document)))) await tickCalculation(contextOf(stage, act.by, act.at), id, { calcId: one.id, ticked: true })
}

/** Accepts every answer and deviation that is not judged yet. */
export async function playJudgement(stage: Stage, note: DemoNote, act: ActOf<'judge'>): Promise<void> {
  const { id } = await issueOf(stage, note.number)
  for (const answer of await stage.em.fork().find(GuardAnswerSchema, { issue: id, accepted: null })) {
    await judgeAnswer(contextOf(stage, act.by, act.at), id, answer.id, { accepted: true, note: act.note })
  }
}

/** Fills the items that are on the sheet of this note. */
export async function playCheckSheet(stage: Stage, note: DemoNote, act: ActOf<'check'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const onSheet = new Set(checkItems(sheetFactsOf(issue)).map(({ item }) => item))
  await fillCheckItems(contextOf(stage, act.by, act.at), issue.id, act.items.filter(({ item }) => onSheet.has(item)))
}
