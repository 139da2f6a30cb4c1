import type { EntityManager } from '@mikro-orm/postgresql'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { NoteSchema, type Note } from '#server/database/entities/note'
import type { Person } from '#server/database/entities/person'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import { DomainError } from '#server/utils/domain-error'

/**
 * Who may ask which route at all: the one table of the server. What an act
 * needs beyond that (state, part, eligibility) is the command's, by
 * shared/review. Somebody who may not see a thing gets 404, so that its
 * existence is not told; who sees it but may not act gets 403.
 */
export interface Asked { em: EntityManager, actor: Person | null, params: Record<string, unknown> }

const signedIn = (asked: Asked): Person => {
  if (!asked.actor) throw new DomainError('not-signed-in', 'Sign in to go on; what you typed is kept.')
  return asked.actor
}

const seesAll = (person: Person) => person.auditor || person.administrator

/** Whether a person may see what belongs to a project. */
export async function seesProject(em: EntityManager, person: Person, projectId: string): Promise<boolean> {
  return seesAll(person) || await em.count(ProjectMemberSchema, { project: projectId, person: person.id }) > 0
}

const missing = (what: string) => new DomainError('not-found', `There is no ${what} here that you may see.`)

async function visibleIssue(asked: Asked): Promise<{ actor: Person, issue: Issue }> {
  const actor = signedIn(asked)
  const issue = await asked.em.findOne(IssueSchema, { id: String(asked.params.id) }, { populate: ['note', 'note.project', 'analyst', 'checker', 'approver', 'savedBy'] })
  if (!issue || !await seesProject(asked.em, actor, issue.note.project.id)) throw missing('issue')
  return { actor, issue }
}

async function visibleNote(asked: Asked): Promise<{ actor: Person, note: Note }> {
  const actor = signedIn(asked)
  const note = await asked.em.findOne(NoteSchema, { number: String(asked.params.number) }, { populate: ['project'] })
  if (!note || !await seesProject(asked.em, actor, note.project.id)) throw missing('note')
  return { actor, note }
}

export const policies = {
  /** Sign-in page, forgotten password, health. */
  'public': async () => ({}),
  'signed-in': async (asked: Asked) => ({ actor: signedIn(asked) }),
  'administrator': async (asked: Asked) => {
    const actor = signedIn(asked)
    if (!actor.administrator) throw new DomainError('not-allowed', 'Only an administrator may do this; ask one.')
    return { actor }
  },
  'auditor': async (asked: Asked) => {
    const actor = signedIn(asked)
    if (!seesAll(actor)) throw new DomainError('not-allowed', 'The trail is open to auditors and administrators.')
    return { actor }
  },
  'see-issue': visibleIssue,
  'see-note': visibleNote,
}
export type PolicyName = keyof typeof policies
export type Granted<Name extends PolicyName> = Awaited<ReturnType<typeof policies[Name]>>
