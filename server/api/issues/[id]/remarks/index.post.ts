import { remarkSchema } from '#shared/schemas/acts'
import { addRemark } from '#server/commands/add-remark'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: remarkSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await addRemark(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
