import { randomUUID } from 'node:crypto'
import type { SetMember } from '#shared/schemas/people'
import { projectChain, recordAct } from '#server/audit/record'
import { PersonSchema } from '#server/database/entities/person'
import { ProjectSchema } from '#server/database/entities/project'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import { runCommand, type CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

/** Gives a person exactly these roles in a project; none takes them out of it. Signatures given stand. */
export function setMember(context: CommandContext, projectId: string, { personId, roles }: SetMember): Promise<void> {
  const name = { chain: projectChain(projectId), act: 'set member', subject: { type: 'project', id: projectId, label: projectId } }
  return runCommand(context, name, async (inside) => {
    const { em, actor, clock } = inside
    if (personId === actor.id) throw new DomainError('not-allowed', 'Nobody changes their own roles; ask another administrator.')
    const project = await em.findOne(ProjectSchema, { id: projectId })
    const person = await em.findOne(PersonSchema, { id: personId })
    if (!project || !person) throw new DomainError('not-found', 'There is no such project or person.')
    const held = await em.find(ProjectMemberSchema, { project, person })
    const old = held.map(m => m.role).sort()
    for (const member of held) if (!roles.includes(member.role)) em.remove(member)
    for (const role of new Set(roles)) {
      if (!old.includes(role)) em.create(ProjectMemberSchema, { id: randomUUID(), project, person, role, since: clock() })
    }
    await em.flush()
    await recordAct(inside, { ...name, subject: { ...name.subject, label: `${project.code}: ${person.name}` }, old: { person: personId, roles: old }, new: { person: personId, roles: [...roles].sort() } })
  })
}
