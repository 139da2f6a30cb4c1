import type { EntityManager } from '@mikro-orm/postgresql'
import { contributedTo, partIn, whyNotApprover, whyNotChecker, type Candidate } from '#shared/review/eligibility'
import type { Issue } from '#server/database/entities/issue'
import type { Person } from '#server/database/entities/person'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import { DomainError } from '#server/utils/domain-error'
import type { Standing } from './standing'

export interface CandidateView { id: string, name: string, eligible: boolean, why: string | null }

/** A person as eligibility sees them, for this issue. */
export function candidateOf(standing: Pick<Standing, 'issue' | 'issues' | 'parts'>, person: Person, roles: Candidate['roles']): Candidate {
  const { issue, issues, parts } = standing
  const lines = parts.map(p => ({ letter: issues.find(i => i.id === p.issue.id)?.letter ?? '', personId: p.person.id, part: p.part }))
  return {
    called: person.name, disabled: Boolean(person.disabledAt), roles,
    contributedTo: contributedTo(person.id, issue.letter, issues.map(({ letter, state }) => ({ letter, state })), lines),
    part: partIn(person.id, issue.letter, lines),
  }
}

async function membersOf(em: EntityManager, issue: Issue): Promise<{ person: Person, roles: Candidate['roles'] }[]> {
  const members = await em.find(ProjectMemberSchema, { project: issue.note.project.id }, { populate: ['person'], orderBy: { person: { name: 'asc' } } })
  const people = new Map(members.map(m => [m.person.id, m.person]))
  return [...people.values()].map(person => ({ person, roles: members.filter(m => m.person.id === person.id).map(m => m.role) }))
}

/** Who may be named checker and approver, and why others may not. */
export async function candidatesFor(em: EntityManager, standing: Standing): Promise<{ checkers: CandidateView[], approvers: CandidateView[] }> {
  const members = await membersOf(em, standing.issue)
  const view = (role: 'checker' | 'approver', why: typeof whyNotChecker) => members.filter(m => m.roles.includes(role) && !m.person.disabledAt).map(({ person, roles }) => {
    const reason = why(candidateOf(standing, person, roles), standing.issue.letter)
    return { id: person.id, name: person.name, eligible: reason === null, why: reason }
  })
  return { checkers: view('checker', whyNotChecker), approvers: view('approver', whyNotApprover) }
}

/** The person of this id, eligible for the role. @throws DomainError not-eligible with the reason */
export async function eligible(em: EntityManager, standing: Pick<Standing, 'issue' | 'issues' | 'parts'>, personId: string, role: 'checker' | 'approver'): Promise<Person> {
  const member = (await membersOf(em, standing.issue)).find(m => m.person.id === personId)
  const refuse = (why: string) => new DomainError('not-eligible', why, { fields: { [`${role}Id`]: why } })
  if (!member) throw refuse(`This person is no ${role} of this project.`)
  const why = (role === 'checker' ? whyNotChecker : whyNotApprover)(candidateOf(standing, member.person, member.roles), standing.issue.letter)
  if (why) throw refuse(why)
  return member.person
}
