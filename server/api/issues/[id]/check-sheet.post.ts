import { checkItemSchema } from '#shared/schemas/acts'
import { fillCheckItem } from '#server/commands/fill-check-item'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: checkItemSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await fillCheckItem(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
