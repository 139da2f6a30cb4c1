import type { Node } from '@tiptap/pm/model'
import { Step } from '@tiptap/pm/transform'
import type { CheckedDocument } from '#shared/note/check-document'
import { checkDocument } from '#shared/note/check-document'
import type { DocumentFault } from '#shared/note/document-fault'
import { documentFault } from '#shared/note/document-fault'
import { isRecord, jsonFault } from '#shared/note/plain-json'
import { noteSchema } from '#shared/note/schema'

/** One save carries at most this much; the editor merges its steps, so that an hour of typing stays far below. */
export const STEP_LIMITS = { count: 5000, characters: 16 * 1024 * 1024, values: 400_000, depth: 80 }

/** What typing, formatting and committing a field need; others (attributes of the document, marks on nodes) have no use here. */
const STEP_TYPES = new Set(['replace', 'replaceAround', 'addMark', 'removeMark', 'attr'])

export interface AppliedSteps extends CheckedDocument { before: Node, steps: Step[] }

function stepsFault(steps: unknown): DocumentFault | null {
  if (!Array.isArray(steps)) return documentFault('steps.malformed', 'The changes must be a list of steps.')
  if (steps.length > STEP_LIMITS.count) return documentFault('steps.too-many', 'There are too many changes for one save. Save the whole note instead.')
  const fault = jsonFault(steps, STEP_LIMITS)
  if (fault) return documentFault('steps.malformed', `The changes cannot be read: the list ${fault}.`)
  const odd = steps.findIndex(step => !isRecord(step) || typeof step.stepType !== 'string' || !STEP_TYPES.has(step.stepType))
  return odd < 0 ? null : documentFault('steps.malformed', 'The changes hold a kind of step that a note does not take.', String(odd))
}

function applyAll(before: Node, steps: unknown[]): { doc: Node, steps: Step[] } | DocumentFault {
  let doc = before
  const applied: Step[] = []
  for (const [index, json] of steps.entries()) {
    try {
      const step = Step.fromJSON(noteSchema(), json)
      const result = step.apply(doc)
      if (!result.doc) return documentFault('steps.do-not-apply', `A change does not fit the note as saved: ${result.failed ?? 'unknown'}`, String(index))
      doc = result.doc
      applied.push(step)
    } catch (error) {
      const why = error instanceof Error ? error.message : 'unknown'
      return documentFault('steps.do-not-apply', `A change does not fit the note as saved: ${why}`, String(index))
    }
  }
  return { doc, steps: applied }
}

/**
 * Applies editing steps to a stored document and checks what comes out as
 * strictly as a document sent whole. All or nothing.
 * @param before The stored document; it was checked when it was stored.
 * @param stepsJson Steps as the editor sent them: untrusted.
 */
export function applySteps(before: Node, stepsJson: unknown): AppliedSteps | DocumentFault {
  const fault = stepsFault(stepsJson)
  if (fault) return fault
  const applied = applyAll(before, stepsJson as unknown[])
  if ('ok' in applied) return applied
  const checked = checkDocument(applied.doc.toJSON())
  return checked.ok ? { ...checked, before, steps: applied.steps } : checked
}
