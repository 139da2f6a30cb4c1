import { presentProjects } from '#server/presenters/people-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'signed-in' }, async ({ em, actor }) => ({ items: await presentProjects(em, actor) }))
