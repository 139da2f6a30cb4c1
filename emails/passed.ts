import { composeMail, type MailContent } from '#emails/layout'
import { counted, issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface PassedMailProps extends IssueMailProps {
  checker: string
  analyst: string
  /** As shown on the note; empty when the note has no margin. */
  leastMargin: string
  cautions: number
  deviations: number
}

/** To the approver: an issue has passed its check. */
export function passedMail(props: PassedMailProps): MailContent {
  const deviations = props.deviations === 0
    ? 'It carries no deviation.'
    : `It carries ${counted(props.deviations, 'deviation', 'deviations')}, which you accept one by one when you release.`
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: passed by ${props.checker}, for your approval`,
    heading: `${issueName(props)} waits for your approval`,
    paragraphs: [`${props.checker} has completed the check and signed. ${deviations}`],
    facts: [['Analyst', props.analyst], ['Least margin', props.leastMargin], ['Accepted cautions', String(props.cautions)]],
    action: { label: 'Open for approval', url: props.url },
    reason: 'You get this message because you are named as the approver of this issue.',
  }))
}
