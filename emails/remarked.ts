import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface RemarkedMailProps extends IssueMailProps {
  checker: string
  remark: { number: number, text: string, quote: string }
}

/** To the analyst: the checker has made a remark. */
export function remarkedMail(props: RemarkedMailProps): MailContent {
  const { number, text, quote } = props.remark
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: remark ${number} by ${props.checker}`,
    heading: `Remark ${number} on ${issueName(props)}`,
    paragraphs: [`${props.checker} has made a remark. You can answer it now; the text itself opens to you when the issue is returned or recalled.`],
    quotes: [
      ...(quote.trim() === '' ? [] : [{ label: 'On', text: quote }]),
      { label: `${props.checker} writes`, text },
    ],
    action: { label: 'Open the remark', url: props.url },
    reason: 'You get this message because you are the analyst of this issue.',
  }))
}
