import { readMultipartFormData } from 'h3'
import { z } from 'zod'
import { addFile } from '#server/commands/add-file'
import { uploadLimit } from '#server/notes/upload'
import { defineApi } from '#server/utils/define-api'
import { DomainError } from '#server/utils/domain-error'

const query = z.object({ purpose: z.enum(['figure', 'attachment']).default('figure') })

export default defineApi({ can: 'see-issue', query, limit: uploadLimit + 4096, raw: true }, async ({ event, command, issue, query }) => {
  const parts = await readMultipartFormData(event)
  const part = parts?.find(p => p.name === 'file')
  if (!part?.data.length) throw new DomainError('invalid-input', 'Choose a file to upload.', { fields: { file: 'Choose a file.' } })
  const file = await addFile(command, issue.id, { name: part.filename ?? 'file', bytes: part.data }, query.purpose)
  return { id: file.id, name: file.name, mime: file.mime, width: file.width ?? null, height: file.height ?? null }
})
