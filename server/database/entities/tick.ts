import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** The checker has followed a calculation. Holds while the hash of its inputs, results, answers and method revision is equal. */
export const TickSchema = defineEntity({
  name: 'Tick',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    calcId: p.uuid(),
    person: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    saveNumber: p.integer(),
    hash: p.text(),
  }),
  uniques: [{ properties: ['issue', 'calcId'] }],
})
export type Tick = InferEntity<typeof TickSchema>
