import { presentSaves } from '#server/presenters/saves-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ em, issue }) => ({ items: await presentSaves(em, issue.id) }))
