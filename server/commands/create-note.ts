import { createHash, randomUUID } from 'node:crypto'
import { LockMode } from '@mikro-orm/core'
import { ENGINE_VERSION } from '#shared/calc/registry'
import { blankDocument } from '#shared/note/blank-note'
import { canonicalJson } from '#shared/note/canonical'
import type { CreateNote } from '#shared/schemas/notes'
import { noteChain, recordAct } from '#server/audit/record'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { NoteSchema } from '#server/database/entities/note'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import { ProjectSchema, type Project } from '#server/database/entities/project'
import { SaveSchema } from '#server/database/entities/save'
import { addPart } from '#server/notes/parts'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** The next number of a project's pattern: the zeros in braces count up and set the least width. */
export function numberOf(project: Pick<Project, 'notePattern' | 'nextNumber'>): string {
  return project.notePattern.replace(/\{(0+)\}/, (_, zeros: string) => String(project.nextNumber).padStart(zeros.length, '0'))
}

/** An analyst opens a note at issue A, from the template. `number` is given where the pattern has been used outside before. */
export function createNote(context: CommandContext, input: CreateNote, options: { counter?: number } = {}): Promise<Issue> {
  const noteId = randomUUID()
  const name = { chain: noteChain(noteId), act: 'create note', subject: { type: 'note', id: noteId, label: input.title } }
  return runCommand(context, name, async (inside) => {
    const { em, actor, clock } = inside
    const project = await em.findOne(ProjectSchema, { id: input.projectId }, { lockMode: LockMode.PESSIMISTIC_WRITE, refresh: true })
    const analyst = project && await em.count(ProjectMemberSchema, { project, person: actor, role: 'analyst' })
    if (!project || !analyst) throw new DomainError('not-allowed', 'Only an analyst of the project opens a note in it.')
    if (options.counter !== undefined) project.nextNumber = options.counter
    const now = clock()
    const note = em.create(NoteSchema, { id: noteId, number: numberOf(project), project, createdBy: actor, createdAt: now })
    project.nextNumber += 1
    const document = canonicalJson(blankDocument(randomUUID))
    const documentHash = createHash('sha256').update(document).digest('hex')
    const issue = em.create(IssueSchema, {
      id: randomUUID(), note, letter: 'A', state: 'draft', title: input.title, part: input.part, drawingIssue: input.drawingIssue,
      changeNote: 'First issue.', analyst: actor, saveNumber: 1, savedAt: now, savedBy: actor, document, documentHash, results: '{}',
      engineVersion: ENGINE_VERSION, cautions: 0, stops: 0, lastChangeAt: now, createdAt: now, version: 1,
    })
    em.create(SaveSchema, {
      id: randomUUID(), issue, number: 1, author: actor, at: now, steps: '[]', snapshot: document, documentHash,
      changedResults: '{}', engineVersion: ENGINE_VERSION,
    })
    await em.flush()
    await addPart(inside, issue, 'contributor')
    await recordAct(inside, { ...name, subject: { type: 'note', id: note.id, label: `${note.number} A` }, new: { title: input.title, part: input.part, drawingIssue: input.drawingIssue, documentHash } })
    return issue
  })
}
