import { reassignSchema } from '#shared/schemas/acts'
import { reassignIssue } from '#server/commands/reassign-issue'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: reassignSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await reassignIssue(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
