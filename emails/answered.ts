import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface AnsweredMailProps extends IssueMailProps {
  by: string
  remark: { number: number, text: string }
  answer: string
}

/** To the checker: a remark has been answered. */
export function answeredMail(props: AnsweredMailProps): MailContent {
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: remark ${props.remark.number} answered by ${props.by}`,
    heading: `Remark ${props.remark.number} on ${issueName(props)} is answered`,
    paragraphs: [`${props.by} has answered your remark. Close it if the answer serves, or write again.`],
    quotes: [{ label: 'Your remark', text: props.remark.text }, { label: `${props.by} writes`, text: props.answer }],
    action: { label: 'Open the remark', url: props.url },
    reason: 'You get this message because you made this remark.',
  }))
}
