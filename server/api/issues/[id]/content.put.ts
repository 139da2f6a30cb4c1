import { saveContentSchema } from '#shared/schemas/notes'
import { saveNote } from '#server/commands/save-note'
import { presentSave } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: saveContentSchema, limit: 16 * 1024 * 1024 }, async ({ em, actor, clock, command, issue, body }) => {
  await saveNote(command, issue.id, body)
  return presentSave({ em: em.fork(), actor, clock }, issue.id)
})
