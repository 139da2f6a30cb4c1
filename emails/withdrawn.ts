import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface WithdrawnMailProps extends IssueMailProps {
  approver: string
  reason: string
}

/** To everyone who took part: the issue must not be used any longer. */
export function withdrawnMail(props: WithdrawnMailProps): MailContent {
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: withdrawn by ${props.approver}`,
    heading: `${issueName(props)} is withdrawn`,
    paragraphs: [`${props.approver} has withdrawn it. Do not use it any longer, and tell those to whom you passed the PDF.`],
    quotes: [{ label: `Reason given by ${props.approver}`, text: props.reason }],
    action: { label: 'Open the note', url: props.url },
    reason: 'You get this message because you took part in this issue.',
  }))
}
