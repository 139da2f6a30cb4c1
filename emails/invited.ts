import { composeMail, type MailContent } from '#emails/layout'

export interface InvitedMailProps {
  name: string
  /** One-time address where the password is set. */
  url: string
  /** How many hours the link holds. */
  hours: number
  demonstration?: boolean
}

/** To a person who was added: set a password. */
export function invitedMail(props: InvitedMailProps): MailContent {
  return composeMail({
    subject: 'Torquill: you were added, set your password',
    heading: 'Set your password',
    paragraphs: [
      `${props.name}, an administrator has added you to Torquill, where torsion substantiation notes are written, checked and released.`,
      `Open the link once to choose a password. It holds for ${props.hours} hours; after that, ask your administrator for a new one.`,
    ],
    action: { label: 'Set password', url: props.url },
    reason: 'You get this message because an administrator entered your address.',
    demonstration: props.demonstration,
  })
}
