import { randomUUID } from 'node:crypto'
import type { AddPerson } from '#shared/schemas/people'
import { recordAct, systemChain } from '#server/audit/record'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'
import { sendLink } from './send-link'

/** The administrator adds a person, who sets a password through a link sent by e-mail. */
export function addPerson(context: CommandContext, input: AddPerson): Promise<Person> {
  const id = randomUUID()
  const subject = { type: 'person', id, label: input.email }
  return runCommand(context, { chain: systemChain, act: 'add person', subject }, async (inside) => {
    const { em, clock } = inside
    if (await em.count(PersonSchema, { email: input.email })) {
      throw new DomainError('taken', 'Somebody has, or once had, this e-mail address; it is never given to another.', { fields: { email: 'This address is taken for good.' } })
    }
    const person = em.create(PersonSchema, {
      id, email: input.email, name: input.name, auditor: input.auditor, administrator: input.administrator,
      disabledAt: null, sessionEpoch: 0, createdAt: clock(),
    })
    await em.flush()
    await recordAct(inside, { chain: systemChain, act: 'add person', subject, new: { name: input.name, auditor: input.auditor, administrator: input.administrator } })
    await sendLink(inside, person, 'invitation')
    return person
  })
}
