import { keepPen } from '#server/commands/keep-pen'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ command, issue, actor }) => {
  const lease = await keepPen(command, issue.id)
  return { writer: { person: { id: lease.person.id, name: lease.person.name }, until: lease.until.toISOString(), you: lease.person.id === actor.id } }
})
