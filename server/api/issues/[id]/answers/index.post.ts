import { answerSchema } from '#shared/schemas/acts'
import { answerGuard } from '#server/commands/answer-guard'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: answerSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await answerGuard(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
