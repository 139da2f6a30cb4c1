import type { IssueMailProps } from '#emails/issue-mail'
import type { Issue } from '#server/database/entities/issue'
import { environment } from '#server/utils/environment'

/** What every message about an issue knows of it. */
export function issueMailProps(issue: Issue, anchor = ''): IssueMailProps {
  const { baseUrl, demonstration } = environment()
  const { number, project } = issue.note
  return {
    number, letter: issue.letter, title: issue.title, project: `${project.code} ${project.name}`, part: issue.part, drawingIssue: issue.drawingIssue,
    url: `${baseUrl}/notes/${encodeURIComponent(number)}?issue=${issue.letter}${anchor}`, demonstration,
  }
}
