import { composeMail, type MailContent } from '#emails/layout'

export interface ForgottenPasswordMailProps {
  name: string
  /** One-time address where the password is set. */
  url: string
  /** How many hours the link holds. */
  hours: number
  demonstration?: boolean
}

/** To a person who says the password is forgotten. */
export function forgottenPasswordMail(props: ForgottenPasswordMailProps): MailContent {
  return composeMail({
    subject: 'Torquill: set a new password',
    heading: 'Set a new password',
    paragraphs: [
      `${props.name}, someone asked for a new password for your address. If it was you, open the link once; it holds for ${props.hours} hours.`,
      'If it was not you, do nothing: your present password stays in force. Tell your administrator if this happens again.',
    ],
    action: { label: 'Set new password', url: props.url },
    reason: 'You get this message because a new password was asked for with your address.',
    demonstration: props.demonstration,
  })
}
