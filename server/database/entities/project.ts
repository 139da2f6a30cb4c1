import { defineEntity, type InferEntity } from '@mikro-orm/core'

export const ProjectSchema = defineEntity({
  name: 'Project',
  properties: p => ({
    id: p.uuid().primary(),
    code: p.text().unique(),
    name: p.text(),
    /** Pattern of note numbers; the run of zeros in braces counts up: `QSN-19-{0000}`. */
    notePattern: p.text(),
    nextNumber: p.integer().default(1),
    /** Certification basis, as quoted on covers. */
    basis: p.text(),
    /** Structural criteria: factors and policies in force. */
    criteria: p.text(),
    createdAt: p.datetime(),
  }),
})
export type Project = InferEntity<typeof ProjectSchema>
