import { forgottenSchema } from '#shared/schemas/people'
import { requestPassword } from '#server/commands/request-password'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public', body: forgottenSchema }, async ({ em, clock, body }) => {
  await requestPassword(em, clock, body.email)
  return { ok: true }
})
