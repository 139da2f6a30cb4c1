import { randomUUID } from 'node:crypto'
import { MailSchema } from '#server/database/entities/mail'
import type { Person } from '#server/database/entities/person'
import { sendJob } from '#server/jobs/queue'
import type { EntityManager } from '@mikro-orm/postgresql'

/**
 * Writes a message to send with the act that causes it: it goes after commit,
 * and not at all on rollback. `event` names the act once and for all, so that
 * the same event never writes twice to the same person.
 */
export async function queueMail(context: { em: EntityManager, clock: () => Date }, message: { template: string, to: Person, props: Record<string, unknown>, event: string }): Promise<void> {
  const { em } = context
  if (message.to.disabledAt) return
  const known = await em.count(MailSchema, { event: message.event, recipient: message.to.id })
  if (known) return
  const id = randomUUID()
  em.create(MailSchema, { id, event: message.event, template: message.template, recipient: message.to, props: message.props, createdAt: context.clock() })
  await em.flush()
  await sendJob(em, 'mail', { mailId: id })
}
