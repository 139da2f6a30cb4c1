import { releaseSchema } from '#shared/schemas/acts'
import { requestRelease } from '#server/commands/request-release'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: releaseSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await requestRelease(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
