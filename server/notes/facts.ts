import type { EntityManager } from '@mikro-orm/postgresql'
import { refusalOf, abilities } from '#shared/review/abilities'
import { contributedTo, partIn } from '#shared/review/eligibility'
import type { Refusal, RefusalKind, ReviewFacts } from '#shared/review/facts'
import { compareLetters } from '#shared/review/letters'
import { isOnItsWay, wasReleased } from '#shared/review/states'
import { moveOf } from '#shared/review/transitions'
import type { Abilities, Act } from '#shared/schemas/issue-view'
import type { Issue } from '#server/database/entities/issue'
import type { Person } from '#server/database/entities/person'
import { ProjectMemberSchema } from '#server/database/entities/project-member'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError, type ErrorCode } from '#server/utils/domain-error'
import { penHolder } from './pen'
import { remainingNow, type RemainingNow } from './remaining-now'
import { loadStanding, type Standing } from './standing'

const nothing: RemainingNow = { submit: [], pass: [], release: [] }

type Asker = Pick<CommandContext, 'em' | 'clock'> & { actor: Person }

const codeOf: Record<RefusalKind, ErrorCode> = {
  hidden: 'not-found', role: 'not-allowed', part: 'not-eligible', state: 'wrong-state', locked: 'wrong-state', pen: 'pen-held', remains: 'something-remains',
}

const rolesIn = async (em: EntityManager, projectId: string, personId: string) =>
  (await em.find(ProjectMemberSchema, { project: projectId, person: personId })).map(m => m.role)

/** The facts on which every decision about this issue and this person rests, read from the database now. */
export async function reviewFacts({ em, actor, clock }: Asker, standing: Standing, remaining: RemainingNow): Promise<ReviewFacts> {
  const { issue, issues, parts } = standing
  const lines = issues.map(({ letter, state }) => ({ letter, state }))
  const partLines = parts.map(p => ({ letter: issues.find(i => i.id === p.issue.id)?.letter ?? '', personId: p.person.id, part: p.part }))
  const holder = await penHolder({ em, clock }, issue)
  const released = issues.filter(i => wasReleased(i.state)).map(i => i.letter).sort(compareLetters)
  return {
    issue: {
      letter: issue.letter, state: issue.state, releasing: Boolean(issue.releaseRequestedAt) && issue.state === 'for approval',
      analystId: issue.analyst?.id ?? null, checkerId: issue.checker?.id ?? null, approverId: issue.approver?.id ?? null,
      checkerName: issue.checker?.name ?? null, approverName: issue.approver?.name ?? null,
    },
    note: { onItsWay: issues.find(i => isOnItsWay(i.state))?.letter ?? null, newestReleased: released.at(-1) ?? null },
    person: {
      id: actor.id, disabled: Boolean(actor.disabledAt), auditor: actor.auditor, administrator: actor.administrator,
      roles: await rolesIn(em, issue.note.project.id, actor.id),
      part: partIn(actor.id, issue.letter, partLines), contributedTo: contributedTo(actor.id, issue.letter, lines, partLines),
    },
    writer: holder && { id: holder.person.id, name: holder.person.name },
    remaining: { submit: remaining.submit.length, pass: remaining.pass.length, release: remaining.release.length },
  }
}

export async function abilitiesOf(asker: Asker, standing: Standing, remaining: RemainingNow): Promise<Abilities> {
  return abilities(await reviewFacts(asker, standing, remaining))
}

/** What remains is named in the refusal, so that who asks by other ways than the screens reads it too. */
function refused(act: Act, refusal: Refusal, remaining: RemainingNow): DomainError {
  const left = refusal.kind === 'remains' && (act === 'submit' || act === 'pass' || act === 'release') ? remaining[act] : []
  const message = left.length ? `${refusal.why} (${left.map(r => r.text).join('; ')})` : refusal.why
  return new DomainError(codeOf[refusal.kind], message, left.length ? { details: { remaining: left } } : {})
}

/** Refuses unless one of the acts can be done now. @throws DomainError with the sentence of the first act */
export async function requireAbility(context: CommandContext, issue: Issue, acts: [Act, ...Act[]]): Promise<Standing> {
  const standing = await loadStanding(context.em, issue)
  // What remains takes a scan of the whole text; most acts do not rest on it.
  const remaining = acts.some(act => moveOf(issue.state, act)?.needs.includes('complete')) ? remainingNow(standing) : nothing
  const facts = await reviewFacts(context, standing, remaining)
  const refusals = acts.map(act => refusalOf(act, facts))
  const first = refusals[0]
  if (first && refusals.every(Boolean)) throw refused(acts[0], first, remaining)
  return standing
}
