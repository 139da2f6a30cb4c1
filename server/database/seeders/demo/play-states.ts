/** The acts of the story that move an issue from one state to the next. */
import { openNextIssue } from '#server/commands/open-next-issue'
import { createNote } from '#server/commands/create-note'
import { passCheck } from '#server/commands/pass-check'
import { requestRelease } from '#server/commands/request-release'
import { returnNote } from '#server/commands/return-note'
import { submitNote } from '#server/commands/submit-note'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { SignatureSchema } from '#server/database/entities/signature'
import type { DemoAct, DemoNote } from './demo-note'
import type { PersonKey } from './people'
import { contextOf, expectOf, issueIdOf, issueOf, type Stage } from './stage'

type ActOf<Name extends DemoAct['act']> = Extract<DemoAct, { act: Name }>

export async function playCreation(stage: Stage, note: DemoNote): Promise<void> {
  const { title, part, drawingIssue, counter } = note
  const context = contextOf(stage, note.createdBy, note.createdAt)
  const issue = await createNote(context, { projectId: stage.cast.projects[note.project], title, part, drawingIssue }, { counter })
  stage.issues.set(note.number, issue.id)
}

export async function playOpening(stage: Stage, note: DemoNote, by: PersonKey, at: string): Promise<void> {
  const issue = await openNextIssue(contextOf(stage, by, at), issueIdOf(stage, note.number))
  stage.issues.set(note.number, issue.id)
}

export async function playSubmission(stage: Stage, note: DemoNote, act: ActOf<'submit'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const { people } = stage.cast
  await submitNote(contextOf(stage, act.by, act.at), issue.id, { expect: expectOf(issue), checkerId: people[act.checker].id, approverId: people[act.approver].id })
}

export async function playReturn(stage: Stage, note: DemoNote, act: ActOf<'return'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  await returnNote(contextOf(stage, act.by, act.at), issue.id, { expect: expectOf(issue), reason: act.reason })
}

export async function playPass(stage: Stage, note: DemoNote, act: ActOf<'pass'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  await passCheck(contextOf(stage, act.by, act.at), issue.id, { expect: expectOf(issue), password: stage.password })
}

/** Accepts what deviates, signs, then makes the PDF as the worker does; the job that waits in the queue finds it made. */
export async function playRelease(stage: Stage, note: DemoNote, act: ActOf<'release'>): Promise<void> {
  const issue = await issueOf(stage, note.number)
  const context = contextOf(stage, act.by, act.at)
  const deviations = await stage.em.fork().find(GuardAnswerSchema, { issue: issue.id, kind: 'deviation' })
  await requestRelease(context, issue.id, { expect: expectOf(issue), password: stage.password, acceptedDeviations: deviations.map(one => one.id) })
  const signature = await stage.em.fork().findOneOrFail(SignatureSchema, { issue: issue.id, meaning: 'released', voidedAt: null })
  await stage.makeRelease({ issueId: issue.id, signatureId: signature.id }, context.clock)
  const { state, releaseFailure } = await issueOf(stage, note.number)
  if (state !== 'released') throw new Error(`${note.number} was not released: ${releaseFailure ?? state}`)
}
