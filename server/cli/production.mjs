// npm run start:production: server and worker with the given database, mail server and secrets. Seeds nothing.
import { ensureBuild } from './build.mjs'
import { ensureNodeModules } from './packages.mjs'
import { commandOf, environmentOf, startServices } from './services.mjs'
import { run, say } from './shell.mjs'

const required = ['DATABASE_URL', 'DATABASE_OWNER_URL', 'NUXT_AUTH_SECRET', 'TORQUILL_BASE_URL', 'SMTP_URL', 'TORQUILL_DATA_DIR']
const absent = required.filter(name => !process.env[name])

async function main() {
  if (absent.length) throw new Error(`Set these first: ${absent.join(', ')}. docker-free-dev.md says what each is.`)
  ensureNodeModules()
  const build = ensureBuild()
  const env = environmentOf({
    databaseUrl: process.env.DATABASE_URL, baseUrl: process.env.TORQUILL_BASE_URL, authSecret: process.env.NUXT_AUTH_SECRET,
    dataDir: process.env.TORQUILL_DATA_DIR, smtpUrl: process.env.SMTP_URL, filesUrl: process.env.TORQUILL_FILES_URL,
  })
  // Before anything is changed: a role that owns a table would make giving rights fail half-way.
  run(process.execPath, commandOf(build, 'check-role'), { env })
  say(run(process.execPath, commandOf(build, 'migrate'), { env: { ...env, DATABASE_OWNER_URL: process.env.DATABASE_OWNER_URL } }).trim())
  delete env.DATABASE_OWNER_URL
  const port = Number(process.env.PORT ?? 3000)
  const services = await startServices(build, env, { port, onLine: say, onEnd: code => process.exit(code ?? 1) })
  for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => services.stop().then(() => process.exit(0)))
  say(`Torquill answers on 127.0.0.1:${port} as ${process.env.TORQUILL_BASE_URL}`)
}

main().catch((error) => {
  say(error instanceof Error ? error.message : String(error))
  process.exit(1)
})
