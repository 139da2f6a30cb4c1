import PgBoss from 'pg-boss'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { makeDraftPdf } from '#server/jobs/make-draft-pdf'
import { makeRelease } from '#server/jobs/make-release'
import { queueOptions, type JobData } from '#server/jobs/queue-names'
import { deliverMail, openMailer } from '#server/mail/send'
import { loadSigner } from '#server/pdf/signing/local-authority'
import { environment } from '#server/utils/environment'
import { serverClock } from '#server/utils/clock'

/**
 * The job worker: a process of its own, so that rendering never blocks a
 * request and only this process reads the signing key. It takes one job per
 * queue at a time; several workers may run beside each other.
 */
const { databaseUrl, dataDir, smtpUrl, mailFrom } = environment()
useQueue(databaseUrl)
const orm = await connect(databaseUrl)
const signer = await loadSigner(`${dataDir}/authority`, serverClock())
const mailer = openMailer({ smtpUrl, from: mailFrom })
const boss = new PgBoss({ connectionString: databaseUrl, migrate: false, schedule: false, max: 4 })
boss.on('error', error => console.error('queue', error.message))
await boss.start()

const polling = { pollingIntervalSeconds: 0.5, batchSize: 1, includeMetadata: true } as const

await boss.work<JobData['mail']>('mail', polling, async ([job]) => {
  if (job) console.info('mail', job.data.mailId, await deliverMail(orm.em.fork(), mailer, job.data.mailId, serverClock))
})
await boss.work<JobData['release']>('release', polling, async ([job]) => {
  if (job) await makeRelease({ em: orm.em.fork(), clock: serverClock, signer }, job.data, { last: job.retryCount >= queueOptions.release.retryLimit })
})
await boss.work<JobData['draft-pdf']>('draft-pdf', polling, async ([job]) => {
  if (job) return makeDraftPdf({ em: orm.em.fork(), clock: serverClock }, job.data)
})
console.info('worker ready')

for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.once(signal, async () => {
    await boss.stop({ graceful: true, timeout: 10_000 })
    await closeQueue()
    mailer.close()
    await orm.close()
    process.exit(0)
  })
}
