import { z } from 'zod'
import { remarkStateSchema } from '#shared/schemas/acts'
import { setRemarkState } from '#server/commands/set-remark-state'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), remark: z.uuid() })

export default defineApi({ can: 'see-issue', params, body: remarkStateSchema }, async ({ em, actor, clock, command, issue, body, params }) => {
  await setRemarkState(command, issue.id, params.remark, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
