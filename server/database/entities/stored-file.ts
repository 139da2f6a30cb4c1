import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { IssueSchema } from './issue'
import { PersonSchema } from './person'

/** A file in object storage: figures, attachments of remarks, PDFs. Seen by whoever may see its issue. */
export const StoredFileSchema = defineEntity({
  name: 'StoredFile',
  properties: p => ({
    id: p.uuid().primary(),
    issue: () => p.manyToOne(IssueSchema),
    purpose: p.text().$type<'figure' | 'attachment' | 'released-pdf' | 'draft-pdf'>(),
    name: p.text(),
    mime: p.text(),
    size: p.integer(),
    sha256: p.text(),
    /** Pixels, for figures. */
    width: p.integer().nullable(),
    height: p.integer().nullable(),
    storageKey: p.text(),
    uploadedBy: () => p.manyToOne(PersonSchema).nullable(),
    at: p.datetime(),
  }),
})
export type StoredFile = InferEntity<typeof StoredFileSchema>
