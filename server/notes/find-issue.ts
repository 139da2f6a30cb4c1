import { LockMode } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { DomainError } from '#server/utils/domain-error'

const around = ['note', 'note.project', 'analyst', 'checker', 'approver', 'savedBy'] as const

/** An issue with its note, project and people. @throws DomainError not-found */
export async function findIssue(em: EntityManager, id: string): Promise<Issue> {
  const issue = await em.findOne(IssueSchema, { id }, { populate: [...around], refresh: true })
  if (!issue) throw new DomainError('not-found', 'There is no such issue.')
  return issue
}

/** Its number and letter, without its long texts. @throws DomainError not-found */
export async function findIssueLine(em: EntityManager, id: string): Promise<Pick<Issue, 'note' | 'letter'>> {
  const issue = await em.findOne(IssueSchema, { id }, { populate: ['note'], exclude: ['document', 'results'] })
  if (!issue) throw new DomainError('not-found', 'There is no such issue.')
  return issue
}

/** An issue as `findIssue` gives it, with its row locked for the rest of the transaction: acts on one issue wait for each other. */
export async function lockIssue(em: EntityManager, id: string): Promise<Issue> {
  const locked = await em.findOne(IssueSchema, { id }, { lockMode: LockMode.PESSIMISTIC_WRITE, refresh: true })
  if (!locked) throw new DomainError('not-found', 'There is no such issue.')
  await em.populate(locked, [...around])
  return locked
}

/** The issue that the next letter is opened from: the newest that is or was in force; where there is none, the newest, whose state then refuses. */
export async function issueToFollow(em: EntityManager, noteId: string): Promise<Issue> {
  const newest = { orderBy: { createdAt: 'desc' } } as const
  return await em.findOne(IssueSchema, { note: noteId, releasedAt: { $ne: null } }, newest) ?? em.findOneOrFail(IssueSchema, { note: noteId }, newest)
}
