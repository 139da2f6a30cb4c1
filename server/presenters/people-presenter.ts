import type { EntityManager } from '@mikro-orm/postgresql'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { ProjectMemberSchema, type ProjectMember } from '#server/database/entities/project-member'
import { ProjectSchema } from '#server/database/entities/project'

function grouped<K extends string>(members: ProjectMember[], by: (m: ProjectMember) => K): Map<K, ProjectMember[]> {
  const groups = new Map<K, ProjectMember[]>()
  for (const member of members) groups.set(by(member), [...groups.get(by(member)) ?? [], member])
  return groups
}

const roles = (members: ProjectMember[]) => members.map(m => m.role).sort()

/** Everybody, for the administrator; never a password hash. */
export async function presentPeople(em: EntityManager) {
  const people = await em.find(PersonSchema, {}, { orderBy: { name: 'asc' } })
  const byPerson = grouped(await em.find(ProjectMemberSchema, {}, { populate: ['project'] }), m => m.person.id)
  return people.map((person) => {
    const byProject = grouped(byPerson.get(person.id) ?? [], m => m.project.code)
    return {
      id: person.id, name: person.name, email: person.email, auditor: person.auditor, administrator: person.administrator,
      disabled: person.disabledAt !== null && person.disabledAt !== undefined, hasPassword: Boolean(person.passwordHash),
      projects: [...byProject].map(([code, members]) => ({ code, roles: roles(members) })).sort((a, b) => a.code.localeCompare(b.code)),
    }
  })
}

/** The projects a person may see, with their members. */
export async function presentProjects(em: EntityManager, person: Person) {
  const all = person.auditor || person.administrator
  const mine = (await em.find(ProjectMemberSchema, { person })).map(m => m.project.id)
  const projects = await em.find(ProjectSchema, all ? {} : { id: { $in: mine } }, { orderBy: { code: 'asc' } })
  const members = await em.find(ProjectMemberSchema, { project: { $in: projects.map(p => p.id) } }, { populate: ['person'] })
  const byProject = grouped(members, m => m.project.id)
  const counts = await em.execute<{ project_id: string, n: string }[]>('select project_id, count(*) as n from note group by project_id')
  const noteCount = new Map(counts.map(row => [row.project_id, Number(row.n)]))
  return projects.map((project) => {
    const byPerson = grouped(byProject.get(project.id) ?? [], m => m.person.id)
    return {
      id: project.id, code: project.code, name: project.name, notePattern: project.notePattern, basis: project.basis, criteria: project.criteria,
      noteCount: noteCount.get(project.id) ?? 0,
      members: [...byPerson.values()].map(list => ({ person: { id: list[0]!.person.id, name: list[0]!.person.name }, roles: roles(list) })).sort((a, b) => a.person.name.localeCompare(b.person.name)),
    }
  })
}
