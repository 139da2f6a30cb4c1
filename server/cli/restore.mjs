// npm run db:restore -- FOLDER: puts a backup into an empty database and data folder.
import { cpSync, existsSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { databaseUrl, serverPrograms } from './cluster.mjs'
import { loadSecrets } from './secrets.mjs'
import { root, run, say } from './shell.mjs'

const folder = process.argv[2] && resolve(process.argv[2])
const secrets = loadSecrets()
const url = process.env.DATABASE_OWNER_URL ?? databaseUrl({ role: 'torquill_owner', password: secrets.ownerPassword, port: secrets.postgresPort })
const dataDir = process.env.TORQUILL_DATA_DIR ?? join(root, '.data')
try {
  if (!folder || !existsSync(join(folder, 'database.dump'))) throw new Error('Usage: npm run db:restore -- FOLDER (one that npm run db:backup made)')
  const rows = run(`${serverPrograms()}/psql`, [url, '-Atc', 'select count(*) from pg_tables where schemaname = \'public\' and tablename = \'issue\'']).trim()
  if (rows !== '0') throw new Error('This database is not empty. Restore into a new one, so that nothing is overwritten.')
  run(`${serverPrograms()}/pg_restore`, ['--no-owner', '--exit-on-error', '-d', url, join(folder, 'database.dump')])
  for (const part of ['files', 'authority']) {
    if (existsSync(join(folder, part))) cpSync(join(folder, part), join(dataDir, part), { recursive: true })
  }
  say('Restored. Run npm run db:migrate next: it gives the application\'s role its rights again.')
} catch (error) {
  say(error instanceof Error ? error.message : String(error))
  process.exit(1)
}
