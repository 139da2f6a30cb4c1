import { composeMail, type MailContent } from '#emails/layout'
import { counted, issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface SubmittedMailProps extends IssueMailProps {
  analyst: string
  approver: string
  save: number
  /** As shown on the note, `+1.41`; empty when the note has no margin. */
  leastMargin: string
  cautions: number
  deviations: number
}

/** To the checker: an issue waits for the check. */
export function submittedMail(props: SubmittedMailProps): MailContent {
  const open = [
    props.cautions > 0 ? counted(props.cautions, 'answered caution', 'answered cautions') : '',
    props.deviations > 0 ? counted(props.deviations, 'deviation', 'deviations') : '',
  ].filter(words => words !== '')
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: submitted to you for check by ${props.analyst}`,
    heading: `${issueName(props)} waits for your check`,
    paragraphs: [
      `${props.analyst} has submitted save ${props.save} and named you as its checker. The approver will be ${props.approver}.`,
      open.length === 0 ? 'No guard needs your judgement.' : `To judge: ${open.join(' and ')}.`,
    ],
    facts: [['Least margin', props.leastMargin]],
    action: { label: 'Open the check', url: props.url },
    reason: 'You get this message because you are named as the checker of this issue.',
  }))
}
