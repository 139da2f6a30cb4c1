import { connect } from '#server/database/orm'
import { demoClock, FIRST_DAY } from '#server/database/seeders/demo/demo-clock'
import { seedDemo } from '#server/database/seeders/demo/seed-demo'
import { closeQueue, useQueue } from '#server/jobs/queue'
import type { ReleaseTask } from '#server/jobs/release-thread'
import { ThreadPool } from '#server/outline/thread-pool'
import { loadSigner } from '#server/pdf/signing/local-authority'
import { serverClock } from '#server/utils/clock'
import { environment } from '#server/utils/environment'
import { startThread } from '#server/utils/start-thread'

/** Makes the demonstration, once, as the application's role. Releases are made on a thread, as the worker makes them. Answers what was done. */
export async function seed(databaseUrl: string): Promise<string> {
  const { demonstration, dataDir } = environment()
  if (!demonstration) throw new Error('The demonstration is seeded only where TORQUILL_DEMONSTRATION is 1.')
  useQueue(databaseUrl)
  const orm = await connect(databaseUrl)
  const releases = new ThreadPool<ReleaseTask, string>(() => startThread('jobs/release-thread', { databaseUrl }), { threads: 1, mostWaiting: 100, timeLimit: 300_000 })
  try {
    const now = serverClock()
    // The authority is as old as the story, so that no release is signed before its certificate begins.
    await loadSigner(`${dataDir}/authority`, demoClock(now).at(`${FIRST_DAY} 08:00`))
    const done = await seedDemo({
      em: orm.em.fork(), now,
      makeRelease: async (job, clock) => {
        const made = await releases.run({ job, at: clock().toISOString() })
        if (!made.ok) throw new Error(made.reason)
      },
    })
    return done ? 'The demonstration is made.' : 'There is somebody here already; the demonstration is left as it is.'
  } finally {
    await releases.close()
    await closeQueue()
    await orm.close()
  }
}
