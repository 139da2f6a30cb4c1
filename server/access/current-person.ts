import type { EntityManager } from '@mikro-orm/postgresql'
import type { H3Event } from 'h3'
import { getToken } from '#auth'
import { PersonSchema, type Person } from '#server/database/entities/person'

/**
 * Who asks: the person of the signed session token, read afresh at every
 * request. A disabled person, or a session from before the epoch was raised,
 * is nobody.
 */
export async function currentPerson(event: H3Event, em: EntityManager): Promise<Person | null> {
  const token = await getToken({ event })
  if (typeof token?.sub !== 'string' || typeof token.epoch !== 'number') return null
  const person = await em.findOne(PersonSchema, { id: token.sub })
  if (!person || person.disabledAt || person.sessionEpoch !== token.epoch) return null
  return person
}
