import { withdrawSchema } from '#shared/schemas/acts'
import { withdrawIssue } from '#server/commands/withdraw-issue'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: withdrawSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await withdrawIssue(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
