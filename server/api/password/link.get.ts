import { z } from 'zod'
import { usableLink } from '#server/access/one-time-links'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public', query: z.object({ token: z.string().max(200) }) }, async ({ em, clock, query }) => {
  const link = await usableLink(em, query.token, clock())
  return { name: link.person.name, email: link.person.email, purpose: link.purpose }
})
