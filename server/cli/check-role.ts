import { connect } from '#server/database/orm'

/** @throws when the role of this URL owns a table or is a superuser: the application must own nothing. */
export async function checkProductionRole(databaseUrl: string): Promise<void> {
  const orm = await connect(databaseUrl)
  try {
    const [row] = await orm.em.fork().execute<{ owned: string, super: boolean }[]>(`
      select (select count(*) from pg_tables where tableowner = current_user) as owned,
        (select rolsuper from pg_roles where rolname = current_user) as super`)
    if (!row || row.super || Number(row.owned) > 0) {
      throw new Error('The role of DATABASE_URL owns tables or is a superuser. Give the application a role that owns nothing (see docker-free-dev.md).')
    }
  } finally {
    await orm.close()
  }
}
