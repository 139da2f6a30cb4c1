import { IssueSchema } from '#server/database/entities/issue'
import { summaryOfIssue } from '#server/presenters/issue-summary'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'see-note' }, async ({ em, note }) => {
  const issues = await em.find(IssueSchema, { note }, { orderBy: { createdAt: 'desc' }, exclude: ['document', 'results'] })
  return { number: note.number, project: { code: note.project.code, name: note.project.name }, issues: issues.map(summaryOfIssue), currentIssueId: issues[0]?.id ?? null }
})
