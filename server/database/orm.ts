import { MikroORM, type Options } from '@mikro-orm/postgresql'
import { Migrator } from '@mikro-orm/migrations'
import { entities } from './entities'
import { migrations } from './migrations'
import { quickenLiterals } from './quick-literals'

/** ORM options for a role. Nothing is discovered from files: the server and the worker are bundles. */
export function ormOptions(clientUrl: string): Options {
  return {
    clientUrl,
    entities,
    extensions: [Migrator],
    allowGlobalContext: false,
    discovery: { disableDynamicFileAccess: true },
    metadataCache: { enabled: false },
    forceUtcTimezone: true,
    migrations: { migrationsList: migrations, tableName: 'migration', transactional: true, allOrNothing: true, snapshot: false },
    pool: { min: 0, max: 10 },
    driverOptions: { connection: { application_name: 'torquill', statement_timeout: 30_000 } },
  }
}

export const connect = async (clientUrl: string) => quickenLiterals(await MikroORM.init(ormOptions(clientUrl)))
