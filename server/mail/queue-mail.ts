import { randomUUID } from 'node:crypto'
import type { MailProps, MailTemplate } from '#emails/registry'
import { MailSchema } from '#server/database/entities/mail'
import type { Person } from '#server/database/entities/person'
import { sendJob } from '#server/jobs/queue'
import type { EntityManager } from '@mikro-orm/postgresql'

/**
 * Writes a message to send with the act that causes it: it goes after commit,
 * and not at all on rollback. `event` names the act once and for all, so that
 * the same event never writes twice to the same person.
 */
export async function queueMail<Template extends MailTemplate>(
  context: { em: EntityManager, clock: () => Date },
  message: { template: Template, to: Person, props: MailProps<Template>, event: string },
): Promise<void> {
  const { em } = context
  if (message.to.disabledAt) return
  const known = await em.count(MailSchema, { event: message.event, recipient: message.to.id })
  if (known) return
  const id = randomUUID()
  em.create(MailSchema, { id, event: message.event, template: message.template, recipient: message.to, props: { ...message.props }, createdAt: context.clock() })
  await em.flush()
  await sendJob(em, 'mail', { mailId: id })
}
