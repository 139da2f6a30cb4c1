import { randomBytes, randomUUID } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { tokenHash } from '#server/access/one-time-links'
import { OneTimeLinkSchema } from '#server/database/entities/one-time-link'
import type { Person } from '#server/database/entities/person'
import { queueMail } from '#server/mail/queue-mail'
import { environment } from '#server/utils/environment'

const hours = { invitation: 72, forgotten: 2 } as const

/** Makes a one-time link and voids earlier ones of the same person. Only the token's hash is stored. */
export async function makeLink({ em, clock }: { em: EntityManager, clock: () => Date }, person: Person, purpose: keyof typeof hours): Promise<string> {
  const token = randomBytes(32).toString('base64url')
  const now = clock()
  await em.nativeUpdate(OneTimeLinkSchema, { person: person.id, usedAt: null }, { usedAt: now })
  em.create(OneTimeLinkSchema, {
    id: randomUUID(), person, tokenHash: tokenHash(token), purpose, createdAt: now,
    expiresAt: new Date(now.getTime() + hours[purpose] * 3_600_000), usedAt: null,
  })
  await em.flush()
  return `${environment().baseUrl}/password/${token}`
}

/** Makes a link and queues the e-mail that carries it. */
export async function sendLink(context: { em: EntityManager, clock: () => Date }, person: Person, purpose: keyof typeof hours): Promise<void> {
  const url = await makeLink(context, person, purpose)
  await queueMail(context, {
    template: purpose === 'invitation' ? 'invited' : 'forgotten-password', to: person,
    props: { name: person.name, url, hours: hours[purpose] }, event: `link:${tokenHash(url)}`,
  })
}
