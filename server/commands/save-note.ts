import { createHash, randomUUID } from 'node:crypto'
import { isDeepStrictEqual } from 'node:util'
import { ENGINE_VERSION } from '#shared/calc/registry'
import { calculationsOf, type NoteCalculation } from '#shared/note/calculations'
import { applySteps, type AppliedSteps } from '#shared/note/steps'
import type { SaveContent } from '#shared/schemas/notes'
import { noteChain, recordAct } from '#server/audit/record'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { SaveSchema } from '#server/database/entities/save'
import { evaluateDocument, summaryOf } from '#server/notes/evaluate-document'
import { requireAbility } from '#server/notes/facts'
import { lockIssue } from '#server/notes/find-issue'
import { mapRemarks } from '#server/notes/map-remarks'
import { addPart } from '#server/notes/parts'
import { takePen } from '#server/notes/pen'
import { prepareSave } from '#server/notes/prepare-heavy'
import { documentOf, resultsOf } from '#server/notes/reading'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** A full snapshot this often; in between a save is rebuilt from its steps. */
const snapshotEvery = 50

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex')

/** The steps applied to the stored document, checked against schema and limits, leading to what the browser shows. */
function nextDocument(issue: Issue, input: SaveContent) {
  const applied = applySteps(documentOf(issue), input.steps)
  if (!applied.ok) throw new DomainError('invalid-document', applied.message, { details: { code: applied.code } })
  const hash = sha256(applied.canonical)
  if (hash !== input.docHash) throw new DomainError('invalid-document', 'The steps do not lead to the document your browser shows. Copy your last words and load the page again.', { details: { code: 'hash-differs' } })
  return { applied, hash }
}

/** Null where no calculation changed: most saves are of words, and the results of a long note are megabytes. */
function recompute(issue: Issue, { before, doc }: AppliedSteps) {
  const [then, now] = [calculationsOf(before), calculationsOf(doc)]
  const sameEach = then.length === now.length && then.every((one, i) => sameCalculation(one, now[i]))
  if (sameEach && issue.engineVersion === ENGINE_VERSION) return null
  return evaluateDocument(now, { calculations: then, results: resultsOf(issue), engineVersion: issue.engineVersion })
}

const sameCalculation = (one: NoteCalculation, other: NoteCalculation | undefined): boolean =>
  other !== undefined && one.id === other.id && one.kind === other.kind && one.kindVersion === other.kindVersion
  && one.title === other.title && isDeepStrictEqual(one.inputs, other.inputs)

async function refuseConflict(context: CommandContext, issue: Issue, baseSave: number) {
  if (issue.saveNumber === baseSave) return
  throw new DomainError('save-conflict', `${issue.savedBy.name} saved a newer version. Your words are kept here; look at theirs, then put yours on top.`, {
    details: { save: issue.saveNumber, savedBy: issue.savedBy.name, savedAt: issue.savedAt.toISOString(), yours: issue.savedBy.id === context.actor.id },
  })
}

/** One save: steps on a base save, checked, recomputed and stored in one transaction. A repeated key answers again and changes nothing. */
export async function saveNote(context: CommandContext, issueId: string, input: SaveContent): Promise<Issue> {
  // The results are read once, under the lock.
  const found = await context.em.findOne(IssueSchema, { id: issueId }, { populate: ['note'], exclude: ['results'], refresh: true })
  if (!found) throw new DomainError('not-found', 'There is no such issue.')
  await prepareSave(found, input)
  const { note, letter } = found
  const name = { chain: noteChain(note.id), act: 'save', subject: { type: 'issue', id: issueId, label: `${note.number} ${letter}` } }
  return runCommand(context, name, async (inside) => {
    const { em, actor, clock } = inside
    const issue = await lockIssue(em, issueId)
    if (await em.count(SaveSchema, { issue, idempotencyKey: input.key })) return issue
    await requireAbility(inside, issue, ['write'])
    await takePen(inside, issue)
    await refuseConflict(inside, issue, input.baseSave)
    const { applied, hash } = nextDocument(issue, input)
    const evaluated = recompute(issue, applied)
    const changed = evaluated?.changed ?? {}
    const number = issue.saveNumber + 1
    const old = { save: issue.saveNumber, documentHash: issue.documentHash }
    em.create(SaveSchema, {
      id: randomUUID(), issue, number, author: actor, at: clock(), steps: JSON.stringify(input.steps),
      snapshot: number % snapshotEvery === 0 ? applied.canonical : null, documentHash: hash, changedResults: JSON.stringify(changed),
      engineVersion: ENGINE_VERSION, label: null, idempotencyKey: input.key,
    })
    Object.assign(issue, {
      document: applied.canonical, documentHash: hash, engineVersion: ENGINE_VERSION, saveNumber: number,
      savedAt: clock(), savedBy: actor, lastChangeAt: clock(),
      ...(evaluated ? { results: JSON.stringify(evaluated.results), ...summaryOf(evaluated.results) } : {}),
    })
    await em.flush()
    await addPart(inside, issue, 'contributor')
    await mapRemarks(inside, issue, applied)
    await recordAct(inside, { ...name, old, new: { save: number, documentHash: hash, recomputed: Object.keys(changed) } })
    return issue
  })
}
