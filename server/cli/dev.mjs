// npm run dev: the server in development mode with a database, worker and mail catcher of its own.
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { clusterFolder, databaseUrl, ensureCluster, ensureRoles, ensureServerPrograms, freePort, startCluster, stopCluster } from './cluster.mjs'
import { ensureNodeModules } from './packages.mjs'
import { loadSecrets } from './secrets.mjs'
import { environmentOf } from './services.mjs'
import { root, run, say, start, stop } from './shell.mjs'

const port = Number(process.env.PORT ?? 3000)

async function main() {
  ensureNodeModules()
  ensureServerPrograms()
  const secrets = loadSecrets()
  const folder = clusterFolder('postgres-dev')
  ensureCluster(folder, secrets)
  stopCluster(folder)
  const pgPort = await freePort()
  startCluster(folder, pgPort)
  ensureRoles({ port: pgPort, ...secrets })
  const dataDir = join(root, '.data/dev')
  const caughtMailDir = join(dataDir, 'mail')
  mkdirSync(caughtMailDir, { recursive: true })
  const mailPort = await freePort()
  const url = (role, password) => databaseUrl({ role, password, port: pgPort })
  const env = {
    ...environmentOf({ databaseUrl: url('torquill_app', secrets.appPassword), baseUrl: `http://127.0.0.1:${port}`, authSecret: secrets.authSecret, dataDir, smtpUrl: `smtp://127.0.0.1:${mailPort}`, demonstration: true, organisation: 'Quellmark Airframe Works', caughtMailDir }),
    NODE_ENV: 'development', DATABASE_OWNER_URL: url('torquill_owner', secrets.ownerPassword), NUXT_TELEMETRY_DISABLED: '1',
  }
  const tsx = (...args) => ['--import', 'tsx', ...args]
  say(run(process.execPath, tsx('server/cli/command.ts', 'migrate'), { env }).trim())
  say(run(process.execPath, tsx('server/cli/command.ts', 'seed'), { env }).trim())
  const children = [
    start('npx', ['nuxi', 'dev', '--host', '127.0.0.1', '--port', String(port)], { env }, say),
    start(process.execPath, tsx('--watch', 'server/worker.ts'), { env }, line => say(`worker: ${line}`)),
    start(process.execPath, tsx('server/cli/mail-catcher.ts', String(mailPort), caughtMailDir), { env }, line => say(`mail: ${line}`)),
  ]
  for (const signal of ['SIGINT', 'SIGTERM']) {
    process.on(signal, async () => {
      for (const child of children) await stop(child)
      stopCluster(folder)
      process.exit(0)
    })
  }
}

main().catch((error) => {
  say(error instanceof Error ? error.message : String(error))
  process.exit(1)
})
