import { createHash } from 'node:crypto'
import type { EntityManager } from '@mikro-orm/postgresql'
import { readDocument } from '#shared/note/schema'
import { applySteps } from '#shared/note/steps'
import { SaveSchema, type Save } from '#server/database/entities/save'
import { DomainError } from '#server/utils/domain-error'
import type { Results } from './evaluate-document'

export interface RebuiltSave { save: Save, document: string, hash: string, results: Results }

/** An earlier save, byte for byte: from the nearest snapshot below it and the steps since, with the results it had. */
export async function rebuildSave(em: EntityManager, issueId: string, number: number): Promise<RebuiltSave> {
  const saves = await em.find(SaveSchema, { issue: issueId, number: { $lte: number } }, { orderBy: { number: 'asc' }, populate: ['author'] })
  const save = saves.at(-1)
  if (!save || save.number !== number) throw new DomainError('not-found', 'There is no such save.')
  const from = saves.findLastIndex(s => s.snapshot !== null && s.snapshot !== undefined)
  let document = saves[from]?.snapshot ?? ''
  for (const later of saves.slice(from + 1)) {
    const applied = applySteps(readDocument(JSON.parse(document)), JSON.parse(later.steps))
    if (!applied.ok) throw new Error(`save ${later.number} of ${issueId} cannot be rebuilt: ${applied.message}`)
    document = applied.canonical
  }
  const results: Results = {}
  for (const s of saves) Object.assign(results, JSON.parse(s.changedResults))
  return { save, document, hash: createHash('sha256').update(document).digest('hex'), results }
}
