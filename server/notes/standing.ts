import type { EntityManager } from '@mikro-orm/postgresql'
import { CheckEntrySchema, type CheckEntry } from '#server/database/entities/check-entry'
import { GuardAnswerSchema, type GuardAnswer } from '#server/database/entities/guard-answer'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { IssuePartSchema, type IssuePart } from '#server/database/entities/issue-part'
import { LooseDecisionSchema, type LooseDecision } from '#server/database/entities/loose-decision'
import { RemarkSchema, type Remark } from '#server/database/entities/remark'
import { RemarkEntrySchema, type RemarkEntry } from '#server/database/entities/remark-entry'
import { SignatureSchema, type Signature } from '#server/database/entities/signature'
import { TickSchema, type Tick } from '#server/database/entities/tick'
import { contentFrom, type Content } from './content'

/** What is known of the other issues of a note without reading their documents. */
export type IssueLine = Omit<Issue, 'document' | 'results'>

/** An issue with everything that people have decided about it, read once. */
export interface Standing {
  issue: Issue
  /** All issues of the note, the newest first, without their documents. */
  issues: IssueLine[]
  parts: IssuePart[]
  answers: GuardAnswer[]
  decisions: LooseDecision[]
  remarks: Remark[]
  entries: RemarkEntry[]
  ticks: Tick[]
  sheet: CheckEntry[]
  signatures: Signature[]
  /** Made when it is asked for: most acts do not rest on it, and it is as long as the note. */
  readonly content: Content
}

export async function loadStanding(em: EntityManager, issue: Issue): Promise<Standing> {
  const of = { issue: issue.id }
  const issues = await em.find(IssueSchema, { note: issue.note.id }, { orderBy: { createdAt: 'desc' }, exclude: ['document', 'results'] })
  const remarks = await em.find(RemarkSchema, of, { populate: ['author', 'closedBy'], orderBy: { number: 'asc' } })
  const answers = await em.find(GuardAnswerSchema, of, { populate: ['author', 'judgedBy', 'approvedBy'], orderBy: { at: 'asc' } })
  const decisions = await em.find(LooseDecisionSchema, of, { populate: ['author'] })
  return {
    issue, issues, remarks, answers, decisions,
    parts: await em.find(IssuePartSchema, { issue: { $in: issues.map(i => i.id) } }, { populate: ['person'] }),
    entries: await em.find(RemarkEntrySchema, { remark: { $in: remarks.map(r => r.id) } }, { populate: ['author'], orderBy: { at: 'asc' } }),
    ticks: await em.find(TickSchema, of, { populate: ['person'] }),
    sheet: await em.find(CheckEntrySchema, of, { populate: ['person'] }),
    signatures: await em.find(SignatureSchema, of, { populate: ['person'], orderBy: { at: 'asc' } }),
    get content() {
      return contentFrom(issue, answers, decisions)
    },
  }
}
