import { defineEntity, type InferEntity } from '@mikro-orm/core'

/** Someone who signs in. Never deleted and never given to another: disabled people keep their e-mail for good. */
export const PersonSchema = defineEntity({
  name: 'Person',
  properties: p => ({
    id: p.uuid().primary(),
    /** Lower case, unique for ever. */
    email: p.text().unique(),
    name: p.text(),
    /** argon2id. Presenters never read it. */
    passwordHash: p.text().nullable(),
    auditor: p.boolean().default(false),
    administrator: p.boolean().default(false),
    disabledAt: p.datetime().nullable(),
    /** Raised to end every session of this person at the next request. */
    sessionEpoch: p.integer().default(0),
    createdAt: p.datetime(),
  }),
})
export type Person = InferEntity<typeof PersonSchema>
