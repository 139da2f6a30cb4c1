import type { Issue } from '#server/database/entities/issue'
import { LeaseSchema, type Lease } from '#server/database/entities/lease'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

const patience = 2 * 60_000

/** Who holds the pen now, or null. */
export async function penHolder({ em, clock }: Pick<CommandContext, 'em' | 'clock'>, issue: Issue): Promise<Lease | null> {
  return em.findOne(LeaseSchema, { issue, until: { $gt: clock() } }, { populate: ['person'], refresh: true })
}

/** Takes or keeps the pen for two minutes; each save and each sign of life renews it. @throws DomainError pen-held */
export async function takePen(context: CommandContext, issue: Issue): Promise<Lease> {
  const { em, actor, clock } = context
  const held = await penHolder(context, issue)
  if (held && held.person.id !== actor.id) throw new DomainError('pen-held', `${held.person.name} is writing. You can read along, and write when the pen is free.`)
  const until = new Date(clock().getTime() + patience)
  await em.execute('insert into lease (issue_id, person_id, until) values (?, ?, ?) on conflict (issue_id) do update set person_id = excluded.person_id, until = excluded.until', [issue.id, actor.id, until])
  return em.findOneOrFail(LeaseSchema, { issue }, { populate: ['person'], refresh: true })
}

/** Lays the pen down, if the actor holds it. */
export async function layPen({ em, actor }: CommandContext, issue: Issue): Promise<void> {
  await em.nativeDelete(LeaseSchema, { issue, person: actor })
}
