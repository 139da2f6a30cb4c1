import { z } from 'zod'
import { draftPdfState } from '#server/jobs/draft-pdf-state'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), job: z.uuid() })

export default defineApi({ can: 'see-issue', params }, ({ params }) => draftPdfState(params.id, params.job))
