import type { EntityManager } from '@mikro-orm/postgresql'
import { SaveSchema } from '#server/database/entities/save'
import { rebuildSave } from '#server/notes/rebuild-save'

/** The saves of an issue, newest first. */
export async function presentSaves(em: EntityManager, issueId: string) {
  const saves = await em.find(SaveSchema, { issue: issueId }, { orderBy: { number: 'desc' }, populate: ['author'], exclude: ['snapshot', 'steps'] })
  return saves.map(save => ({
    save: save.number, author: { id: save.author.id, name: save.author.name }, at: save.at.toISOString(), label: save.label ?? null,
    documentHash: save.documentHash, recomputed: Object.keys(JSON.parse(save.changedResults)).length,
  }))
}

/** One save rebuilt, with the hash it was stored under and the hash of what was rebuilt. */
export async function presentRebuilt(em: EntityManager, issueId: string, number: number) {
  const { save, document, hash, results } = await rebuildSave(em, issueId, number)
  return {
    save: save.number, author: { id: save.author.id, name: save.author.name }, at: save.at.toISOString(), label: save.label ?? null,
    document: JSON.parse(document) as unknown, results, documentHash: save.documentHash, rebuiltHash: hash, same: hash === save.documentHash,
  }
}
