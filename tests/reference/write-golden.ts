/** npm run golden: writes the results of a new method revision, or adds numbers that are new. It never changes one that stands. */
import { METHOD_REVISION } from '#shared/calc/method'
import { goldenNow, movesBetween } from './golden'
import { readGolden, writeGolden } from './golden-files'
import { methodRevisions } from './revisions'

const most = 20
const listed = (lines: readonly string[]): string => [...lines.slice(0, most), ...(lines.length > most ? [`… and ${lines.length - most} more`] : [])].map(line => `  ${line}`).join('\n')

async function main(): Promise<string> {
  if (!methodRevisions.some(({ revision }) => revision === METHOD_REVISION)) throw new Error(`Say in tests/reference/revisions.ts why the methods have a revision ${METHOD_REVISION}.`)
  const now = await goldenNow()
  const before = readGolden(METHOD_REVISION)
  if (!before) {
    writeGolden(METHOD_REVISION, now)
    return `Revision ${METHOD_REVISION}: ${Object.keys(now).length} numbers written.`
  }
  const { moved, gone, added } = movesBetween(before, now)
  if (moved.length > 0 || gone.length > 0) {
    throw new Error([
      `Revision ${METHOD_REVISION} stands as it was written: ${moved.length} numbers moved and ${gone.length} are gone. Make a new revision and say why, or mend the engine.`,
      listed([...moved.map(({ name, was, is }) => `${name}: was ${was}, is ${is}`), ...gone.map(name => `${name}: gone`)]),
    ].join('\n'))
  }
  writeGolden(METHOD_REVISION, { ...before, ...Object.fromEntries(added.map(name => [name, now[name] as number])) })
  return `Revision ${METHOD_REVISION}: ${added.length} numbers added, ${Object.keys(before).length} stand.`
}

try {
  process.stdout.write(`${await main()}\n`)
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
  process.exitCode = 1
}
