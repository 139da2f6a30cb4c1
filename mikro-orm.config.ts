import { ormOptions } from './server/database/orm'

/** For the command line: migrations run as the owner. */
export default ormOptions(process.env.DATABASE_OWNER_URL ?? '')
