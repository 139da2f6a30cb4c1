import type { EntityManager } from '@mikro-orm/postgresql'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import type { CommandContext } from '#server/utils/command-context'
import type { DemoClock } from './demo-clock'
import type { DemoRemark } from './demo-note'
import type { PersonKey } from './people'
import type { Cast } from './set-up'

/** Makes the PDF of a release that was asked for, as the worker does. */
export type MakeRelease = (job: { issueId: string, signatureId: string }, clock: () => Date) => Promise<void>

/** What the acts of the story work with. */
export interface Stage {
  em: EntityManager
  time: DemoClock
  cast: Cast
  password: string
  makeRelease: MakeRelease
  /** The issue that is on its way, by the number of its note. */
  issues: Map<string, string>
  /** The remarks made so far. */
  remarks: Map<DemoRemark, string>
}

/** A command's context for a person at a moment of the story; every act has an entity manager of its own. */
export function contextOf({ em, cast, time }: Stage, by: PersonKey, at: string): CommandContext {
  return { em: em.fork(), actor: cast.people[by], clock: () => time.at(at) }
}

export function issueIdOf(stage: Stage, number: string): string {
  const id = stage.issues.get(number)
  if (id === undefined) throw new Error(`${number} has not begun yet`)
  return id
}

/** The issue on its way, fresh from the database. */
export function issueOf(stage: Stage, number: string): Promise<Issue> {
  return stage.em.fork().findOneOrFail(IssueSchema, { id: issueIdOf(stage, number) }, { populate: ['note'] })
}

/** What a person sees when they press a verb. */
export const expectOf = ({ state, saveNumber }: Issue) => ({ state, save: saveNumber })
