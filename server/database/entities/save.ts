import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** One stored working version of an issue. Insert-only, except its label. */
export const SaveSchema = defineEntity({
  name: 'Save',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    number: p.integer(),
    author: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    /** The editing steps since the save before, as text. */
    steps: p.text(),
    /** Full canonical document every 50 saves and at every act; others are rebuilt from the steps. */
    snapshot: p.text().nullable(),
    documentHash: p.text(),
    /** Evaluations that changed with this save, canonical JSON text. */
    changedResults: p.text(),
    engineVersion: p.text(),
    label: p.text().nullable(),
    /** Made by the client: a repeated request with the same key answers the same and changes nothing. */
    idempotencyKey: p.uuid().nullable(),
  }),
  uniques: [{ properties: ['issue', 'number'] }, { properties: ['issue', 'idempotencyKey'] }],
})
export type Save = InferEntity<typeof SaveSchema>
