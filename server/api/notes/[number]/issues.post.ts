import { openNextIssue } from '#server/commands/open-next-issue'
import { issueToFollow } from '#server/notes/find-issue'
import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-note' }, async ({ em, actor, clock, command, note }) => {
  const next = await openNextIssue(command, (await issueToFollow(em, note.id)).id)
  return presentIssue({ em: em.fork(), actor, clock }, next.id)
})
