import type { EntityManager } from '@mikro-orm/postgresql'
import { evaluateNote } from '#shared/calc/evaluate-note'
import { linksFor, type NoteCalc } from '#shared/calc/note-links'
import { calcKind, isCalcKind } from '#shared/calc/registry'
import { calculationsOf } from '#shared/note/calculations'
import { applySteps } from '#shared/note/steps'
import type { SaveContent } from '#shared/schemas/notes'
import type { Issue } from '#server/database/entities/issue'
import { findIssue } from '#server/notes/find-issue'
import { documentOf } from '#server/notes/reading'
import { readDocument } from '#shared/note/schema'
import { prepareOutlines } from '#server/outline/prepare-outlines'
import { DomainError } from '#server/utils/domain-error'

const isHeavy = ({ kind }: NoteCalc): boolean => isCalcKind(kind) && calcKind(kind).heavy === true

/**
 * Solves what takes long on threads of its own, before the transaction that evaluates the note: neither the
 * event loop nor a locked row waits for it. What is linked into it is computed first.
 * @throws DomainError engine-busy
 */
export async function prepareHeavy(calculations: readonly NoteCalc[]): Promise<void> {
  const heavy = calculations.filter(isHeavy)
  if (heavy.length === 0) return
  const { results } = evaluateNote(calculations.filter(one => !isHeavy(one)))
  const links = linksFor({ byId: new Map(calculations.map(one => [one.id, one])), results })
  const refused = await prepareOutlines(heavy.map(({ kind, inputs }) => ({ kind, inputs, links })))
  if (refused) throw new DomainError('engine-busy', refused.reason)
}

/** The same for the issue as it is saved. */
export async function prepareIssue(em: EntityManager, issueId: string): Promise<void> {
  const issue = await findIssue(em, issueId)
  await prepareHeavy(calculationsOf(documentOf(issue)))
}

/** The same for the document that a save leads to; steps that do not apply are refused where they are checked. */
export async function prepareSave(issue: Pick<Issue, 'id' | 'document'>, { steps }: SaveContent): Promise<void> {
  if (!mayBeHeavy(issue.document) && !mayBeHeavy(JSON.stringify(steps))) return
  const applied = applySteps(readDocument(JSON.parse(issue.document)), steps)
  if (applied.ok) await prepareHeavy(calculationsOf(applied.doc))
}

/** A look at the text alone: most notes hold nothing heavy, and their saves should not be read twice. */
const mayBeHeavy = (text: string): boolean => text.includes('"general-outline"')
