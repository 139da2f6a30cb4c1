import { z } from 'zod'
import { judgeSchema } from '#shared/schemas/acts'
import { judgeAnswer } from '#server/commands/judge-answer'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), answer: z.uuid() })

export default defineApi({ can: 'see-issue', params, body: judgeSchema }, async ({ em, actor, clock, command, issue, body, params }) => {
  await judgeAnswer(command, issue.id, params.answer, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
