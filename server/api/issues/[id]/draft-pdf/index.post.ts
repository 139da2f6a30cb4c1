import { requestDraftPdf } from '#server/commands/request-draft-pdf'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, async ({ command, issue }) => ({ jobId: await requestDraftPdf(command, issue.id) }))
