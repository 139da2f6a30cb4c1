import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** A signature: who, when, with which meaning, on which save and content. Voided, never deleted. */
export const SignatureSchema = defineEntity({
  name: 'Signature',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    person: () => p.manyToOne(PersonSchema),
    meaning: p.text().$type<'submitted' | 'passed' | 'released' | 'withdrawn'>(),
    at: p.datetime(),
    saveNumber: p.integer(),
    contentHash: p.text(),
    voidedAt: p.datetime().nullable(),
    voidReason: p.text().nullable(),
  }),
})
export type Signature = InferEntity<typeof SignatureSchema>
