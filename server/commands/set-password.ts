import type { EntityManager } from '@mikro-orm/postgresql'
import { usableLink } from '#server/access/one-time-links'
import { hashPassword } from '#server/access/passwords'
import { recordAct, systemChain } from '#server/audit/record'

/** Sets a password through a one-time link, and ends the person's other sessions. */
export async function setPassword(em: EntityManager, clock: () => Date, token: string, password: string): Promise<void> {
  await usableLink(em.fork(), token, clock())
  const passwordHash = await hashPassword(password)
  await em.fork().transactional(async (tx) => {
    const link = await usableLink(tx, token, clock(), { lock: true })
    link.usedAt = clock()
    link.person.passwordHash = passwordHash
    link.person.sessionEpoch += 1
    await tx.flush()
    await recordAct({ em: tx, actor: link.person, clock }, { chain: systemChain, act: 'set password', subject: { type: 'person', id: link.person.id, label: link.person.email } })
  })
}
