import { defineEntity, type InferEntity } from '@mikro-orm/core'
import type { Anchor } from '#shared/note/anchors'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** A checker's comment. Its anchor lies outside the document and is mapped by the author's steps. */
export const RemarkSchema = defineEntity({
  name: 'Remark',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    number: p.integer(),
    state: p.text().$type<'open' | 'answered' | 'closed'>(),
    anchor: p.json<Anchor>(),
    anchorState: p.text().$type<'ok' | 'edited' | 'orphaned'>(),
    author: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    saveNumber: p.integer(),
    closedBy: () => p.manyToOne(PersonSchema).nullable(),
    closedAt: p.datetime().nullable(),
  }),
  uniques: [{ properties: ['issue', 'number'] }],
})
export type Remark = InferEntity<typeof RemarkSchema>
