import { presentChains } from '#server/presenters/trail-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'auditor' }, ({ em }) => presentChains(em))
