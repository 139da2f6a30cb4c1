import { penHolder } from '#server/notes/pen'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ em, clock, issue, actor }) => {
  const lease = await penHolder({ em, clock }, issue)
  return { save: issue.saveNumber, writer: lease && { person: { id: lease.person.id, name: lease.person.name }, until: lease.until.toISOString(), you: lease.person.id === actor.id } }
})
