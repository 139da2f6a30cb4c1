import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { PersonSchema } from './person'
import { RemarkSchema } from './remark'

/** The remark's own text and each reply, in order. Insert-only. */
export const RemarkEntrySchema = defineEntity({
  name: 'RemarkEntry',
  properties: p => ({
    id: p.uuid().primary(),
    remark: () => p.manyToOne(RemarkSchema),
    author: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    text: p.text(),
    /** Wording the checker proposes; accepting it makes it the author's. */
    proposed: p.text().nullable(),
    fileId: p.uuid().nullable(),
  }),
})
export type RemarkEntry = InferEntity<typeof RemarkEntrySchema>
