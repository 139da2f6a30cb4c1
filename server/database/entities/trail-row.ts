import { defineEntity, type InferEntity } from '@mikro-orm/core'

/** One act, refused act or save. Insert-only by grants and triggers; chained by SHA-256. Holds ids, not names. */
export const TrailRowSchema = defineEntity({
  name: 'TrailRow',
  properties: p => ({
    id: p.uuid().primary(),
    /** `note:<id>`, `project:<id>` or `system`. */
    chain: p.text(),
    seq: p.integer(),
    at: p.datetime(),
    actorId: p.uuid().nullable(),
    act: p.text(),
    outcome: p.text().$type<'done' | 'refused'>(),
    subjectType: p.text(),
    subjectId: p.text(),
    subjectLabel: p.text(),
    /** Canonical JSON text, or null. */
    old: p.text().nullable(),
    new: p.text().nullable(),
    reason: p.text().nullable(),
    previousHash: p.text(),
    hash: p.text(),
  }),
  uniques: [{ properties: ['chain', 'seq'] }],
})
export type TrailRow = InferEntity<typeof TrailRowSchema>
