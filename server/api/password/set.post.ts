import { setPasswordSchema } from '#shared/schemas/people'
import { setPassword } from '#server/commands/set-password'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public', body: setPasswordSchema }, async ({ em, clock, body }) => {
  await setPassword(em, clock, body.token, body.password)
  return { ok: true }
})
