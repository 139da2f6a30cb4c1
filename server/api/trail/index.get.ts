import { trailQuerySchema } from '#shared/schemas/notes'
import { presentTrail } from '#server/presenters/trail-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'auditor', query: trailQuerySchema }, ({ em, query }) => presentTrail(em, query))
