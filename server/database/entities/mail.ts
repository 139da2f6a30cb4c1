import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { PersonSchema } from './person'

/** A message to send, written with the act that causes it. One per event and recipient. */
export const MailSchema = defineEntity({
  name: 'Mail',
  properties: p => ({
    id: p.uuid().primary(),
    event: p.text(),
    template: p.text(),
    recipient: () => p.manyToOne(PersonSchema),
    props: p.json<Record<string, unknown>>(),
    createdAt: p.datetime(),
    sentAt: p.datetime().nullable(),
  }),
  uniques: [{ properties: ['event', 'recipient'] }],
})
export type Mail = InferEntity<typeof MailSchema>
