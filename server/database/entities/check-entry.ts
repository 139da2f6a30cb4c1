import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** One filled item of the check sheet. It lapses when the content it was filled at changes. */
export const CheckEntrySchema = defineEntity({
  name: 'CheckEntry',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    item: p.integer(),
    verdict: p.text().$type<'ok' | 'not ok' | 'not applicable'>(),
    evidence: p.text(),
    person: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    saveNumber: p.integer(),
    /** Hash of the content it was filled at. */
    hash: p.text(),
  }),
  uniques: [{ properties: ['issue', 'item'] }],
})
export type CheckEntry = InferEntity<typeof CheckEntrySchema>
