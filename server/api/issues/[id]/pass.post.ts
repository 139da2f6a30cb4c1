import { passSchema } from '#shared/schemas/acts'
import { passCheck } from '#server/commands/pass-check'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: passSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await passCheck(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
