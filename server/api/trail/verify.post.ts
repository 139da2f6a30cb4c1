import { z } from 'zod'
import { verifyChain } from '#server/audit/verify'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'auditor', body: z.object({ chain: z.string().max(80) }) }, ({ em, body }) => verifyChain(em, body.chain))
