import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { MailSchema } from '#server/database/entities/mail'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { connect } from '#server/database/orm'
import { startMailCatcher, type MailCatcher } from '#server/mail/catcher'
import { deliverMail, openMailer, type Mailer } from '#server/mail/send'
import { useServerEnvironment } from './environment'

const FROM = 'Torquill <torquill@example.org>'
const clock = () => new Date()
let orm: MikroORM
let catcher: MailCatcher
let mailer: Mailer

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  orm = await connect(databaseUrl)
  catcher = await startMailCatcher({ port: 0, clock })
  mailer = openMailer({ smtpUrl: catcher.url, from: FROM })
})
afterAll(async () => {
  mailer.close()
  await catcher.close()
  await orm.close()
})

async function somebody(disabledAt: Date | null = null): Promise<Person> {
  const em = orm.em.fork()
  const person = em.create(PersonSchema, { id: randomUUID(), email: `mail-${randomUUID()}@example.org`, name: 'Mona Mailed', passwordHash: null, disabledAt, auditor: false, administrator: false, sessionEpoch: 0, createdAt: clock() })
  await em.flush()
  return person
}

/** A row without its job, so that only this test sends it. */
async function rowFor(recipient: Person, template = 'invited'): Promise<string> {
  const em = orm.em.fork()
  const id = randomUUID()
  em.create(MailSchema, { id, event: `test:${id}`, template, recipient: em.getReference(PersonSchema, recipient.id), props: { name: recipient.name, url: 'https://example.org/password/secret', hours: 72 }, createdAt: clock() })
  await em.flush()
  return id
}

const caughtFor = (person: Person) => catcher.caught().filter(mail => mail.to === person.email)
const rowOf = (id: string) => orm.em.fork().findOneOrFail(MailSchema, { id })

describe('a message of the queue', () => {
  it('is sent once, also when ten workers take it at the same time', async () => {
    const person = await somebody()
    const id = await rowFor(person)
    const outcomes = await Promise.all(Array.from({ length: 10 }, () => deliverMail(orm.em, mailer, id, clock)))
    expect(outcomes.filter(outcome => outcome === 'sent')).toHaveLength(1)
    expect(outcomes.filter(outcome => outcome === 'already sent')).toHaveLength(9)
    expect(caughtFor(person)).toMatchObject([{ messageId: `<${id}@example.org>`, subject: 'Torquill: you were added, set your password' }])
  })

  it('keeps no one-time link once it is sent', async () => {
    const id = await rowFor(await somebody())
    await deliverMail(orm.em, mailer, id, clock)
    expect((await rowOf(id)).props).toEqual({})
  })

  it('stays unsent while no mail server answers, and goes later', async () => {
    const person = await somebody()
    const id = await rowFor(person)
    const nowhere = openMailer({ smtpUrl: 'smtp://127.0.0.1:1', from: FROM })
    await expect(deliverMail(orm.em, nowhere, id, clock)).rejects.toThrow('ECONNREFUSED')
    nowhere.close()
    expect((await rowOf(id)).sentAt ?? null).toBeNull()
    expect(await deliverMail(orm.em, mailer, id, clock)).toBe('sent')
    expect(caughtFor(person)).toHaveLength(1)
  })

  it('does not go to somebody whose access has ended', async () => {
    const person = await somebody(clock())
    expect(await deliverMail(orm.em, mailer, await rowFor(person), clock)).toBe('not sent: recipient disabled')
    expect(caughtFor(person)).toEqual([])
  })

  it('is refused when nobody knows its template, and a row that is gone is not missed', async () => {
    await expect(deliverMail(orm.em, mailer, await rowFor(await somebody(), 'postcard'), clock)).rejects.toThrow('postcard')
    expect(await deliverMail(orm.em, mailer, randomUUID(), clock)).toBe('unknown')
  })
})
