import { defineEntity, type InferEntity } from '@mikro-orm/core'
import { PersonSchema } from './person'
import { ProjectSchema } from './project'

export type ProjectRole = 'analyst' | 'checker' | 'approver'

/** One row per project, person and role. */
export const ProjectMemberSchema = defineEntity({
  name: 'ProjectMember',
  properties: p => ({
    id: p.uuid().primary(),
    project: () => p.manyToOne(ProjectSchema),
    person: () => p.manyToOne(PersonSchema),
    role: p.text().$type<ProjectRole>(),
    since: p.datetime(),
  }),
  uniques: [{ properties: ['project', 'person', 'role'] }],
})
export type ProjectMember = InferEntity<typeof ProjectMemberSchema>
