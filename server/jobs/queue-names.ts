/** The queues of the job worker. The owner role makes them at migration. */
export const queueNames = ['mail', 'release', 'draft-pdf'] as const
export type QueueName = typeof queueNames[number]

/** What each job carries. */
export interface JobData {
  'mail': { mailId: string }
  'release': { issueId: string, signatureId: string }
  'draft-pdf': { issueId: string, personId: string }
}

/** Patience per queue: mail outlives a long outage of the mail server, a release gives up soon and says why. */
export const queueOptions: Record<QueueName, { retryLimit: number, retryDelay: number, retryBackoff: boolean, expireInSeconds: number }> = {
  'mail': { retryLimit: 60, retryDelay: 5, retryBackoff: true, expireInSeconds: 60 },
  'release': { retryLimit: 3, retryDelay: 5, retryBackoff: true, expireInSeconds: 300 },
  'draft-pdf': { retryLimit: 1, retryDelay: 1, retryBackoff: false, expireInSeconds: 120 },
}
