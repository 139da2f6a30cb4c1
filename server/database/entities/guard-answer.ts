import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** The facts a guard was answered at: the answer lapses when they move. */
export interface GuardFacts {
  severity: string
  values: Record<string, number>
  wall: string | null
  caseId: string | null
  message: string
  methodRevision: string
}

/** An analyst's answer to a caution, or deviation to a marked stop. One current row per issue, calculation and guard. */
export const GuardAnswerSchema = defineEntity({
  name: 'GuardAnswer',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    calcId: p.uuid(),
    guardKey: p.text(),
    kind: p.text().$type<'answer' | 'deviation'>(),
    text: p.text(),
    facts: p.json<GuardFacts>(),
    author: () => p.manyToOne(PersonSchema),
    at: p.datetime(),
    saveNumber: p.integer(),
    judgedBy: () => p.manyToOne(PersonSchema).nullable(),
    judgedAt: p.datetime().nullable(),
    accepted: p.boolean().nullable(),
    judgement: p.text().default(''),
    approvedBy: () => p.manyToOne(PersonSchema).nullable(),
    approvedAt: p.datetime().nullable(),
  }),
  uniques: [{ properties: ['issue', 'calcId', 'guardKey'] }],
})
export type GuardAnswer = InferEntity<typeof GuardAnswerSchema>
