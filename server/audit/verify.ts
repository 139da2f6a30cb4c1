import type { EntityManager } from '@mikro-orm/postgresql'
import { TrailHeadSchema } from '#server/database/entities/trail-head'
import { TrailRowSchema } from '#server/database/entities/trail-row'
import { firstHash, rowHash } from './record'

export interface ChainVerdict {
  ok: boolean
  rows: number
  /** Number of the first row that does not hold, or null. */
  firstBad: number | null
  /** What is wrong there, in a sentence. */
  fault: string | null
  head: string
}

const page = 1000

/** Recomputes a chain from its first row and compares it with its head. */
export async function verifyChain(em: EntityManager, chain: string): Promise<ChainVerdict> {
  let previous = firstHash
  let seen = 0
  for (;;) {
    const rows = await em.fork().find(TrailRowSchema, { chain, seq: { $gt: seen } }, { orderBy: { seq: 'asc' }, limit: page })
    for (const row of rows) {
      const fault = row.seq !== seen + 1
        ? `row ${seen + 1} is missing`
        : row.previousHash !== previous
          ? `row ${row.seq} does not follow from the row before it`
          : rowHash(row) !== row.hash ? `row ${row.seq} was altered` : null
      if (fault) return { ok: false, rows: seen, firstBad: seen + 1, fault, head: previous }
      previous = row.hash
      seen = row.seq
    }
    if (rows.length < page) break
  }
  const head = await em.fork().findOne(TrailHeadSchema, { chain })
  const whole = (head?.seq ?? 0) === seen && (head?.hash ?? firstHash) === previous
  return { ok: whole, rows: seen, firstBad: whole ? null : seen + 1, fault: whole ? null : `rows after ${seen} are missing`, head: previous }
}
