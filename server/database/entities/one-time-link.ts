import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { PersonSchema } from './person'

/** A link to set a password with, once. Only the hash of its token is kept. */
export const OneTimeLinkSchema = defineEntity({
  name: 'OneTimeLink',
  properties: p => ({
    id: p.uuid().primary(),
    person: () => p.manyToOne(PersonSchema),
    tokenHash: p.text().unique(),
    purpose: p.text().$type<'invitation' | 'forgotten'>(),
    createdAt: p.datetime(),
    expiresAt: p.datetime(),
    usedAt: p.datetime().nullable(),
  }),
})
export type OneTimeLink = InferEntity<typeof OneTimeLinkSchema>
