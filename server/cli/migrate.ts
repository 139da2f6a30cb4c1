import PgBoss from 'pg-boss'
import { grantStatements } from '#server/database/grants'
import { connect } from '#server/database/orm'
import { queueNames, queueOptions } from '#server/jobs/queue-names'

/** Brings the database to the newest schema, makes the queues and gives the application's role its rights. */
export async function migrate(ownerUrl: string, applicationUrl: string) {
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
    await orm.em.getConnection().execute(grantStatements(new URL(applicationUrl).username))
    return done.map(({ name }) => name)
  } finally {
    await orm.close()
  }
}
