import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import type { Golden } from './golden'

const fileOf = (revision: string): string => fileURLToPath(new URL(`./golden/${revision}.json`, import.meta.url))

/** What was written at a revision, or null where nothing was yet. */
export const readGolden = (revision: string): Golden | null => existsSync(fileOf(revision)) ? JSON.parse(readFileSync(fileOf(revision), 'utf8')) as Golden : null

/** One number a line, so that a difference shows in review. */
export const writeGolden = (revision: string, golden: Golden): void => writeFileSync(fileOf(revision), `${JSON.stringify(golden, null, 1)}\n`)
