import { resolve } from 'node:path'
import { z } from 'zod'

const url = z.string().min(1)

/** What the server and the worker need from their environment, checked once at start. */
const schema = z.object({
  DATABASE_URL: url,
  TORQUILL_BASE_URL: z.url().default('http://127.0.0.1:3000'),
  NUXT_AUTH_SECRET: z.string().min(16, 'NUXT_AUTH_SECRET needs at least 16 characters.'),
  TORQUILL_DATA_DIR: z.string().default('.data'),
  /** `s3://key:secret@host/bucket?region=…` stores files by the S3 protocol instead of in the data folder. */
  TORQUILL_FILES_URL: z.string().optional(),
  SMTP_URL: url.default('smtp://127.0.0.1:2525'),
  MAIL_FROM: z.string().default('Torquill <torquill@localhost>'),
  /** Name of the organisation, at the head of covers. */
  TORQUILL_ORGANISATION: z.string().max(80).optional(),
  TORQUILL_DEMONSTRATION: z.enum(['0', '1']).default('0'),
  TORQUILL_CAUGHT_MAIL_DIR: z.string().optional(),
})

export interface Environment {
  databaseUrl: string
  baseUrl: string
  authSecret: string
  dataDir: string
  filesUrl: string | null
  smtpUrl: string
  mailFrom: string
  organisation: string | null
  demonstration: boolean
  caughtMailDir: string | null
}

let known: Environment | undefined

/** @throws with one line per missing or unfit variable. */
export function environment(): Environment {
  if (known) return known
  const read = schema.safeParse(process.env)
  if (!read.success) {
    throw new Error(`The environment is not complete:\n${read.error.issues.map(i => `  ${i.path.join('.')}: ${i.message}`).join('\n')}`)
  }
  const e = read.data
  known = {
    databaseUrl: e.DATABASE_URL,
    baseUrl: e.TORQUILL_BASE_URL.replace(/\/$/, ''),
    authSecret: e.NUXT_AUTH_SECRET,
    dataDir: resolve(e.TORQUILL_DATA_DIR),
    filesUrl: e.TORQUILL_FILES_URL ?? null,
    smtpUrl: e.SMTP_URL,
    mailFrom: e.MAIL_FROM,
    organisation: e.TORQUILL_ORGANISATION ?? null,
    demonstration: e.TORQUILL_DEMONSTRATION === '1',
    caughtMailDir: e.TORQUILL_CAUGHT_MAIL_DIR ?? null,
  }
  return known
}
