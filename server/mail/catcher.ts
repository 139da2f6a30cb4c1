import { mkdir, rename, writeFile } from 'node:fs/promises'
import type { AddressInfo } from 'node:net'
import { join } from 'node:path'
import { init, type EmailInfo, type MailServer } from 'smtp-tester'

/** A message as the catcher keeps it, one JSON file each. */
export interface CaughtMail { id: string, at: string, messageId: string, from: string, to: string, subject: string, text: string, html: string }

export interface CatcherOptions { port: number, folder?: string, clock: () => Date, onCaught?: (mail: CaughtMail) => void }

export interface MailCatcher {
  /** `smtp://127.0.0.1:<port>` */
  url: string
  port: number
  /** Everything caught since the start, oldest first. */
  caught: () => CaughtMail[]
  close: () => Promise<void>
}

// The library types its argument as a port and hands it to net.Server.listen, which also takes an address.
// Without one it would listen on every interface; caught mail carries one-time links, so only loopback will do.
const listenAt = init as unknown as (at: { host: string, port: number }) => MailServer

const header = (email: EmailInfo, name: string): string => typeof email.headers[name as 'string'] === 'string' ? String(email.headers[name as 'string']) : ''

function readMail(email: EmailInfo, id: string, at: Date): CaughtMail {
  return {
    id, at: at.toISOString(), messageId: header(email, 'message-id'), from: header(email, 'from') || email.sender,
    to: Object.keys(email.receivers).join(', '), subject: header(email, 'subject'), text: email.body ?? '', html: email.html || '',
  }
}

/** Written beside and renamed, so that a reader never meets half a file. */
async function keep(folder: string, mail: CaughtMail): Promise<void> {
  const path = join(folder, `${mail.id}.json`)
  await writeFile(`${path}.part`, JSON.stringify(mail, null, 2), { mode: 0o600 })
  await rename(`${path}.part`, path)
}

/**
 * Stands in for a mail server on loopback: takes every message and keeps it in
 * `folder` (nowhere when none is given). Port 0 chooses a free one. Rejects when
 * the port is taken.
 */
export async function startMailCatcher({ port, folder, clock, onCaught }: CatcherOptions): Promise<MailCatcher> {
  if (folder !== undefined) await mkdir(folder, { recursive: true, mode: 0o700 })
  const caught: CaughtMail[] = []
  const server = listenAt({ host: '127.0.0.1', port })
  const { smtpServer } = server
  // Pooled connections of the sender stay open: a stop need not wait for them longer than this.
  smtpServer.options.closeTimeout = 500
  await new Promise<void>((resolve, reject) => {
    smtpServer.server.once('listening', resolve)
    smtpServer.once('error', reject)
  })
  const writing = new Set<Promise<void>>()
  server.bind((_recipient, _id, email) => {
    const at = clock()
    const mail = readMail(email, `${at.getTime()}-${String(caught.length + 1).padStart(5, '0')}`, at)
    caught.push(mail)
    onCaught?.(mail)
    if (folder === undefined) return
    const written = keep(folder, mail).finally(() => writing.delete(written))
    writing.add(written)
  })
  const bound = (smtpServer.server.address() as AddressInfo).port
  return {
    url: `smtp://127.0.0.1:${bound}`,
    port: bound,
    caught: () => [...caught],
    async close() {
      await new Promise<void>(resolve => server.stop(resolve))
      await Promise.all(writing)
    },
  }
}
