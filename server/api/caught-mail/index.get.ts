import { listCaughtMail } from '#server/mail/caught-mail'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public' }, async () => ({ items: await listCaughtMail() }))
