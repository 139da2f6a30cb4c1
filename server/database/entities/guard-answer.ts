import { defineEntity, type InferEntity } from '@mikro-orm/core'
import type { GuardFacts } from '#shared/calc/lapse'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** An analyst's answer to a caution, or deviation to a marked stop. One current row per issue, calculation and guard; earlier wordings stand in the trail. */
export const GuardAnswerSchema = defineEntity({
  name: 'GuardAnswer',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    calcId: p.uuid(),
    guardKey: p.text(),
    kind: p.text().$type<'answer' | 'deviation'>(),
    text: p.text(),
    /** The condition it was given at: the answer lapses when it moves. */
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
