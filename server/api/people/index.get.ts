import { presentPeople } from '#server/presenters/people-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator' }, async ({ em }) => ({ items: await presentPeople(em) }))
