import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { recordAct } from '#server/audit/record'
import { verifyChain } from '#server/audit/verify'
import { connect } from '#server/database/orm'
import { useServerEnvironment } from './environment'

let application: MikroORM
let owner: MikroORM
const clock = () => new Date()

beforeAll(async () => {
  const running = useServerEnvironment()
  application = await connect(running.databaseUrl)
  owner = await connect(running.ownerUrl)
})
afterAll(async () => {
  await application.close()
  await owner.close()
})

/** A chain of its own with `n` rows. */
async function chainOf(n: number) {
  const chain = `note:${randomUUID()}`
  for (let i = 1; i <= n; i++) {
    await application.em.fork().transactional(em => recordAct({ em, actor: null, clock }, {
      chain, act: 'test', subject: { type: 'test', id: String(i), label: `row ${i}` }, old: { a: i }, new: { é: 'σ ≤ τ', b: [1.5e-7, null] },
    }))
  }
  return chain
}

/** What only a superuser could do: the triggers are taken away first, as somebody tampering would. */
async function tamper(sql: string, chain: string) {
  const em = owner.em.fork()
  await em.execute('alter table trail_row disable trigger trail_row_insert_only')
  await em.execute(sql, [chain])
  await em.execute('alter table trail_row enable always trigger trail_row_insert_only')
}

describe('the chain', () => {
  it('holds, and counts its rows', async () => {
    expect(await verifyChain(application.em, await chainOf(5))).toMatchObject({ ok: true, rows: 5, firstBad: null })
  })

  it.each([
    ['an altered act', `update trail_row set act = 'other' where seq = 3 and chain = ?`, 3],
    ['an altered new value', `update trail_row set new = replace(new, 'null', '0') where seq = 2 and chain = ?`, 2],
    ['a moved time', `update trail_row set at = at + interval '1 second' where seq = 4 and chain = ?`, 4],
    ['a missing row', `delete from trail_row where seq = 3 and chain = ?`, 3],
    ['a cut tail', `delete from trail_row where seq >= 4 and chain = ?`, 4],
  ])('tells %s', async (_, sql, firstBad) => {
    const chain = await chainOf(5)
    await tamper(sql, chain)
    expect(await verifyChain(application.em, chain)).toMatchObject({ ok: false, firstBad })
  })

  it('numbers twenty acts at once without a gap', async () => {
    const chain = await chainOf(1)
    await Promise.all(Array.from({ length: 20 }, () => application.em.fork().transactional(em => recordAct({ em, actor: null, clock }, {
      chain, act: 'test', subject: { type: 'test', id: '1', label: 'at once' },
    }))))
    expect(await verifyChain(application.em, chain)).toMatchObject({ ok: true, rows: 21 })
  })

  it('takes its row back when the act fails', async () => {
    const chain = await chainOf(1)
    await expect(application.em.fork().transactional(async (em) => {
      await recordAct({ em, actor: null, clock }, { chain, act: 'test', subject: { type: 'test', id: '1', label: 'never' } })
      throw new Error('undone')
    })).rejects.toThrow('undone')
    expect(await verifyChain(application.em, chain)).toMatchObject({ ok: true, rows: 1 })
  })
})

describe('the application\'s role', () => {
  it.each([
    'update trail_row set act = \'x\'', 'delete from trail_row', 'truncate trail_row', 'delete from save', 'update save set document_hash = \'x\'',
    'delete from issue', 'delete from signature', 'delete from person', 'alter table trail_row disable trigger all', 'drop table trail_row',
    'set session_replication_role = replica', 'update issue_part set part = \'checker\'', 'create table mine (a int)',
  ])('may not: %s', async (sql) => {
    await expect(application.em.fork().execute(sql)).rejects.toMatchObject({ code: '42501' })
  })

  it('owns nothing', async () => {
    const [row] = await application.em.fork().execute<{ n: string }[]>('select count(*) as n from pg_tables where tableowner = current_user')
    expect(Number(row?.n)).toBe(0)
  })
})

describe('the owner\'s role', () => {
  it('meets the triggers too', async () => {
    const chain = await chainOf(1)
    await expect(owner.em.fork().execute('update trail_row set act = \'x\' where chain = ?', [chain])).rejects.toMatchObject({ code: '42501' })
    await expect(owner.em.fork().execute('truncate trail_row')).rejects.toMatchObject({ code: '42501' })
  })
})
