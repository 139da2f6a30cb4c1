// Debian packages and npm packages that are missing.
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { root, run, say, succeeds } from './shell.mjs'

const isRoot = process.getuid?.() === 0

/** Installs the Debian packages whose `probe` program or file is missing. */
export function ensureDebian(packages) {
  const missing = Object.entries(packages).filter(([, probe]) => !probe()).map(([name]) => name)
  if (!missing.length) return
  const how = `apt-get install -y --no-install-recommends ${missing.join(' ')}`
  if (!isRoot && !succeeds('sudo', ['-n', 'true'])) {
    throw new Error(`These Debian packages are missing: ${missing.join(', ')}. Install them as a user who may, then start again:\n  sudo ${how}`)
  }
  say(`Installing from Debian: ${missing.join(', ')}`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const apt = args => isRoot ? run('apt-get', args, { env }) : run('sudo', ['-n', '-E', 'apt-get', ...args], { env })
  try {
    apt(['install', '-y', '--no-install-recommends', ...missing])
  } catch {
    // A fresh machine has no package lists yet.
    apt(['update'])
    apt(['install', '-y', '--no-install-recommends', ...missing])
  }
}

/** Whether a program stands on the path. */
export const onPath = name => () => succeeds('sh', ['-c', `command -v ${name}`])

/** `npm ci` when the lock file is not the one that node_modules was made from. */
export function ensureNodeModules() {
  const lock = createHash('sha256').update(readFileSync(`${root}/package-lock.json`)).digest('hex')
  const stamp = `${root}/node_modules/.torquill-lock`
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return
  say('Installing the npm packages (a few minutes the first time)')
  run('npm', ['ci', '--no-fund', '--no-audit'], { env: { ...process.env, NUXT_TELEMETRY_DISABLED: '1' } })
  mkdirSync(`${root}/node_modules`, { recursive: true })
  writeFileSync(stamp, lock)
}

/** The types that lint, type check and tests read. */
export function ensurePrepared() {
  if (!existsSync(`${root}/.nuxt/tsconfig.app.json`)) run('npx', ['nuxi', 'prepare'], { env: { ...process.env, NUXT_TELEMETRY_DISABLED: '1' } })
}
