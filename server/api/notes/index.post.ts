import { createNoteSchema } from '#shared/schemas/notes'
import { createNote } from '#server/commands/create-note'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'signed-in', body: createNoteSchema }, async ({ command, body }) => {
  const issue = await createNote(command, body)
  return { number: issue.note.number, issueId: issue.id }
})
