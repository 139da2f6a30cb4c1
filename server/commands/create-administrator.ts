import { randomUUID } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { recordAct, systemChain } from '#server/audit/record'
import { PersonSchema } from '#server/database/entities/person'
import { DomainError } from '#server/utils/domain-error'
import { makeLink } from './send-link'

/** Makes the first administrator, or a new link for one, from the terminal. Returns the one-time link. */
export function createAdministrator(em: EntityManager, clock: () => Date, input: { email: string, name: string }): Promise<string> {
  return em.fork().transactional(async (tx) => {
    const known = await tx.findOne(PersonSchema, { email: input.email })
    if (known && (!known.administrator || known.disabledAt)) throw new DomainError('taken', 'This address belongs to somebody who is no administrator, or disabled.')
    const person = known ?? tx.create(PersonSchema, {
      id: randomUUID(), email: input.email, name: input.name, auditor: false, administrator: true,
      disabledAt: null, sessionEpoch: 0, createdAt: clock(),
    })
    await tx.flush()
    const link = await makeLink({ em: tx, clock }, person, 'invitation')
    await recordAct({ em: tx, actor: null, clock }, { chain: systemChain, act: 'make administrator', subject: { type: 'person', id: person.id, label: person.email } })
    return link
  })
}
