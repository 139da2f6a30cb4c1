// One build per hash of the sources, shared by start and test, never written over one that may be running.
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { ensurePrepared } from './packages.mjs'
import { root, run, say } from './shell.mjs'

const sources = ['app', 'server', 'shared', 'emails', 'public', 'tests/reference', 'nuxt.config.ts', 'tailwind.config.ts', 'mikro-orm.config.ts', 'package.json', 'package-lock.json']

function* filesOf(path) {
  if (!existsSync(path)) return
  if (statSync(path).isFile()) {
    yield path
    return
  }
  for (const name of readdirSync(path).sort()) yield* filesOf(join(path, name))
}

export function sourceHash(of = sources) {
  const hash = createHash('sha256')
  for (const source of of) {
    for (const file of filesOf(join(root, source))) hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0')
  }
  return hash.digest('hex').slice(0, 16)
}

const lives = (pid) => {
  try {
    return process.kill(pid, 0)
  } catch {
    return false
  }
}

/** Whether a server runs from this build: each leaves its process number in it. */
const runs = build => readdirSync(build).some(name => name.startsWith('running-') && lives(Number(name.slice(8))))

/** Keeps the newest few builds, and every one that runs. */
function forgetOld(folder, keep) {
  const builds = readdirSync(folder).filter(name => /^[0-9a-f]{16}$/.test(name) && !runs(join(folder, name))).map(name => ({ name, at: statSync(join(folder, name)).mtimeMs })).sort((a, b) => b.at - a.at)
  for (const { name } of builds.slice(keep)) rmSync(join(folder, name), { recursive: true, force: true })
}

/** One file that Node.js runs, from `server/ENTRY.ts`. */
function bundle(entry, folder) {
  const target = join(folder, `${entry.split('/').pop()}.mjs`)
  run('npx', ['esbuild', `server/${entry}.ts`, '--bundle', '--platform=node', '--format=esm', '--target=node20', '--packages=external', '--log-level=warning',
    '--alias:#shared=./shared', '--alias:#server=./server', '--alias:#emails=./emails', '--alias:#reference=./tests/reference', `--outfile=${target}`])
  return target
}

/** The bundle of `server/cli/NAME.ts`, a command that needs the engine and nothing of the pages or the database. */
export function ensureEngineCommand(name) {
  const folder = join(root, '.build/engine')
  const target = join(folder, `${name}-${sourceHash(['server', 'shared', 'tests/reference', 'package-lock.json'])}.mjs`)
  if (existsSync(target)) return target
  const part = join(folder, `part-${process.pid}`)
  try {
    renameSync(bundle(`cli/${name}`, part), target)
  } finally {
    rmSync(part, { recursive: true, force: true })
  }
  for (const old of readdirSync(folder).filter(file => file.startsWith(`${name}-`))) if (join(folder, old) !== target) rmSync(join(folder, old), { force: true })
  return target
}

/** The folder of the build of these sources; builds if it is not there yet. */
export function ensureBuild() {
  const folder = join(root, '.build')
  const target = join(folder, sourceHash())
  if (existsSync(join(target, 'complete'))) return target
  ensurePrepared()
  say('Building (a minute or two)')
  const part = join(folder, `part-${process.pid}`)
  const work = join(folder, `work-${process.pid}`)
  mkdirSync(folder, { recursive: true })
  rmSync(target, { recursive: true, force: true })
  try {
    run('npx', ['nuxi', 'build'], { env: { ...process.env, NODE_ENV: 'production', NUXT_TELEMETRY_DISABLED: '1', TORQUILL_OUTPUT_DIR: part, TORQUILL_WORK_DIR: work, NODE_OPTIONS: '--max-old-space-size=4096' } })
    // The worker, the threads and the terminal's commands are bundles of their own; packages stay where npm put them.
    for (const entry of ['worker', 'cli/command', 'cli/mail-catcher', 'validation/validation-thread', 'outline/outline-thread', 'jobs/release-thread']) bundle(entry, part)
    writeFileSync(join(part, 'complete'), '')
    renameSync(part, target)
  } finally {
    rmSync(part, { recursive: true, force: true })
    rmSync(work, { recursive: true, force: true })
  }
  forgetOld(folder, 3)
  return target
}
