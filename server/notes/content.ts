import { createHash } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { contentText } from '#shared/review/content-hash'
import { GuardAnswerSchema, type GuardAnswer } from '#server/database/entities/guard-answer'
import type { Issue } from '#server/database/entities/issue'
import { LooseDecisionSchema, type LooseDecision } from '#server/database/entities/loose-decision'
import { contentRead, resultsOf, type Content } from './reading'

export type { Content }

export async function contentOf(em: EntityManager, issue: Issue): Promise<Content> {
  return contentFrom(issue, await em.find(GuardAnswerSchema, { issue }), await em.find(LooseDecisionSchema, { issue }))
}

/** All frozen parts of an issue as canonical text, and its SHA-256. Made here only. */
export function contentFrom(issue: Issue, answers: readonly GuardAnswer[], loose: readonly LooseDecision[]): Content {
  const rest = {
    number: issue.note.number, letter: issue.letter, title: issue.title, part: issue.part, drawingIssue: issue.drawingIssue, changeNote: issue.changeNote, engineVersion: issue.engineVersion,
    answers: answers.map(a => ({ calcId: a.calcId, guardKey: a.guardKey, kind: a.kind, text: a.text, facts: a.facts, authorId: a.author.id, at: a.at.toISOString() })),
    loose: loose.map(d => ({ blockId: d.blockId, text: d.text, ordinal: d.ordinal, verdict: d.verdict, reason: d.reason, authorId: d.author.id, at: d.at.toISOString() })),
  }
  return contentRead(issue, JSON.stringify(rest), () => {
    const text = contentText({ ...rest, document: JSON.parse(issue.document), results: resultsOf(issue) })
    return { text, hash: createHash('sha256').update(text).digest('hex') }
  })
}
