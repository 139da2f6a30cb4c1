import { looseSchema } from '#shared/schemas/acts'
import { explainLooseNumber } from '#server/commands/explain-loose-number'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: looseSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await explainLooseNumber(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
