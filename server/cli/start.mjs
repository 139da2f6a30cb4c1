// npm start: the whole demonstration on loopback, from nothing, in one command.
import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { ensureBuild } from './build.mjs'
import { clusterFolder, databaseUrl, dropDatabase, ensureCluster, ensureRoles, ensureServerPrograms, freePort, isRunning, startCluster, stopCluster } from './cluster.mjs'
import { ensureNodeModules } from './packages.mjs'
import { loadSecrets, remember } from './secrets.mjs'
import { commandOf, environmentOf, startCatcher, startServices } from './services.mjs'
import { root, run, say } from './shell.mjs'

const port = Number(process.env.PORT ?? 3000)
const baseUrl = `http://127.0.0.1:${port}`
const stops = []
let ending = false

async function end(code) {
  if (ending) return
  ending = true
  for (const step of stops.reverse()) await step()
  process.exit(code)
}
process.on('SIGINT', () => end(0))
process.on('SIGTERM', () => end(0))

/** The database: the one that both URLs name, or a cluster of our own. */
async function database() {
  const { DATABASE_URL: application, DATABASE_OWNER_URL: owner } = process.env
  if (application && owner) return { application, owner }
  if (application || owner) throw new Error('Set both DATABASE_URL and DATABASE_OWNER_URL, or neither.')
  ensureServerPrograms()
  const secrets = loadSecrets()
  const folder = clusterFolder('postgres')
  ensureCluster(folder, secrets)
  const wasRunning = isRunning(folder)
  const pgPort = wasRunning && secrets.postgresPort ? secrets.postgresPort : await freePort()
  if (!wasRunning) remember('postgresPort', pgPort)
  startCluster(folder, pgPort)
  stops.push(() => stopCluster(folder))
  // A first start that was broken off leaves half a demonstration: it is made anew, whole.
  if (!secrets.demonstrationMade) dropDatabase({ port: pgPort, ...secrets })
  ensureRoles({ port: pgPort, ...secrets })
  return {
    application: databaseUrl({ role: 'torquill_app', password: secrets.appPassword, port: pgPort }),
    owner: databaseUrl({ role: 'torquill_owner', password: secrets.ownerPassword, port: pgPort }),
  }
}

async function main() {
  const began = Date.now()
  ensureNodeModules()
  const { application, owner } = await database()
  const build = ensureBuild()
  const dataDir = join(root, '.data')
  const caughtMailDir = join(dataDir, 'mail')
  mkdirSync(caughtMailDir, { recursive: true })
  const mailPort = await freePort()
  const env = {
    ...environmentOf({ databaseUrl: application, baseUrl, authSecret: loadSecrets().authSecret, dataDir, smtpUrl: `smtp://127.0.0.1:${mailPort}`, demonstration: true, organisation: 'Quellmark Airframe Works', caughtMailDir }),
    DATABASE_OWNER_URL: owner,
  }
  if (!loadSecrets().demonstrationMade) say('Making the demonstration (about a minute, once)')
  const say1 = text => text.trim() && say(text.trim())
  for (const step of ['migrate', 'seed']) say1(run(process.execPath, commandOf(build, step), { env }))
  remember('demonstrationMade', true)
  const catcher = await startCatcher(build, { port: mailPort, folder: caughtMailDir })
  stops.push(catcher.stop)
  delete env.DATABASE_OWNER_URL
  const services = await startServices(build, env, { port, onLine: line => process.env.TORQUILL_VERBOSE && say(line), onEnd: () => {
    say('A part of Torquill ended by itself; stopping the rest. Start with TORQUILL_VERBOSE=1 to read why.')
    end(1)
  } })
  stops.push(services.stop)
  const pidFile = join(dataDir, 'start.pid')
  writeFileSync(pidFile, String(process.pid))
  stops.push(() => rmSync(pidFile, { force: true }))
  say(`\nTorquill is at ${baseUrl}   (ready after ${Math.round((Date.now() - began) / 1000)} s; Ctrl-C stops it)\n`)
  say(run(process.execPath, commandOf(build, 'sign-ins'), { env }).trim())
}

main().catch((error) => {
  say(error instanceof Error ? error.message : String(error))
  end(1)
})
