import { returnSchema } from '#shared/schemas/acts'
import { returnNote } from '#server/commands/return-note'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: returnSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await returnNote(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
