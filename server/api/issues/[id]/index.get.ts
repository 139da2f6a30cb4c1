import { presentIssue } from '#server/presenters/issue-presenter'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-issue' }, ({ em, actor, clock, issue }) => presentIssue({ em, actor, clock }, issue.id))
