import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** Who is writing an issue now: one person at a time, others read. */
export const LeaseSchema = defineEntity({
  name: 'Lease',
  properties: p => ({
    issue: () => p.oneToOne(IssueSchema).primary().owner(),
    person: () => p.manyToOne(PersonSchema),
    until: p.datetime(),
  }),
})
export type Lease = InferEntity<typeof LeaseSchema>
