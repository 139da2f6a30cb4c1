import type { EntityManager } from '@mikro-orm/postgresql'
import { PersonSchema } from '#server/database/entities/person'
import { demoClock } from './demo-clock'
import { DEMO_PASSWORD } from './people'
import { play } from './play'
import { DEMO_NOTES } from './scenario'
import { setUpCast } from './set-up'
import type { MakeRelease } from './stage'

export interface SeedOptions {
  em: EntityManager
  /** The real present: the story is moved back when it would lie ahead of it. */
  now: Date
  makeRelease: MakeRelease
}

/**
 * Tells the demonstration's story through the commands that people use. Does
 * nothing and answers false where there is anybody already: it is told once.
 */
export async function seedDemo({ em, now, makeRelease }: SeedOptions): Promise<boolean> {
  if (await em.fork().count(PersonSchema) > 0) return false
  const time = demoClock(now)
  const cast = await setUpCast(em, time, DEMO_PASSWORD)
  await play({ em, time, cast, password: DEMO_PASSWORD, makeRelease, issues: new Map(), remarks: new Map() }, DEMO_NOTES)
  return true
}
