import type { EntityManager } from '@mikro-orm/postgresql'
import { AttemptSchema } from '#server/database/entities/attempt'
import { DomainError } from '#server/utils/domain-error'

const window = 15 * 60_000
/** Failures within the window before a key is blocked for the rest of it. */
const patience = { 'sign-in': 5, 'address': 40, 'signing': 5, 'forgotten': 5 } as const
export type ThrottleKind = keyof typeof patience

const keyOf = (kind: ThrottleKind, who: string) => `${kind}:${who}`

/** @throws DomainError throttled, with the minutes to wait. */
export async function refuseIfThrottled(em: EntityManager, kind: ThrottleKind, who: string, now: Date): Promise<void> {
  const found = await em.fork().findOne(AttemptSchema, { key: keyOf(kind, who) })
  if (!found?.blockedUntil || found.blockedUntil <= now) return
  const minutes = Math.ceil((found.blockedUntil.getTime() - now.getTime()) / 60_000)
  throw new DomainError('throttled', `Too many tries. Wait ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}, then try again.`, { details: { minutes } })
}

/** Counts a failure, in a transaction of its own so that a refused act does not take it back. */
export async function countFailure(em: EntityManager, kind: ThrottleKind, who: string, now: Date): Promise<void> {
  await em.fork().execute(`
    insert into attempt as a (key, failures, window_start, blocked_until) values (?, 1, ?, null)
    on conflict (key) do update set
      failures = case when a.window_start < ? then 1 else a.failures + 1 end,
      window_start = case when a.window_start < ? then excluded.window_start else a.window_start end,
      blocked_until = case when a.window_start >= ? and a.failures + 1 >= ? then cast(? as timestamptz) else null end`,
  [keyOf(kind, who), now, new Date(now.getTime() - window), new Date(now.getTime() - window), new Date(now.getTime() - window), patience[kind], new Date(now.getTime() + window)])
}

export async function clearFailures(em: EntityManager, kind: ThrottleKind, who: string): Promise<void> {
  await em.fork().nativeDelete(AttemptSchema, { key: keyOf(kind, who) })
}
