import { registerQuerySchema } from '#shared/schemas/notes'
import { presentRegister } from '#server/presenters/register-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'signed-in', query: registerQuerySchema }, ({ em, actor, query }) => presentRegister(em, actor, query))
