import { presentWorklist } from '#server/presenters/worklist-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'signed-in' }, async ({ em, actor }) => ({ items: await presentWorklist(em, actor) }))
