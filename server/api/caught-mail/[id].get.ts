import { z } from 'zod'
import { readCaughtMail } from '#server/mail/caught-mail'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public', params: z.object({ id: z.string().regex(/^[\w-]{1,80}$/) }) }, ({ params }) => readCaughtMail(params.id))
