import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface AssignedMailProps extends IssueMailProps {
  role: 'checker' | 'approver'
  /** `named`: this person takes over; `relieved`: someone else does. */
  change: 'named' | 'relieved'
  by: string
  reason: string
  /** Who holds the role now, or held it before. */
  other: string
}

/** To both sides of a reassignment. */
export function assignedMail(props: AssignedMailProps): MailContent {
  const named = props.change === 'named'
  return composeMail(issueParts(props, {
    subject: named
      ? `${issueName(props)}: you are now its ${props.role}, named by ${props.by}`
      : `${issueName(props)}: ${props.other} is now its ${props.role}, named by ${props.by}`,
    heading: named ? `You are now the ${props.role} of ${issueName(props)}` : `${issueName(props)} has another ${props.role}`,
    paragraphs: [
      named
        ? `${props.by} has named you in place of ${props.other}.`
        : `${props.by} has named ${props.other} in your place. Nothing more is asked of you; what you wrote stays in the record.`,
    ],
    quotes: [{ label: `Reason given by ${props.by}`, text: props.reason }],
    action: { label: 'Open the note', url: props.url },
    reason: named ? `You get this message because you are named as the ${props.role} of this issue.` : `You get this message because you were the ${props.role} of this issue.`,
  }))
}
