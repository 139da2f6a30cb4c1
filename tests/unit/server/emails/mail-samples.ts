import type { MailProps, MailTemplate } from '#emails/registry'
import type { IssueMailProps } from '#emails/issue-mail'

export const LINK = 'https://torquill.example/notes/QSN-19-0031?issue=B'

/** An issue as every message about it sees it; invented. */
export const ISSUE: IssueMailProps = {
  number: 'QSN-19-0031', letter: 'B', title: 'Flap inner hat stiffener', project: 'QW-19 Ondrell', part: 'QW19-5721-14',
  drawingIssue: 'D', url: LINK, demonstration: true,
}

/** One set of props per template: a new template without a sample does not compile. */
export const SAMPLES: { [Template in MailTemplate]: MailProps<Template> } = {
  'invited': { name: 'Koji Hatamori', url: LINK, hours: 72 },
  'forgotten-password': { name: 'Koji Hatamori', url: LINK, hours: 2 },
  'submitted': { ...ISSUE, analyst: 'Ilse Tveråmo', approver: 'Catalina Ferreyrón', save: 9, leastMargin: '+1.41', cautions: 2, deviations: 0 },
  'assigned': { ...ISSUE, role: 'checker', change: 'named', by: 'Yusuf Karatepeli', reason: 'Meera is on leave.', other: 'Meera Ranganekar' },
  'remarked': { ...ISSUE, checker: 'Koji Hatamori', remark: { number: 1, text: 'Say why it is open.', quote: 'riveted through its crown' } },
  'answered': { ...ISSUE, by: 'Ilse Tveråmo', remark: { number: 1, text: 'Say why it is open.' }, answer: 'Added in section 5.' },
  'returned': { ...ISSUE, by: 'Koji Hatamori', role: 'checker', reason: 'Two remarks to answer in the text.', openRemarks: 2 },
  'passed': { ...ISSUE, checker: 'Koji Hatamori', analyst: 'Ilse Tveråmo', leastMargin: '+1.41', cautions: 2, deviations: 1 },
  'released': { ...ISSUE, approver: 'Catalina Ferreyrón', releasedOn: '2026-06-26', leastMargin: '+1.41', adequate: true, supersedes: 'A', contentHash: '0f'.repeat(32) },
  'superseded': { ...ISSUE, letter: 'A', byLetter: 'B', approver: 'Catalina Ferreyrón', changeNote: 'Sheet 1.6 mm.' },
  'withdrawn': { ...ISSUE, approver: 'Catalina Ferreyrón', reason: 'The rivet pitch was changed.' },
}
