import { createHash } from 'node:crypto'
import { LockMode } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { OneTimeLinkSchema, type OneTimeLink } from '#server/database/entities/one-time-link'
import { DomainError } from '#server/utils/domain-error'

export const tokenHash = (token: string) => createHash('sha256').update(token).digest('hex')

const spent = () => new DomainError('link-spent', 'This link was used already or is too old. Ask for a new one under "Forgotten password".')

/** The link a token belongs to, while it can still be used. @throws DomainError link-spent */
export async function usableLink(em: EntityManager, token: string, now: Date, options: { lock?: boolean } = {}): Promise<OneTimeLink> {
  const link = await em.findOne(OneTimeLinkSchema, { tokenHash: tokenHash(token) }, options.lock ? { lockMode: LockMode.PESSIMISTIC_WRITE } : {})
  if (!link || link.usedAt || link.expiresAt <= now) throw spent()
  await em.populate(link, ['person'])
  if (link.person.disabledAt) throw spent()
  return link
}
