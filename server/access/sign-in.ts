import type { EntityManager } from '@mikro-orm/postgresql'
import { recordAct, systemChain } from '#server/audit/record'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { passwordHolds } from './passwords'
import { clearFailures, countFailure, refuseIfThrottled } from './throttle'

interface Credentials { email: string, password: string, address: string }

/**
 * The person whose credentials hold, or null. Unknown, disabled and wrong
 * take the same time and leave the same row in the trail.
 * @throws DomainError throttled
 */
export async function signIn(em: EntityManager, { email, password, address }: Credentials, clock: () => Date): Promise<Person | null> {
  const login = email.trim().toLowerCase().slice(0, 254)
  await refuseIfThrottled(em, 'sign-in', login, clock())
  await refuseIfThrottled(em, 'address', address, clock())
  const person = await em.findOne(PersonSchema, { email: login })
  const holds = await passwordHolds(person?.passwordHash, password.slice(0, 1024))
  const admitted = holds && person !== null && !person.disabledAt
  await em.transactional(tx => recordAct({ em: tx, actor: person, clock }, {
    chain: systemChain, act: 'sign in', outcome: admitted ? 'done' : 'refused',
    subject: { type: 'person', id: person?.id ?? '-', label: login.replace(/\p{Cc}/gu, '') }, reason: admitted ? null : 'e-mail and password do not go together',
  }))
  if (!admitted) {
    await countFailure(em, 'sign-in', login, clock())
    await countFailure(em, 'address', address, clock())
    return null
  }
  await clearFailures(em, 'sign-in', login)
  return person
}
