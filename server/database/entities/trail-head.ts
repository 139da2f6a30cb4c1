import { defineEntity, type InferEntity } from '@mikro-orm/core'

/** The newest row of a chain: locked while a row is appended, so that numbers have no gap. */
export const TrailHeadSchema = defineEntity({
  name: 'TrailHead',
  properties: p => ({
    chain: p.text().primary(),
    seq: p.integer(),
    hash: p.text(),
  }),
})
export type TrailHead = InferEntity<typeof TrailHeadSchema>
