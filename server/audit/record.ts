import { createHash, randomUUID } from 'node:crypto'
import { LockMode } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { canonicalJson } from '#shared/note/canonical'
import { TrailHeadSchema } from '#server/database/entities/trail-head'
import { TrailRowSchema, type TrailRow } from '#server/database/entities/trail-row'

export interface ActSubject { type: string, id: string, label: string }
export interface Act {
  chain: string
  act: string
  subject: ActSubject
  outcome?: 'done' | 'refused'
  old?: unknown
  new?: unknown
  reason?: string | null
}

export const noteChain = (noteId: string) => `note:${noteId}`
export const projectChain = (projectId: string) => `project:${projectId}`
export const systemChain = 'system'
export const firstHash = '0'.repeat(64)

type Hashed = Omit<TrailRow, 'hash' | 'at' | 'id'> & { at: Date }

/** SHA-256 over a domain byte, the hash before and the canonical JSON of every field. */
export function rowHash(row: Hashed): string {
  const fields = {
    chain: row.chain, seq: row.seq, at: row.at.toISOString(), actorId: row.actorId ?? null, act: row.act, outcome: row.outcome,
    subjectType: row.subjectType, subjectId: row.subjectId, subjectLabel: row.subjectLabel,
    old: row.old ?? null, new: row.new ?? null, reason: row.reason ?? null,
  }
  return createHash('sha256').update(Buffer.from([1])).update(row.previousHash).update(canonicalJson(fields)).digest('hex')
}

const asText = (value: unknown) => value === undefined || value === null ? null : canonicalJson(value)

/**
 * Appends one row to a chain, in the transaction of the act. The head row is
 * locked, so numbers have no gap and two acts of one note wait for each other.
 * The actor is the context's: the type takes none.
 */
export async function recordAct(context: { em: EntityManager, actor: { id: string } | null, clock: () => Date }, act: Act): Promise<void> {
  const { em } = context
  await em.execute('insert into trail_head (chain, seq, hash) values (?, 0, ?) on conflict do nothing', [act.chain, firstHash])
  const head = await em.findOneOrFail(TrailHeadSchema, { chain: act.chain }, { lockMode: LockMode.PESSIMISTIC_WRITE, refresh: true })
  const row = {
    chain: act.chain, seq: head.seq + 1, at: context.clock(), actorId: context.actor?.id ?? null,
    act: act.act, outcome: act.outcome ?? 'done' as const,
    subjectType: act.subject.type, subjectId: act.subject.id, subjectLabel: act.subject.label,
    old: asText(act.old), new: asText(act.new), reason: act.reason ?? null, previousHash: head.hash,
  }
  const hash = rowHash(row)
  em.create(TrailRowSchema, { id: randomUUID(), ...row, hash })
  head.seq = row.seq
  head.hash = hash
  await em.flush()
}
