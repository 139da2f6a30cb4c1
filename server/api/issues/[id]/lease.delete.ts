import { layPen } from '#server/notes/pen'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ command, issue }) => {
  await layPen(command, issue)
  return { writer: null }
})
