import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface SupersededMailProps extends IssueMailProps {
  /** Letter of the issue that takes its place. */
  byLetter: string
  approver: string
  changeNote: string
}

/** To those who took part in the earlier issue. */
export function supersededMail(props: SupersededMailProps): MailContent {
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: superseded by issue ${props.byLetter}`,
    heading: `${issueName(props)} is superseded`,
    paragraphs: [`${props.approver} has released issue ${props.byLetter}, which takes its place. Use issue ${props.byLetter} from now on; the earlier PDF stays on record.`],
    quotes: props.changeNote.trim() === '' ? [] : [{ label: `What changed in issue ${props.byLetter}`, text: props.changeNote }],
    action: { label: `Open issue ${props.byLetter}`, url: props.url },
    reason: 'You get this message because you took part in the superseded issue.',
  }))
}
