import PgBoss from 'pg-boss'
import { grantStatements } from '#server/database/grants'
import { connect } from '#server/database/orm'
import { queueNames, queueOptions } from '#server/jobs/queue-names'

const roleOf = (url: string) => decodeURIComponent(new URL(url).username)

/** Brings the database to the newest schema, makes the queues and gives the application's role its rights. */
export async function migrate(ownerUrl: string, applicationUrl: string) {
  // Giving the application's role its rights takes all others from it; the owner would be locked out of its own tables.
  if (roleOf(ownerUrl) === roleOf(applicationUrl)) throw new Error('DATABASE_URL and DATABASE_OWNER_URL name the same role. Give the application a role of its own, one that owns nothing (see docker-free-dev.md).')
  const orm = await connect(ownerUrl)
  try {
    const done = await orm.migrator.up()
    const boss = new PgBoss({ connectionString: ownerUrl, schedule: false, supervise: false })
    await boss.start()
    for (const name of queueNames) {
      const { expireInSeconds, ...retry } = queueOptions[name]
      const options = { name, policy: 'standard' as const, expireInSeconds, ...retry }
      if (await boss.getQueue(name)) await boss.updateQueue(name, options)
      else await boss.createQueue(name, options)
    }
    await boss.stop({ graceful: false })
    await orm.em.getConnection().execute(grantStatements(roleOf(applicationUrl)))
    return done.map(({ name }) => name)
  } finally {
    await orm.close()
  }
}
