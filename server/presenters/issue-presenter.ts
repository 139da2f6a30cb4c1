import type { EntityManager } from '@mikro-orm/postgresql'
import { wasReleased } from '#shared/review/states'
import type { IssueView, SaveAnswer } from '#shared/schemas/issue-view'
import type { Person } from '#server/database/entities/person'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { abilitiesOf } from '#server/notes/facts'
import { findIssue } from '#server/notes/find-issue'
import { penHolder } from '#server/notes/pen'
import { looseNumbersOf, resultsOf } from '#server/notes/reading'
import { remainingNow } from '#server/notes/remaining-now'
import { loadStanding, type Standing } from '#server/notes/standing'
import { environment } from '#server/utils/environment'
import { personRef, presentAnswers, presentCheckSheet, presentLoose, presentRemarks, presentSignatures, presentTicks } from './issue-parts'
import { summaryOfIssue } from './issue-summary'

export interface Asker { em: EntityManager, actor: Person, clock: () => Date }

async function fileNames(em: EntityManager, { entries }: Standing): Promise<Map<string, string>> {
  const ids = entries.flatMap(e => e.fileId ? [e.fileId] : [])
  const files = ids.length ? await em.find(StoredFileSchema, { id: { $in: ids } }) : []
  return new Map(files.map(file => [file.id, file.name]))
}

function leastMargin({ issue }: Standing): IssueView['leastMargin'] {
  if (issue.leastMargin === null || issue.leastMargin === undefined) return null
  return { ms: issue.leastMargin, mode: issue.leastMarginMode ?? '', caseId: issue.leastMarginCase ?? '', calcId: issue.leastMarginCalc ?? '' }
}

/** What a save changes in the view: results, and all that hangs on them. */
async function living(asker: Asker, standing: Standing): Promise<SaveAnswer> {
  const results = resultsOf(standing.issue)
  const remaining = remainingNow(standing)
  return {
    save: standing.issue.saveNumber, savedAt: standing.issue.savedAt.toISOString(), results,
    loose: presentLoose(standing, looseNumbersOf(standing.issue)), answers: presentAnswers(standing, results),
    remarks: presentRemarks(standing, await fileNames(asker.em, standing)),
    abilities: await abilitiesOf(asker, standing, remaining), remaining, leastMargin: leastMargin(standing),
  }
}

function peopleOf({ issue, parts }: Standing): IssueView['people'] {
  const ref = (person: Person | null | undefined) => person ? personRef(person) : null
  return {
    analyst: ref(issue.analyst), checker: ref(issue.checker), approver: ref(issue.approver),
    contributors: parts.filter(p => p.issue.id === issue.id && p.part === 'contributor').map(p => personRef(p.person)),
  }
}

/** An issue as the asker may see it, with what they may do. */
export async function presentIssue(asker: Asker, issueId: string): Promise<IssueView> {
  const issue = await findIssue(asker.em, issueId)
  const standing = await loadStanding(asker.em, issue)
  const { project } = issue.note
  const pen = await penHolder(asker, issue)
  return {
    ...await living(asker, standing),
    id: issue.id, note: { id: issue.note.id, number: issue.note.number, project: { id: project.id, code: project.code, name: project.name, basis: project.basis } },
    letter: issue.letter, state: issue.state, releasing: Boolean(issue.releaseRequestedAt) && issue.state === 'for approval', releaseFailure: issue.releaseFailure ?? null,
    title: issue.title, part: issue.part, drawingIssue: issue.drawingIssue, changeNote: issue.changeNote, savedBy: personRef(issue.savedBy),
    document: JSON.parse(issue.document) as unknown, ticks: presentTicks(standing), checkSheet: presentCheckSheet(standing), signatures: presentSignatures(standing),
    people: peopleOf(standing), writer: pen && { person: personRef(pen.person), until: pen.until.toISOString(), you: pen.person.id === asker.actor.id },
    contentHash: wasReleased(issue.state) || issue.state === 'for approval' ? issue.contentHash ?? null : null, engineVersion: issue.engineVersion,
    issues: standing.issues.map(summaryOfIssue), demonstration: environment().demonstration,
  }
}

/** The answer to a save: everything that may have moved with it. */
export async function presentSave(asker: Asker, issueId: string): Promise<SaveAnswer> {
  return living(asker, await loadStanding(asker.em, await findIssue(asker.em, issueId)))
}
