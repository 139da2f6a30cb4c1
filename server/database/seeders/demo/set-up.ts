/** Before the story: the administrator, the people with their passwords, the projects and who works in them. */
import type { EntityManager } from '@mikro-orm/postgresql'
import { addPerson } from '#server/commands/add-person'
import { addProject } from '#server/commands/add-project'
import { createAdministrator } from '#server/commands/create-administrator'
import { makeLink } from '#server/commands/send-link'
import { setMember } from '#server/commands/set-member'
import { setPassword } from '#server/commands/set-password'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { FIRST_DAY, type DemoClock } from './demo-clock'
import { PEOPLE, PROJECTS, type DemoPerson, type PersonKey, type ProjectCode } from './people'

export interface Cast { people: Record<PersonKey, Person>, projects: Record<ProjectCode, string> }

const tokenOf = (link: string): string => link.slice(link.lastIndexOf('/') + 1)

/** A password through a one-time link, as everybody sets theirs. */
async function giveEntry(em: EntityManager, clock: () => Date, person: Person, password: string): Promise<void> {
  const link = await em.fork().transactional(async tx => makeLink({ em: tx, clock }, await tx.findOneOrFail(PersonSchema, { id: person.id }), 'invitation'))
  await setPassword(em, clock, tokenOf(link), password)
}

/** The administrator adds a person every five minutes; each sets a password two hours later. */
async function addEverybody(em: EntityManager, time: DemoClock, administrator: Person, password: string): Promise<[PersonKey, Person][]> {
  const added: [PersonKey, Person][] = []
  const moment = (hour: string, index: number) => () => time.at(`${FIRST_DAY} ${hour}:${String(index * 5).padStart(2, '0')}`)
  for (const [index, { key, email, name, auditor, administrator: chief }] of PEOPLE.entries()) {
    if (chief) continue
    added.push([key, await addPerson({ em, actor: administrator, clock: moment('09', index) }, { email, name, auditor, administrator: false })])
  }
  for (const [index, [, person]] of added.entries()) await giveEntry(em, moment('11', index), person, password)
  // Read again: what was made before the password was set knows nothing of it, and signing asks for it.
  const fresh = em.fork()
  return Promise.all(added.map(async ([key, { id }]): Promise<[PersonKey, Person]> => [key, await fresh.findOneOrFail(PersonSchema, { id })]))
}

async function addProjects(em: EntityManager, clock: () => Date, administrator: Person, people: Record<PersonKey, Person>): Promise<[ProjectCode, string][]> {
  const added: [ProjectCode, string][] = []
  for (const { code, name, notePattern, basis, criteria } of PROJECTS) {
    const context = { em, actor: administrator, clock }
    const project = await addProject(context, { code, name, notePattern, basis, criteria })
    for (const one of PEOPLE) {
      const roles = one.roles[code]
      if (roles !== undefined) await setMember(context, project.id, { personId: people[one.key].id, roles })
    }
    added.push([code, project.id])
  }
  return added
}

function chiefOf(people: DemoPerson[]): DemoPerson {
  const chief = people.find(one => one.administrator)
  if (chief === undefined) throw new Error('The demonstration needs an administrator')
  return chief
}

/** Makes the cast. The administrator comes first, from the terminal's command, and adds everyone else. */
export async function setUpCast(em: EntityManager, time: DemoClock, password: string): Promise<Cast> {
  const at = (hour: string) => () => time.at(`${FIRST_DAY} ${hour}`)
  const chief = chiefOf(PEOPLE)
  const link = await createAdministrator(em, at('08:00'), { email: chief.email, name: chief.name })
  await setPassword(em, at('08:10'), tokenOf(link), password)
  const administrator = await em.fork().findOneOrFail(PersonSchema, { email: chief.email })
  const people = Object.fromEntries([[chief.key, administrator], ...await addEverybody(em, time, administrator, password)]) as Record<PersonKey, Person>
  const projects = Object.fromEntries(await addProjects(em, at('10:00'), administrator, people)) as Record<ProjectCode, string>
  return { people, projects }
}
