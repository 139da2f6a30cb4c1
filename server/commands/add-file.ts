import { noteChain, recordAct } from '#server/audit/record'
import type { StoredFile } from '#server/database/entities/stored-file'
import { requireAbility } from '#server/notes/facts'
import { storeUpload } from '#server/notes/upload'
import { findIssue } from '#server/notes/find-issue'
import { runCommand, type CommandContext } from '#server/utils/command-context'

/** An analyst uploads a figure, or somebody with a remark or reply an attachment. */
export async function addFile(context: CommandContext, issueId: string, upload: { name: string, bytes: Buffer }, purpose: 'figure' | 'attachment'): Promise<StoredFile> {
  const { note } = await findIssue(context.em, issueId)
  const name = { chain: noteChain(note.id), act: purpose === 'figure' ? 'upload figure' : 'upload attachment', subject: { type: 'issue', id: issueId, label: note.number } }
  return runCommand(context, name, async (inside) => {
    const issue = await findIssue(inside.em, issueId)
    await requireAbility(inside, issue, purpose === 'figure' ? ['write'] : ['reply', 'remark'])
    const file = await storeUpload(inside, issue, upload, purpose)
    await recordAct(inside, { ...name, new: { file: file.id, name: file.name, sha256: file.sha256, size: file.size } })
    return file
  })
}
