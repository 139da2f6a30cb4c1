import type { EntityManager } from '@mikro-orm/postgresql'
import PgBoss from 'pg-boss'
import { queueOptions, type JobData, type QueueName } from './queue-names'

/** The client of a transaction, as pg-boss wants it. The ORM's query builder hides it: its inside is touched here only. */
interface TransactionClient {
  client: { acquireConnection(): Promise<{ query(text: string, values: unknown[]): Promise<{ rows: unknown[] }> }> }
}

let sender: Promise<PgBoss> | undefined
let senderUrl: string | undefined

/** Names the database that jobs are sent to; called once at start by the server, the worker and the commands of the terminal. */
export function useQueue(databaseUrl: string) {
  senderUrl = databaseUrl
}

function boss(): Promise<PgBoss> {
  if (!senderUrl) throw new Error('useQueue(databaseUrl) must run before a job is sent')
  const url = senderUrl
  sender ??= (async () => {
    const started = new PgBoss({ connectionString: url, migrate: false, supervise: false, schedule: false, max: 2 })
    started.on('error', error => console.error('queue', error.message))
    return started.start()
  })()
  return sender
}

/** Writes a job in the transaction of `em`: it is there after commit, and gone on rollback. */
export async function sendJob<Name extends QueueName>(em: EntityManager, name: Name, data: JobData[Name]): Promise<string | null> {
  const transaction = em.getTransactionContext() as unknown as TransactionClient | undefined
  if (!transaction) throw new Error('sendJob needs a transaction')
  const connection = await transaction.client.acquireConnection()
  const db = { executeSql: (text: string, values: unknown[]) => connection.query(text, values) }
  const { retryLimit, retryDelay, retryBackoff } = queueOptions[name]
  return (await boss()).send(name, data, { db, retryLimit, retryDelay, retryBackoff })
}

export async function closeQueue() {
  const started = await sender
  sender = undefined
  await started?.stop({ graceful: false })
}

/** A job by its id, with what it has come to. */
export async function queuedJob<Name extends QueueName>(name: Name, id: string): Promise<{ data: JobData[Name], state: string, output: { fileId?: string } | null } | null> {
  const job = await (await boss()).getJobById<JobData[Name]>(name, id)
  return job && { data: job.data, state: job.state, output: job.output as { fileId?: string } | null }
}
