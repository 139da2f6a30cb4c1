import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { TEMPLATE } from '#shared/note/template'
import { checkItems } from '#shared/review/check-sheet'
import { answerGuard } from '#server/commands/answer-guard'
import { createNote } from '#server/commands/create-note'
import { fillCheckItem } from '#server/commands/fill-check-item'
import { judgeAnswer } from '#server/commands/judge-answer'
import { passCheck } from '#server/commands/pass-check'
import { saveNote } from '#server/commands/save-note'
import { submitNote } from '#server/commands/submit-note'
import { tickCalculation } from '#server/commands/tick-calculation'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { resultsOf } from '#server/notes/reading'
import { sheetFactsOf } from '#server/notes/sheet-facts'
import { calculation, paragraph, withId } from './note-document'
import type { makeTeam } from './people'
import { contextOf, password } from './people'
import { thickStripInputs } from './open-section'
import { insertBlock, insideSection, saveOf } from './steps'

export type Team = Awaited<ReturnType<typeof makeTeam>>

export const issueOf = (orm: MikroORM, id: string) => orm.em.fork().findOneOrFail(IssueSchema, { id }, { populate: ['note'] })
/** The first calculation of an issue. */
export const calculationIn = (issue: Issue) => Object.keys(resultsOf(issue))[0] ?? ''
export const expectOf = ({ state, saveNumber }: Issue) => ({ state, save: saveNumber })

/** A draft that may be submitted: every section settled, one calculation with a caution, its guards answered. */
export async function draftReady(orm: MikroORM, team: Team): Promise<{ id: string, calcId: string }> {
  const context = () => contextOf(orm, team.analyst)
  const { id } = await createNote(context(), { projectId: team.project.id, title: 'Strip under torsion', part: 'X-1', drawingIssue: 'A' })
  const calcId = randomUUID()
  const stored = JSON.parse((await issueOf(orm, id)).document) as unknown
  await saveNote(context(), id, saveOf(stored, 1, (change, doc) => {
    for (const section of TEMPLATE.filter(s => !s.generated && !['scope', 'section-analysis'].includes(s.key))) {
      change.setNodeAttribute(insideSection(doc, section.key) - 1, 'notApplicable', 'the part is a plain strip')
    }
    insertBlock('scope', paragraph('Both hands of the strip.'))(change, change.doc)
    insertBlock('section-analysis', withId(calcId, calculation('Strip', { inputs: thickStripInputs() as unknown as Record<string, unknown> })))(change, change.doc)
  }))
  const result = resultsOf(await issueOf(orm, id))[calcId]
  for (const guard of result?.ok ? result.result.guards.filter(g => g.severity !== 'information') : []) {
    await answerGuard(context(), id, { calcId, guardKey: guard.key, text: 'Considered; the strip is plain and statically loaded.' })
  }
  return { id, calcId }
}

async function submitted(orm: MikroORM, team: Team, id: string) {
  await submitNote(contextOf(orm, team.analyst), id, { expect: expectOf(await issueOf(orm, id)), checkerId: team.checker.id, approverId: team.approver.id })
}

export async function inCheck(orm: MikroORM, team: Team) {
  const draft = await draftReady(orm, team)
  await submitted(orm, team, draft.id)
  return draft
}

/** Every tick, judgement and item of the sheet given to an issue in check. */
async function check(orm: MikroORM, team: Team, id: string) {
  const context = () => contextOf(orm, team.checker)
  const issue = await issueOf(orm, id)
  for (const answer of await orm.em.fork().find(GuardAnswerSchema, { issue: id })) await judgeAnswer(context(), id, answer.id, { accepted: true, note: '' })
  for (const calcId of Object.keys(resultsOf(issue))) await tickCalculation(context(), id, { calcId, ticked: true })
  for (const { item } of checkItems(sheetFactsOf(issue))) await fillCheckItem(context(), id, { item, verdict: 'ok', evidence: 'looked at' })
}

/** In check, with all that a pass takes. */
export async function checked(orm: MikroORM, team: Team) {
  const draft = await inCheck(orm, team)
  await check(orm, team, draft.id)
  return draft
}

async function pass(orm: MikroORM, team: Team, id: string) {
  await passCheck(contextOf(orm, team.checker), id, { expect: expectOf(await issueOf(orm, id)), password })
}

export async function forApproval(orm: MikroORM, team: Team) {
  const draft = await checked(orm, team)
  await pass(orm, team, draft.id)
  return draft
}

/** Takes a complete draft of a later letter through its check. */
export async function passedAgain(orm: MikroORM, team: Team, id: string) {
  await submitted(orm, team, id)
  await check(orm, team, id)
  await pass(orm, team, id)
}
