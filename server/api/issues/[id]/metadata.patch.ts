import { metadataSchema } from '#shared/schemas/notes'
import { changeMetadata } from '#server/commands/change-metadata'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue', body: metadataSchema }, async ({ em, actor, clock, command, issue, body }) => {
  await changeMetadata(command, issue.id, body)
  return presentIssue({ em: em.fork(), actor, clock }, issue.id)
})
