/** What the analysts of the story do: save, change the title block, answer guards, explain loose numbers. */
import type { Evaluation } from '#shared/calc/types'
import { calculationsOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { answerGuard } from '#server/commands/answer-guard'
import { changeMetadata } from '#server/commands/change-metadata'
import { explainLooseNumbers } from '#server/commands/explain-loose-number'
import { labelSave } from '#server/commands/label-save'
import { saveNote } from '#server/commands/save-note'
import { LooseDecisionSchema } from '#server/database/entities/loose-decision'
import { looseNumbersOf } from '#server/notes/reading'
import { answerFor } from './answers'
import { buildDocument, stableId } from './build-document'
import type { DemoAct, DemoNote } from './demo-note'
import { changeBetween } from './document-steps'
import { reasonFor } from './loose-reasons'
import { contextOf, issueOf, type Stage } from './stage'

type ActOf<Name extends DemoAct['act']> = Extract<DemoAct, { act: Name }>

export async function playSave(stage: Stage, note: DemoNote, act: ActOf<'save'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const after = buildDocument(note.number, act.sections)
  const { steps, docHash } = changeBetween(JSON.parse(issue.document), after)
  if (steps.length === 0) return
  const context = contextOf(stage, act.by, act.at)
  const key = stableId(note.number, issue.letter, 'save', act.at)
  const saved = await saveNote(context, issue.id, { baseSave: issue.saveNumber, steps, docHash, key })
  if (act.label !== undefined) await labelSave(contextOf(stage, act.by, act.at), issue.id, saved.saveNumber, act.label)
}

export async function playMetadata(stage: Stage, note: DemoNote, act: ActOf<'metadata'>): Promise<void> {
  const { id, title, part, saveNumber } = await issueOf(stage, note.number)
  await changeMetadata(contextOf(stage, act.by, act.at), id, { title, part, drawingIssue: act.drawingIssue, changeNote: act.changeNote, save: saveNumber })
}

/** Answers every caution and marked stop that this act has words for. */
export async function playAnswers(stage: Stage, note: DemoNote, act: ActOf<'answer'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const results = JSON.parse(issue.results) as Record<string, Evaluation>
  for (const { id } of calculationsOf(readDocument(JSON.parse(issue.document)))) {
    const evaluation = results[id]
    const guards = evaluation?.ok === true ? evaluation.result.guards.filter(guard => guard.severity !== 'information') : []
    for (const guard of guards) {
      const text = answerFor([act], { note: note.number, id }, guard)
      if (text !== null) await answerGuard(contextOf(stage, act.by, act.at), issue.id, { calcId: id, guardKey: guard.key, text })
    }
  }
}

/** Explains every loose number that this act has a reason for and that has none yet. */
export async function playReasons(stage: Stage, note: DemoNote, act: ActOf<'explain'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const document = readDocument(JSON.parse(issue.document))
  const explained = await stage.em.fork().find(LooseDecisionSchema, { issue: issue.id })
  const open = looseNumbersOf(issue).flatMap(({ blockId, text, ordinal }) => {
    const reason = reasonFor(document, act.reasons, { blockId, text })
    const known = explained.some(one => one.blockId === blockId && one.text === text && one.ordinal === ordinal)
    return reason === null || known ? [] : [{ blockId, text, ordinal, reason }]
  })
  await explainLooseNumbers(contextOf(stage, act.by, act.at), issue.id, open)
}
