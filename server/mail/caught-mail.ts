import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { DomainError } from '#server/utils/domain-error'
import { environment } from '#server/utils/environment'

export interface CaughtMail { id: string, at: string, from: string, to: string, subject: string, text: string, html: string }

/** The catcher's folder: there in the demonstration only, so that production has no reader of other people's mail. */
function folder(): string {
  const { demonstration, caughtMailDir } = environment()
  if (!demonstration || !caughtMailDir) throw new DomainError('not-found', 'There is no such page here.')
  return caughtMailDir
}

/** Caught mail, newest first. */
export async function listCaughtMail() {
  const base = folder()
  const names = (await readdir(base).catch(() => [])).filter(name => name.endsWith('.json'))
  const mails = await Promise.all(names.map(async name => JSON.parse(await readFile(join(base, name), 'utf8')) as CaughtMail))
  return mails.sort((a, b) => b.at.localeCompare(a.at)).slice(0, 500).map(({ id, at, to, subject }) => ({ id, at, to, subject }))
}

export async function readCaughtMail(id: string): Promise<CaughtMail> {
  const text = await readFile(join(folder(), `${id}.json`), 'utf8').catch(() => null)
  if (!text) throw new DomainError('not-found', 'There is no such message.')
  return JSON.parse(text) as CaughtMail
}
