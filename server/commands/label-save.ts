import { noteChain, recordAct } from '#server/audit/record'
import { SaveSchema } from '#server/database/entities/save'
import { requireAbility } from '#server/notes/facts'
import { findIssue } from '#server/notes/find-issue'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** Gives a save a name to find it by, or takes it away. */
export async function labelSave(context: CommandContext, issueId: string, number: number, label: string | null): Promise<void> {
  const { note, letter } = await findIssue(context.em, issueId)
  const name = { chain: noteChain(note.id), act: 'label save', subject: { type: 'issue', id: issueId, label: `${note.number} ${letter} save ${number}` } }
  return runCommand(context, name, async (inside) => {
    const issue = await findIssue(inside.em, issueId)
    await requireAbility(inside, issue, ['write'])
    const save = await inside.em.findOne(SaveSchema, { issue, number })
    if (!save) throw new DomainError('not-found', 'There is no such save.')
    const old = save.label ?? null
    save.label = label || null
    await inside.em.flush()
    await recordAct(inside, { ...name, old, new: save.label })
  })
}
