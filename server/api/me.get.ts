import { defineApi } from '#server/utils/define-api'
import { presentMe } from '#server/presenters/me-presenter'

export default defineApi({ can: 'signed-in' }, ({ em, actor }) => presentMe(em, actor))
