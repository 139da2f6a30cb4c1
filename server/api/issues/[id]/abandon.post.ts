import { abandonSchema } from '#shared/schemas/acts'
import { abandonIssue } from '#server/commands/abandon-issue'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: abandonSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await abandonIssue(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
