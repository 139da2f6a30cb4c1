/** Makes the releases of the demonstration beside its story, one at a time, as the worker makes them. */
import { parentPort, workerData } from 'node:worker_threads'
import { connect } from '#server/database/orm'
import { loadSigner } from '#server/pdf/signing/local-authority'
import { environment } from '#server/utils/environment'
import { makeRelease } from './make-release'
import { useQueue } from './queue'
import type { JobData } from './queue-names'

export interface ReleaseTask { job: JobData['release'], at: string }

const { databaseUrl } = workerData as { databaseUrl: string }
useQueue(databaseUrl)
const orm = await connect(databaseUrl)
const signer = await loadSigner(`${environment().dataDir}/authority`, new Date())

parentPort?.on('message', ({ job, at }: ReleaseTask) => {
  void makeRelease({ em: orm.em.fork(), clock: () => new Date(at), signer }, job, { last: true }).finally(() => parentPort?.postMessage(job.issueId))
})
