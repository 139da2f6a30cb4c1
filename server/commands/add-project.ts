import { randomUUID } from 'node:crypto'
import type { AddProject } from '#shared/schemas/people'
import { projectChain, recordAct } from '#server/audit/record'
import { ProjectSchema, type Project } from '#server/database/entities/project'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

export function addProject(context: CommandContext, input: AddProject): Promise<Project> {
  const id = randomUUID()
  const name = { chain: projectChain(id), act: 'add project', subject: { type: 'project', id, label: input.code } }
  return runCommand(context, name, async (inside) => {
    const { em, clock } = inside
    if (await em.count(ProjectSchema, { code: input.code })) {
      throw new DomainError('taken', 'A project with this code exists already.', { fields: { code: 'Choose another code.' } })
    }
    const project = em.create(ProjectSchema, { id, ...input, nextNumber: 1, createdAt: clock() })
    await em.flush()
    await recordAct(inside, { ...name, new: input })
    return project
  })
}
