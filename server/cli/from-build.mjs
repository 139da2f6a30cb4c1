// Runs one of the terminal's commands from the build of these sources.
import { spawnSync } from 'node:child_process'
import { ensureBuild } from './build.mjs'
import { ensureNodeModules } from './packages.mjs'
import { commandOf } from './services.mjs'
import { loadSecrets } from './secrets.mjs'
import { databaseUrl } from './cluster.mjs'
import { root } from './shell.mjs'

ensureNodeModules()
const build = ensureBuild()
const secrets = loadSecrets()
const own = (role, password) => secrets.postgresPort ? databaseUrl({ role, password, port: secrets.postgresPort }) : ''
const env = {
  DATABASE_URL: own('torquill_app', secrets.appPassword), DATABASE_OWNER_URL: own('torquill_owner', secrets.ownerPassword),
  NUXT_AUTH_SECRET: secrets.authSecret, ...process.env,
}
process.exit(spawnSync(process.execPath, commandOf(build, ...process.argv.slice(2)), { cwd: root, stdio: 'inherit', env }).status ?? 1)
