import { addProjectSchema } from '#shared/schemas/people'
import { addProject } from '#server/commands/add-project'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'administrator', body: addProjectSchema }, async ({ command, body }) => {
  const project = await addProject(command, body)
  return { id: project.id, code: project.code }
})
