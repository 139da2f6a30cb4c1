import { recallSchema } from '#shared/schemas/acts'
import { recallNote } from '#server/commands/recall-note'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: recallSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await recallNote(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
