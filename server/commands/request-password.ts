import type { EntityManager } from '@mikro-orm/postgresql'
import { recordAct, systemChain } from '#server/audit/record'
import { countFailure, refuseIfThrottled } from '#server/access/throttle'
import { PersonSchema } from '#server/database/entities/person'
import { sendLink } from './send-link'

/** Somebody forgot a password. The answer is the same whether the address is known or not. */
export async function requestPassword(em: EntityManager, clock: () => Date, email: string): Promise<void> {
  await refuseIfThrottled(em, 'forgotten', email, clock())
  await countFailure(em, 'forgotten', email, clock())
  await em.fork().transactional(async (tx) => {
    const person = await tx.findOne(PersonSchema, { email, disabledAt: null })
    if (!person) return
    await sendLink({ em: tx, clock }, person, 'forgotten')
    await recordAct({ em: tx, actor: person, clock }, { chain: systemChain, act: 'ask for a new password', subject: { type: 'person', id: person.id, label: person.email } })
  })
}
