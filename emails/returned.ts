import { composeMail, type MailContent } from '#emails/layout'
import { counted, issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface ReturnedMailProps extends IssueMailProps {
  by: string
  role: 'checker' | 'approver'
  reason: string
  openRemarks: number
}

/** To the analyst (and, from the approver, to the checker): the issue is a draft again. */
export function returnedMail(props: ReturnedMailProps): MailContent {
  const remarks = props.openRemarks === 0 ? 'No remark is open.' : `There ${props.openRemarks === 1 ? 'is' : 'are'} ${counted(props.openRemarks, 'open remark', 'open remarks')}.`
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: returned by ${props.by}`,
    heading: `${issueName(props)} is a draft again`,
    paragraphs: [`${props.by}, its ${props.role}, has returned it. ${remarks}`],
    quotes: [{ label: `Reason given by ${props.by}`, text: props.reason }],
    action: { label: 'Open the draft', url: props.url },
    reason: 'You get this message because you take part in this issue.',
  }))
}
