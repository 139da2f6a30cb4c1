import { addPersonSchema } from '#shared/schemas/people'
import { addPerson } from '#server/commands/add-person'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator', body: addPersonSchema }, async ({ command, body }) => {
  const person = await addPerson(command, body)
  return { id: person.id }
})
