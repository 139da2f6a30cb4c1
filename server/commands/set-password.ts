import type { EntityManager } from '@mikro-orm/postgresql'
import { LockMode } from '@mikro-orm/core'
import { hashPassword } from '#server/access/passwords'
import { recordAct, systemChain } from '#server/audit/record'
import { OneTimeLinkSchema, type OneTimeLink } from '#server/database/entities/one-time-link'
import { DomainError } from '#server/utils/domain-error'
import { tokenHash } from './send-link'

const spent = () => new DomainError('link-spent', 'This link was used already or is too old. Ask for a new one under "Forgotten password".')

/** The link a token belongs to, while it can still be used. */
export async function usableLink(em: EntityManager, token: string, now: Date, lock = false): Promise<OneTimeLink> {
  const link = await em.findOne(OneTimeLinkSchema, { tokenHash: tokenHash(token) }, lock ? { lockMode: LockMode.PESSIMISTIC_WRITE } : {})
  if (!link || link.usedAt || link.expiresAt <= now) throw spent()
  await em.populate(link, ['person'])
  if (link.person.disabledAt) throw spent()
  return link
}

/** Sets a password through a one-time link, and ends the person's other sessions. */
export async function setPassword(em: EntityManager, clock: () => Date, token: string, password: string): Promise<void> {
  await usableLink(em.fork(), token, clock())
  const passwordHash = await hashPassword(password)
  await em.fork().transactional(async (tx) => {
    const link = await usableLink(tx, token, clock(), true)
    link.usedAt = clock()
    link.person.passwordHash = passwordHash
    link.person.sessionEpoch += 1
    await tx.flush()
    await recordAct({ em: tx, actor: link.person, clock }, { chain: systemChain, act: 'set password', subject: { type: 'person', id: link.person.id, label: link.person.email } })
  })
}
