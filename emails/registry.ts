import type { MailContent } from '#emails/layout'
import { answeredMail } from '#emails/answered'
import { assignedMail } from '#emails/assigned'
import { forgottenPasswordMail } from '#emails/forgotten-password'
import { invitedMail } from '#emails/invited'
import { passedMail } from '#emails/passed'
import { releasedMail } from '#emails/released'
import { remarkedMail } from '#emails/remarked'
import { returnedMail } from '#emails/returned'
import { submittedMail } from '#emails/submitted'
import { supersededMail } from '#emails/superseded'
import { withdrawnMail } from '#emails/withdrawn'

/** Every message there is, by the name under which a mail row keeps it. */
const mails = {
  'invited': invitedMail,
  'forgotten-password': forgottenPasswordMail,
  'submitted': submittedMail,
  'assigned': assignedMail,
  'remarked': remarkedMail,
  'answered': answeredMail,
  'returned': returnedMail,
  'passed': passedMail,
  'released': releasedMail,
  'superseded': supersededMail,
  'withdrawn': withdrawnMail,
}

export type MailTemplate = keyof typeof mails
/** The props that a template takes. */
export type MailProps<Template extends MailTemplate> = Parameters<(typeof mails)[Template]>[0]

export const MAIL_TEMPLATES = Object.keys(mails) as MailTemplate[]

export function isMailTemplate(name: string): name is MailTemplate {
  return Object.hasOwn(mails, name)
}

/** Subject, text and HTML of one message. */
export function renderMail<Template extends MailTemplate>(template: Template, props: MailProps<Template>): MailContent {
  const render = mails[template] as (props: MailProps<Template>) => MailContent
  return render(props)
}
