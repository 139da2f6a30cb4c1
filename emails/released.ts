import { composeMail, type MailContent } from '#emails/layout'
import { issueName, issueParts, type IssueMailProps } from '#emails/issue-mail'

export interface ReleasedMailProps extends IssueMailProps {
  approver: string
  /** Day of release as written on the PDF, `2026-06-26`. */
  releasedOn: string
  leastMargin: string
  /** False when the note concludes that the part is not adequate. */
  adequate: boolean
  /** Letter of the issue that this one replaces, or null. */
  supersedes: string | null
  /** SHA-256 of the signed content, hexadecimal. */
  contentHash: string
}

/** To everyone who took part: the signed PDF exists. */
export function releasedMail(props: ReleasedMailProps): MailContent {
  const before = props.supersedes === null ? '' : ` Issue ${props.supersedes} is superseded by the same act.`
  return composeMail(issueParts(props, {
    subject: `${issueName(props)}: released by ${props.approver}`,
    heading: `${issueName(props)} is released`,
    paragraphs: [
      `${props.approver} has released it and the signed PDF is made.${before}`,
      ...(props.adequate ? [] : ['The note concludes that the part is not adequate. Read its conclusion before you use it.']),
    ],
    facts: [['Released on', props.releasedOn], ['Least margin', props.leastMargin], ['Content SHA-256', props.contentHash]],
    action: { label: 'Open the note', url: props.url },
    reason: 'You get this message because you took part in this issue.',
  }))
}
