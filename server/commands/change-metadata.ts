import type { Metadata } from '#shared/schemas/notes'
import { noteChain, recordAct } from '#server/audit/record'
import { requireAbility } from '#server/notes/facts'
import { findIssue, lockIssue } from '#server/notes/find-issue'
import { addPart } from '#server/notes/parts'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

const metadataOf = ({ title, part, drawingIssue, changeNote }: Omit<Metadata, 'save'>) => ({ title, part, drawingIssue, changeNote })

/** Title, part, drawing issue and the line of the revision record, while in draft. */
export async function changeMetadata(context: CommandContext, issueId: string, input: Metadata): Promise<void> {
  const { note, letter } = await findIssue(context.em, issueId)
  const name = { chain: noteChain(note.id), act: 'change title block', subject: { type: 'issue', id: issueId, label: `${note.number} ${letter}` } }
  return runCommand(context, name, async (inside) => {
    const issue = await lockIssue(inside.em, issueId)
    await requireAbility(inside, issue, ['write'])
    if (issue.saveNumber !== input.save) throw new DomainError('stale', 'The note was saved meanwhile. Look at the newer save, then change the title block again.')
    const old = metadataOf(issue)
    Object.assign(issue, metadataOf(input), { lastChangeAt: inside.clock() })
    await inside.em.flush()
    await addPart(inside, issue, 'contributor')
    await recordAct(inside, { ...name, old, new: metadataOf(input) })
  })
}
