import { LockMode } from '@mikro-orm/core'
import type { SqlEntityManager } from '@mikro-orm/postgresql'
import { createTransport } from 'nodemailer'
import { isMailTemplate, renderMail, type MailProps, type MailTemplate } from '#emails/registry'
import type { MailContent } from '#emails/layout'
import { MailSchema } from '#server/database/entities/mail'
import { PersonSchema } from '#server/database/entities/person'
import { environment } from '#server/utils/environment'

/** One message on its way: `id` is the mail row's, so that a message sent twice is known as one by its Message-ID. */
export interface Letter { id: string, to: { name: string, address: string }, content: MailContent }

export interface Mailer {
  /** Hands the message to the mail server; rejects when it is not taken. */
  send: (letter: Letter) => Promise<void>
  close: () => void
}

/** The domain under which Message-IDs are made: that of the sender's address. */
function domainOf(from: string): string {
  return /@([\w.-]+)>?\s*$/.exec(from)?.[1] ?? 'localhost'
}

/** A pooled connection to the mail server at `smtpUrl` (`smtp://` or `smtps://`), sending as `from`. */
export function openMailer({ smtpUrl, from }: { smtpUrl: string, from: string }): Mailer {
  const transport = createTransport({
    url: smtpUrl, pool: true, maxConnections: 2, connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000,
    disableFileAccess: true, disableUrlAccess: true,
  })
  return {
    async send({ id, to, content }) {
      await transport.sendMail({
        from, to, messageId: `<${id}@${domainOf(from)}>`, subject: content.subject, text: content.text, html: content.html,
        headers: { 'Auto-Submitted': 'auto-generated' },
      })
    },
    close: () => transport.close(),
  }
}

function contentOf(template: string, props: Record<string, unknown>): MailContent {
  if (!isMailTemplate(template)) throw new Error(`No message is called ${template}`)
  // The row was written by queueMail, whose types tie the props to the template.
  return renderMail(template, { ...props, demonstration: environment().demonstration } as unknown as MailProps<MailTemplate>)
}

const CARRIES_LINK = new Set<string>(['invited', 'forgotten-password'] satisfies MailTemplate[])

export type Delivery = 'sent' | 'already sent' | 'not sent: recipient disabled' | 'unknown'

/**
 * Sends the message of one mail row, once. The row is locked while the mail
 * server takes the message, so that two workers never send it both; `sentAt`
 * is written by the same transaction. Rejects when the mail server does not
 * take it: the job is then tried again later.
 */
export async function deliverMail(em: SqlEntityManager, mailer: Mailer, mailId: string, clock: () => Date): Promise<Delivery> {
  return em.fork().transactional(async (tx) => {
    const mail = await tx.findOne(MailSchema, { id: mailId }, { lockMode: LockMode.PESSIMISTIC_WRITE })
    if (mail === null) return 'unknown'
    if (mail.sentAt) return 'already sent'
    const person = await tx.findOneOrFail(PersonSchema, { id: mail.recipient.id })
    if (person.disabledAt) return 'not sent: recipient disabled'
    await mailer.send({ id: mail.id, to: { name: person.name, address: person.email }, content: contentOf(mail.template, mail.props) })
    mail.sentAt = clock()
    // A one-time link is a key: once it is on its way, the row keeps nothing that opens.
    if (CARRIES_LINK.has(mail.template)) mail.props = {}
    return 'sent'
  })
}
