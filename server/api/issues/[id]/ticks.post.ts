import { tickSchema } from '#shared/schemas/acts'
import { tickCalculation } from '#server/commands/tick-calculation'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: tickSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await tickCalculation(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
