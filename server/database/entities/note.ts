import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { PersonSchema } from './person'
import { ProjectSchema } from './project'

export const NoteSchema = defineEntity({
  name: 'Note',
  properties: p => ({
    id: p.uuid().primary(),
    number: p.text().unique(),
    project: () => p.manyToOne(ProjectSchema),
    createdBy: () => p.manyToOne(PersonSchema),
    createdAt: p.datetime(),
  }),
})
export type Note = InferEntity<typeof NoteSchema>
