import { z } from 'zod'
import { resendLink } from '#server/commands/resend-link'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator', params: z.object({ id: z.uuid() }) }, async ({ command, params }) => {
  await resendLink(command, params.id)
  return { ok: true }
})
