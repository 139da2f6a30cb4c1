import { z } from 'zod'
import { replySchema } from '#shared/schemas/acts'
import { replyToRemark } from '#server/commands/reply-to-remark'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), remark: z.uuid() })

export default defineApi({ can: 'see-issue', params, body: replySchema }, async ({ em, actor, clock, command, issue, body, params }) => {
  await replyToRemark(command, issue.id, params.remark, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
