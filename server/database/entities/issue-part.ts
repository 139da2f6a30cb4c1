import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

export type Part = 'contributor' | 'checker' | 'approver'

/** What a person has been to an issue. The key allows one part per issue and person: the database refuses a second. */
export const IssuePartSchema = defineEntity({
  name: 'IssuePart',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    person: () => p.manyToOne(PersonSchema),
    part: p.text().$type<Part>(),
    at: p.datetime(),
  }),
  uniques: [{ properties: ['issue', 'person'] }],
})
export type IssuePart = InferEntity<typeof IssuePartSchema>
