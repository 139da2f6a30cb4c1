import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { renderMail } from '#emails/registry'
import { startMailCatcher, type CaughtMail, type MailCatcher } from '#server/mail/catcher'
import { openMailer, type Mailer } from '#server/mail/send'
import { SAMPLES } from '../emails/mail-samples'

const FROM = 'Torquill <torquill@quellmark.example>'
const TO = { name: 'Noémie Castagnoux', address: 'noemie.castagnoux@quellmark.example' }

let folder: string
let catcher: MailCatcher
let mailer: Mailer

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'torquill-mail-'))
  catcher = await startMailCatcher({ port: 0, folder, clock: () => new Date('2026-10-12T09:00:00Z') })
  mailer = openMailer({ smtpUrl: catcher.url, from: FROM })
})

afterEach(async () => {
  mailer.close()
  await catcher.close()
  await rm(folder, { recursive: true })
})

describe('mail over SMTP into the catcher', () => {
  it('arrives with both parts, the name of the sender and an identity made from the row', async () => {
    const content = renderMail('returned', SAMPLES.returned)
    await mailer.send({ id: 'b6f3f1a2-0000-4000-8000-000000000001', to: TO, content })
    const [mail] = catcher.caught()
    expect(mail).toMatchObject({
      at: '2026-10-12T09:00:00.000Z', to: TO.address, subject: 'QSN-19-0031 B: returned by Koji Hatamori',
      messageId: '<b6f3f1a2-0000-4000-8000-000000000001@quellmark.example>',
    })
    expect(mail?.from).toContain('torquill@quellmark.example')
    expect(mail?.text).toContain('Flap inner hat stiffener')
    expect(mail?.html).toContain('<html lang="en">')
  })

  it('keeps each message as one JSON file', async () => {
    const content = renderMail('withdrawn', SAMPLES.withdrawn)
    await mailer.send({ id: 'one', to: TO, content })
    await mailer.send({ id: 'two', to: TO, content })
    await catcher.close()
    const files = (await readdir(folder)).sort()
    expect(files).toHaveLength(2)
    const kept = JSON.parse(await readFile(join(folder, files[1] ?? ''), 'utf8')) as CaughtMail
    expect(kept.messageId).toBe('<two@quellmark.example>')
    expect(kept.subject).toBe('QSN-19-0031 B: withdrawn by Catalina Ferreyrón')
    catcher = await startMailCatcher({ port: 0, clock: () => new Date(0) })
  })

  it('listens on loopback only and refuses a taken port', async () => {
    expect(catcher.url).toBe(`smtp://127.0.0.1:${catcher.port}`)
    await expect(startMailCatcher({ port: catcher.port, clock: () => new Date(0) })).rejects.toThrow('EADDRINUSE')
  })
})
