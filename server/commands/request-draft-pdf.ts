import { noteChain, recordAct } from '#server/audit/record'
import { sendJob } from '#server/jobs/queue'
import { findIssue } from '#server/notes/find-issue'
import { runCommand, type CommandContext } from '#server/utils/command-context'

/** Asks the worker for an uncontrolled PDF of an issue as it stands. Whoever may see it may print it. */
export async function requestDraftPdf(context: CommandContext, issueId: string): Promise<string | null> {
  const { note, letter } = await findIssue(context.em, issueId)
  const name = { chain: noteChain(note.id), act: 'print uncontrolled', subject: { type: 'issue', id: issueId, label: `${note.number} ${letter}` } }
  return runCommand(context, name, async (inside) => {
    const job = await sendJob(inside.em, 'draft-pdf', { issueId, personId: inside.actor.id })
    await recordAct(inside, name)
    return job
  })
}
