// npm run db:backup -- FOLDER: the database and the files of one moment, in one folder.
import { cpSync, existsSync, mkdirSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { databaseUrl, serverPrograms } from './cluster.mjs'
import { loadSecrets } from './secrets.mjs'
import { root, run, say } from './shell.mjs'

const folder = resolve(process.argv[2] ?? join(root, '.data/backup', new Date().toISOString().replace(/[:.]/g, '-')))
const secrets = loadSecrets()
const url = process.env.DATABASE_OWNER_URL ?? databaseUrl({ role: 'torquill_owner', password: secrets.ownerPassword, port: secrets.postgresPort })
const dataDir = process.env.TORQUILL_DATA_DIR ?? join(root, '.data')
mkdirSync(folder, { recursive: true })
run(`${serverPrograms()}/pg_dump`, ['-Fc', '-f', join(folder, 'database.dump'), url])
// Files are never changed once written, so copying them after the dump misses none that the dump names.
for (const part of ['files', 'authority']) {
  if (existsSync(join(dataDir, part))) cpSync(join(dataDir, part), join(folder, part), { recursive: true })
}
say(`Backup in ${folder}`)
