import { submitSchema } from '#shared/schemas/acts'
import { submitNote } from '#server/commands/submit-note'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: submitSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await submitNote(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
