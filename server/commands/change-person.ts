import { LockMode } from '@mikro-orm/core'
import type { ChangePerson } from '#shared/schemas/people'
import { recordAct, systemChain } from '#server/audit/record'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

const facts = (p: Person) => ({ name: p.name, auditor: p.auditor, administrator: p.administrator, disabled: p.disabledAt !== null })

/** Roles, name and access of a person. Nobody changes their own roles; the last administrator stays; disabling ends every session. */
export function changePerson(context: CommandContext, personId: string, change: ChangePerson): Promise<Person> {
  const name = { chain: systemChain, act: 'change person', subject: { type: 'person', id: personId, label: personId } }
  return runCommand(context, name, async (inside) => {
    const { em, actor, clock } = inside
    // All administrators are locked, so that two of them cannot disable each other at once.
    const administrators = await em.find(PersonSchema, { administrator: true, disabledAt: null }, { lockMode: LockMode.PESSIMISTIC_WRITE })
    const person = await em.findOne(PersonSchema, { id: personId }, { refresh: true })
    if (!person) throw new DomainError('not-found', 'There is no such person.')
    const roles = change.auditor !== undefined || change.administrator !== undefined || change.disabled !== undefined
    if (person.id === actor.id && roles) throw new DomainError('not-allowed', 'Nobody changes their own roles or access; ask another administrator.')
    const leaves = change.administrator === false || change.disabled === true
    if (leaves && person.administrator && administrators.length === 1 && administrators[0]?.id === person.id) {
      throw new DomainError('last-administrator', 'This is the last administrator; make another one first.')
    }
    const old = facts(person)
    person.name = change.name ?? person.name
    person.auditor = change.auditor ?? person.auditor
    person.administrator = change.administrator ?? person.administrator
    if (change.disabled === true && !person.disabledAt) {
      person.disabledAt = clock()
      person.sessionEpoch += 1
    }
    if (change.disabled === false) person.disabledAt = null
    await em.flush()
    await recordAct(inside, { ...name, subject: { ...name.subject, label: person.email }, old, new: facts(person) })
    return person
  })
}
