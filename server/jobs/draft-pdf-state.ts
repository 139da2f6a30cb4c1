import { queuedJob } from './queue'
import { DomainError } from '#server/utils/domain-error'

export interface DraftPdfState { state: 'waiting' | 'ready' | 'failed', fileId: string | null }

/** How far an uncontrolled PDF is. The job must belong to the issue that was asked for. */
export async function draftPdfState(issueId: string, jobId: string): Promise<DraftPdfState> {
  const job = await queuedJob('draft-pdf', jobId)
  if (!job || job.data.issueId !== issueId) throw new DomainError('not-found', 'There is no such print.')
  if (job.state === 'completed') return { state: 'ready', fileId: job.output?.fileId ?? null }
  return { state: job.state === 'failed' || job.state === 'cancelled' ? 'failed' : 'waiting', fileId: null }
}
