import { candidatesFor } from '#server/notes/candidates'
import { loadStanding } from '#server/notes/standing'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ em, issue }) => candidatesFor(em, await loadStanding(em, issue)))
