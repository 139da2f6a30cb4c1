import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** Why a typed quantity stays untied. Found again by its block, its text and which one of the same text it is. */
export const LooseDecisionSchema = defineEntity({
  name: 'LooseDecision',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    blockId: p.text(),
    text: p.text(),
    ordinal: p.integer(),
    /** The verdict it was given at: it lapses when the verdict changes. */
    verdict: p.text(),
    reason: p.text(),
    author: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
  }),
  uniques: [{ properties: ['issue', 'blockId', 'text', 'ordinal'] }],
})
export type LooseDecision = InferEntity<typeof LooseDecisionSchema>
