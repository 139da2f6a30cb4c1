// A throw-away database for tests and for work on the server: made, migrated, and removed at the end.
import { mkdirSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { clusterFolder, databaseUrl, ensureCluster, ensureRoles, ensureServerPrograms, freePort, removeCluster, startCluster } from './cluster.mjs'
import { root } from './shell.mjs'

const secrets = { adminPassword: 'throw-away-admin', ownerPassword: 'throw-away-owner', appPassword: 'throw-away-app' }

export async function startThrowAway(name = `test-${process.pid}`) {
  ensureServerPrograms()
  mkdirSync(join(root, '.data'), { recursive: true })
  const folder = clusterFolder(name)
  rmSync(folder, { recursive: true, force: true })
  ensureCluster(folder, { ...secrets, throwAway: true })
  const port = await freePort()
  startCluster(folder, port, { throwAway: true })
  ensureRoles({ port, ...secrets })
  return {
    application: databaseUrl({ role: 'torquill_app', password: secrets.appPassword, port }),
    owner: databaseUrl({ role: 'torquill_owner', password: secrets.ownerPassword, port }),
    stop: () => removeCluster(folder),
  }
}
