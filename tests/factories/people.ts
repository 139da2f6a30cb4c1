import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { addPerson } from '#server/commands/add-person'
import { addProject } from '#server/commands/add-project'
import { createAdministrator } from '#server/commands/create-administrator'
import { setMember } from '#server/commands/set-member'
import { setPassword } from '#server/commands/set-password'
import { MailSchema } from '#server/database/entities/mail'
import { PersonSchema, type Person } from '#server/database/entities/person'
import type { Project } from '#server/database/entities/project'
import type { ProjectRole } from '#server/database/entities/project-member'
import type { CommandContext } from '#server/utils/command-context'

export const password = 'correct horse battery staple'
const clock = () => new Date()
const tokenOf = (url: string) => url.slice(url.lastIndexOf('/') + 1)
const tag = () => randomUUID().slice(0, 8)

export const contextOf = (orm: MikroORM, actor: Person): CommandContext => ({ em: orm.em.fork(), actor, clock })

/** An administrator made as the terminal makes one, with a password set through the link. */
export async function makeAdministrator(orm: MikroORM, name = 'Ada Administrator'): Promise<Person> {
  const email = `admin-${tag()}@example.org`
  const link = await createAdministrator(orm.em.fork(), clock, { email, name })
  await setPassword(orm.em.fork(), clock, tokenOf(link), password)
  return orm.em.fork().findOneOrFail(PersonSchema, { email })
}

/** Somebody the administrator added, with a password set through the mailed link. */
export async function makePerson(orm: MikroORM, administrator: Person, name: string, global: { auditor?: boolean, administrator?: boolean } = {}): Promise<Person> {
  const email = `${name.toLowerCase().replace(/[^a-z]+/g, '-')}-${tag()}@example.org`
  const person = await addPerson(contextOf(orm, administrator), { email, name, auditor: global.auditor ?? false, administrator: global.administrator ?? false })
  const mail = await orm.em.fork().findOneOrFail(MailSchema, { recipient: person.id, template: 'invited' })
  await setPassword(orm.em.fork(), clock, tokenOf(String(mail.props.url)), password)
  return orm.em.fork().findOneOrFail(PersonSchema, { id: person.id })
}

export async function makeProject(orm: MikroORM, administrator: Person, members: [Person, ProjectRole[]][] = []): Promise<Project> {
  const code = `P-${tag()}`
  const project = await addProject(contextOf(orm, administrator), { code, name: `Project ${code}`, notePattern: `${code}-{0000}`, basis: 'CS-25', criteria: '' })
  for (const [person, roles] of members) await setMember(contextOf(orm, administrator), project.id, { personId: person.id, roles })
  return project
}

/** The people one note needs, in a project of their own. */
export async function makeTeam(orm: MikroORM) {
  const administrator = await makeAdministrator(orm)
  const [analyst, checker, approver, auditor, outsider] = [
    await makePerson(orm, administrator, 'Anna Analyst'), await makePerson(orm, administrator, 'Chris Checker'),
    await makePerson(orm, administrator, 'Alba Approver'), await makePerson(orm, administrator, 'Otis Auditor', { auditor: true }),
    await makePerson(orm, administrator, 'Oona Outsider'),
  ]
  const project = await makeProject(orm, administrator, [[analyst, ['analyst']], [checker, ['checker']], [approver, ['approver']]])
  return { administrator, analyst, checker, approver, auditor, outsider, project }
}
