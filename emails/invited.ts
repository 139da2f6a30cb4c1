import { composeMail, type MailContent } from '#emails/layout'

export interface InvitedMailProps {
  name: string
  email: string
  invitedBy: string
  /** One-time address where the password is set. */
  link: string
  /** How long the link holds, in words: `48 hours`. */
  validFor: string
  demonstration?: boolean
}

/** To a person who was added: set a password. */
export function invitedMail(props: InvitedMailProps): MailContent {
  return composeMail({
    subject: `Torquill: ${props.invitedBy} added you, set your password`,
    heading: 'Set your password',
    paragraphs: [
      `${props.name}, ${props.invitedBy} has added you to Torquill, where torsion substantiation notes are written, checked and released.`,
      `Open the link once to choose a password. It holds for ${props.validFor}; after that, ask ${props.invitedBy} for a new one.`,
    ],
    facts: [['You sign in with', props.email]],
    action: { label: 'Set password', url: props.link },
    reason: 'You get this message because an administrator entered your address.',
    demonstration: props.demonstration,
  })
}
