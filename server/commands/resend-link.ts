import { recordAct, systemChain } from '#server/audit/record'
import { PersonSchema } from '#server/database/entities/person'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'
import { sendLink } from './send-link'

/** The administrator sends a new one-time link; an earlier one stops working. */
export function resendLink(context: CommandContext, personId: string): Promise<void> {
  const name = { chain: systemChain, act: 'send link', subject: { type: 'person', id: personId, label: personId } }
  return runCommand(context, name, async (inside) => {
    const person = await inside.em.findOne(PersonSchema, { id: personId })
    if (!person) throw new DomainError('not-found', 'There is no such person.')
    if (person.disabledAt) throw new DomainError('wrong-state', 'This person is disabled; enable them first.')
    await sendLink(inside, person, person.passwordHash ? 'forgotten' : 'invitation')
    await recordAct(inside, { ...name, subject: { ...name.subject, label: person.email } })
  })
}
