import { z } from 'zod'
import { presentRebuilt } from '#server/presenters/saves-presenter'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), save: z.coerce.number().int().min(1) })

export default defineApi({ can: 'see-issue', params }, ({ em, params }) => presentRebuilt(em, params.id, params.save))
