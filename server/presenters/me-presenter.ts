import type { EntityManager } from '@mikro-orm/postgresql'
import type { Person } from '#server/database/entities/person'
import { ProjectMemberSchema, type ProjectRole } from '#server/database/entities/project-member'
import { environment } from '#server/utils/environment'
import { presentWorklist } from './worklist-presenter'

export interface MyProject { id: string, code: string, name: string, roles: ProjectRole[] }

/** The signed-in person, their projects and how much waits for them. */
export async function presentMe(em: EntityManager, person: Person) {
  const members = await em.find(ProjectMemberSchema, { person }, { populate: ['project'], orderBy: { project: { code: 'asc' } } })
  const projects = new Map<string, MyProject>()
  for (const { project, role } of members) {
    const known = projects.get(project.id) ?? { id: project.id, code: project.code, name: project.name, roles: [] }
    known.roles.push(role)
    projects.set(project.id, known)
  }
  return {
    id: person.id, name: person.name, email: person.email, auditor: person.auditor, administrator: person.administrator,
    projects: [...projects.values()], waiting: (await presentWorklist(em, person)).length, demonstration: environment().demonstration,
  }
}
