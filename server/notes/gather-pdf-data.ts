import type { EntityManager } from '@mikro-orm/postgresql'
import { filesOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { checkItems } from '#shared/review/check-sheet'
import { CheckEntrySchema } from '#server/database/entities/check-entry'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { IssuePartSchema } from '#server/database/entities/issue-part'
import { LooseDecisionSchema } from '#server/database/entities/loose-decision'
import type { Person } from '#server/database/entities/person'
import { SignatureSchema, type Signature } from '#server/database/entities/signature'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { TickSchema } from '#server/database/entities/tick'
import type { NotePdfData, PdfFigure, PdfPerson } from '#server/pdf/note-pdf-data'
import { getFile } from '#server/storage/files'
import { environment } from '#server/utils/environment'
import { contentOf } from './content'
import type { Results } from './evaluate-document'
import { sheetFactsOf } from './sheet-facts'

const iso = (date: Date | null | undefined) => date?.toISOString() ?? null

function personLine(role: PdfPerson['role'], person: Person | null | undefined, signature: Signature | undefined): PdfPerson {
  return { role, name: person?.name ?? null, at: iso(signature?.at), save: signature?.saveNumber ?? null }
}

async function peopleOf(em: EntityManager, issue: Issue): Promise<PdfPerson[]> {
  const signatures = await em.find(SignatureSchema, { issue, voidedAt: null }, { orderBy: { at: 'desc' } })
  const signed = (meaning: Signature['meaning']) => signatures.find(s => s.meaning === meaning)
  return [personLine('Analyst', issue.analyst, signed('submitted')), personLine('Checker', issue.checker, signed('passed')), personLine('Approver', issue.approver, signed('released'))]
}

async function figuresOf(em: EntityManager, issue: Issue): Promise<Record<string, PdfFigure>> {
  const ids = [...new Set(filesOf(readDocument(JSON.parse(issue.document))))]
  const files = await em.find(StoredFileSchema, { id: { $in: ids }, purpose: 'figure' })
  return Object.fromEntries(await Promise.all(files.map(async file => [file.id, { mime: file.mime, bytes: await getFile(file.storageKey) }] as const)))
}

async function checkSheetOf(em: EntityManager, issue: Issue) {
  const filled = new Map((await em.find(CheckEntrySchema, { issue }, { populate: ['person'] })).map(entry => [entry.item, entry]))
  return checkItems(sheetFactsOf(issue)).map(({ item, text }) => {
    const entry = filled.get(item)
    return { item, text, verdict: entry?.verdict ?? null, evidence: entry?.evidence ?? '', by: entry?.person.name ?? null, at: iso(entry?.at) }
  })
}

async function decisionsOf(em: EntityManager, issue: Issue) {
  const answers = await em.find(GuardAnswerSchema, { issue }, { populate: ['author', 'judgedBy', 'approvedBy'], orderBy: { at: 'asc' } })
  const loose = await em.find(LooseDecisionSchema, { issue }, { populate: ['author'], orderBy: { at: 'asc' } })
  const ticks = await em.find(TickSchema, { issue }, { populate: ['person'] })
  return {
    answers: answers.map(a => ({
      calcId: a.calcId, guardKey: a.guardKey, kind: a.kind, text: a.text, author: a.author.name, at: a.at.toISOString(),
      judged: a.judgedBy && a.judgedAt ? { accepted: a.accepted === true, by: a.judgedBy.name, at: a.judgedAt.toISOString(), note: a.judgement } : null,
      approved: a.approvedBy && a.approvedAt ? { by: a.approvedBy.name, at: a.approvedAt.toISOString() } : null,
    })),
    loose: loose.map(d => ({ blockId: d.blockId, text: d.text, reason: d.reason, by: d.author.name, at: d.at.toISOString() })),
    ticks: ticks.map(t => ({ calcId: t.calcId, by: t.person.name, at: t.at.toISOString(), save: t.saveNumber })),
  }
}

async function revisionsOf(em: EntityManager, issue: Issue, asReleased: Date | null) {
  const issues = await em.find(IssueSchema, { note: issue.note, createdAt: { $lte: issue.createdAt } }, { orderBy: { createdAt: 'desc' }, exclude: ['document', 'results'] })
  return issues.map(i => ({
    letter: i.letter, state: i.id === issue.id && asReleased ? 'released' : i.state, releasedAt: i.id === issue.id && asReleased ? asReleased.toISOString() : iso(i.releasedAt),
    change: i.changeNote, leastMargin: i.leastMargin ?? null, leastMarginMode: i.leastMarginMode ?? null,
  }))
}

/**
 * Everything a print of an issue shows. With `releasedAt` it is the released
 * PDF, made while the issue still waits for approval; without, an uncontrolled one.
 */
export async function gatherPdfData(em: EntityManager, issue: Issue, options: { at: Date, releasedAt?: Date }): Promise<NotePdfData> {
  const content = options.releasedAt ? await contentOf(em, issue) : null
  const parts = await em.find(IssuePartSchema, { issue, part: 'contributor' }, { populate: ['person'] })
  const { project } = issue.note
  return {
    number: issue.note.number, letter: issue.letter, state: options.releasedAt ? 'released' : issue.state, title: issue.title, part: issue.part, drawingIssue: issue.drawingIssue,
    project: { code: project.code, name: project.name, basis: project.basis }, organisation: environment().organisation,
    changeNote: issue.changeNote, save: issue.saveNumber, engineVersion: issue.engineVersion, contentHash: content?.hash ?? null, frozen: content?.text ?? null,
    people: await peopleOf(em, issue), contributors: parts.map(p => p.person.name), revisions: await revisionsOf(em, issue, options.releasedAt ?? null),
    document: JSON.parse(issue.document), results: JSON.parse(issue.results) as Results, ...await decisionsOf(em, issue),
    checkSheet: await checkSheetOf(em, issue), figures: await figuresOf(em, issue),
    demonstration: environment().demonstration, uncontrolled: !options.releasedAt, createdAt: options.at.toISOString(),
  }
}
