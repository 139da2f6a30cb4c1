import { z } from 'zod'
import { labelSchema } from '#shared/schemas/notes'
import { labelSave } from '#server/commands/label-save'
import { presentSaves } from '#server/presenters/saves-presenter'
import { defineApi } from '#server/utils/define-api'

const params = z.object({ id: z.uuid(), save: z.coerce.number().int().min(1) })

export default defineApi({ can: 'see-issue', params, body: labelSchema }, async ({ em, command, params, body }) => {
  await labelSave(command, params.id, params.save, body.label)
  return { items: await presentSaves(em, params.id) }
})
