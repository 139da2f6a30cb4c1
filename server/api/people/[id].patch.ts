import { z } from 'zod'
import { changePersonSchema } from '#shared/schemas/people'
import { changePerson } from '#server/commands/change-person'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator', params: z.object({ id: z.uuid() }), body: changePersonSchema }, async ({ command, params, body }) => {
  const person = await changePerson(command, params.id, body)
  return { id: person.id }
})
