import { z } from 'zod'
import { setMemberSchema } from '#shared/schemas/people'
import { setMember } from '#server/commands/set-member'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator', params: z.object({ id: z.uuid() }), body: setMemberSchema }, async ({ command, params, body }) => {
  await setMember(command, params.id, body)
  return { ok: true }
})
