import { defineEntity, type InferEntity } from '@mikro-orm/core'

/** Failed sign-ins and signings, counted per key (`sign-in:address`, `sign-in:e-mail`, `signing:person`). */
export const AttemptSchema = defineEntity({
  name: 'Attempt',
  properties: p => ({
    key: p.text().primary(),
    failures: p.integer(),
    windowStart: p.datetime(),
    blockedUntil: p.datetime().nullable(),
  }),
})
export type Attempt = InferEntity<typeof AttemptSchema>
