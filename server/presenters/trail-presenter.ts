import type { EntityManager } from '@mikro-orm/postgresql'
import type { TrailQuery } from '#shared/schemas/notes'

interface Row {
  chain: string, seq: number, at: Date, actor_id: string | null, actor: string | null, act: string, outcome: 'done' | 'refused'
  subject_type: string, subject_id: string, subject_label: string, old: string | null, new: string | null, reason: string | null
  hash: string, chain_label: string | null, total: string
}

const label = `case when t.chain = 'system' then 'people and sign-in'
  else coalesce((select number from note where 'note:' || id = t.chain), (select code from project where 'project:' || id = t.chain)) end`

function conditions(query: TrailQuery) {
  const where: string[] = []
  const values: unknown[] = []
  const add = (sql: string, ...more: unknown[]) => {
    where.push(sql)
    values.push(...more)
  }
  if (query.chain) add('t.chain = ?', query.chain)
  if (query.actor) add('t.actor_id = ?', query.actor)
  if (query.act) add('t.act = ?', query.act)
  if (query.outcome) add('t.outcome = ?', query.outcome)
  if (query.from) add('t.at >= ?', `${query.from}T00:00:00Z`)
  if (query.to) add('t.at < cast(? as timestamptz) + interval \'1 day\'', `${query.to}T00:00:00Z`)
  if (query.q) add('(t.subject_label ilike ? or t.reason ilike ?)', `%${query.q}%`, `%${query.q}%`)
  return { where: where.length ? `where ${where.join(' and ')}` : '', values }
}

/** Rows of the trail, newest first; people by name, resolved apart from what is hashed. */
export async function presentTrail(em: EntityManager, query: TrailQuery) {
  const { where, values } = conditions(query)
  const rows = await em.execute<Row[]>(`
    select t.*, p.name as actor, ${label} as chain_label, count(*) over () as total
    from trail_row t left join person p on p.id = t.actor_id
    ${where} order by t.at desc, t.chain, t.seq desc limit ? offset ?`, [...values, query.size, (query.page - 1) * query.size])
  const items = rows.map(row => ({
    seq: row.seq, chain: row.chain, chainLabel: row.chain_label ?? row.chain, at: new Date(row.at).toISOString(),
    actor: row.actor_id ? { id: row.actor_id, name: row.actor ?? 'unknown' } : null, act: row.act, outcome: row.outcome,
    subject: { type: row.subject_type, id: row.subject_id, label: row.subject_label },
    old: row.old, new: row.new, reason: row.reason, hash: row.hash,
  }))
  return { items, total: Number(rows[0]?.total ?? 0), page: query.page, size: query.size }
}

/** Every chain with its length, the acts that occur and who acted, for the filter. */
export async function presentChains(em: EntityManager) {
  const chains = await em.execute<{ chain: string, seq: number, label: string | null }[]>(`select t.chain, t.seq, ${label} as label from trail_head t order by label`)
  const acts = await em.execute<{ act: string }[]>('select distinct act from trail_row order by act')
  const actors = await em.execute<{ id: string, name: string }[]>('select id, name from person p where exists (select 1 from trail_row where actor_id = p.id) order by name')
  return { actors, chains: chains.map(c => ({ chain: c.chain, label: c.label ?? c.chain, rows: c.seq })), acts: acts.map(a => a.act) }
}
