import type { MailParts } from '#emails/layout'

/** What every message about an issue knows of it. */
export interface IssueMailProps {
  /** `QSN-19-0031` */
  number: string
  letter: string
  title: string
  /** Code and name of the project. */
  project: string
  part: string
  drawingIssue: string
  /** Absolute address of the note. */
  url: string
  demonstration?: boolean
}

/** `QSN-19-0031 B` */
export function issueName({ number, letter }: IssueMailProps): string {
  return `${number} ${letter}`
}

/** The facts a reader needs to know which paper is meant. */
export function issueFacts(issue: IssueMailProps): [string, string][] {
  const part = issue.drawingIssue === '' ? issue.part : `${issue.part}, drawing issue ${issue.drawingIssue}`
  return [['Note', `${issue.number} issue ${issue.letter}`], ['Title', issue.title], ['Part', part], ['Project', issue.project]]
}

/** `one remark`, `2 remarks`: small numbers in words read better in a sentence. */
export function counted(count: number, one: string, many: string): string {
  return count === 1 ? `one ${one}` : `${count} ${many}`
}

/** The parts that all messages about an issue share. */
export function issueParts(issue: IssueMailProps, own: Omit<MailParts, 'demonstration' | 'facts'> & { facts?: [string, string][] }): MailParts {
  return { ...own, facts: [...issueFacts(issue), ...(own.facts ?? [])], demonstration: issue.demonstration }
}
