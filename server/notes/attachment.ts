import { StoredFileSchema } from '#server/database/entities/stored-file'
import type { Issue } from '#server/database/entities/issue'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The attachment of a remark or reply: a file of this issue that its writer uploaded, or none. */
export async function attachmentOf({ em, actor }: CommandContext, issue: Issue, fileId: string | null): Promise<string | null> {
  if (!fileId) return null
  const file = await em.findOne(StoredFileSchema, { id: fileId, issue, purpose: 'attachment', uploadedBy: actor })
  if (!file) throw new DomainError('not-found', 'The attachment was not uploaded to this issue. Attach it again.', { fields: { fileId: 'Attach the file again.' } })
  return file.id
}
