/** npm run db:backup, then npm run db:restore into an empty cluster: everything is there, and the trail still holds. */
import { spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'
import { verifyChain } from '#server/audit/verify'
import { TrailHeadSchema } from '#server/database/entities/trail-head'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { rebuildSave } from '#server/notes/rebuild-save'
import { freePort } from '../../server/cli/cluster.mjs'
import { commandOf, environmentOf, startServices } from '../../server/cli/services.mjs'
import { run } from '../../server/cli/shell.mjs'
import { startThrowAway } from '../../server/cli/throw-away.mjs'
import { pixel, uploadTo } from '../factories/act-requests'
import { inCheck, issueOf, type Team } from '../factories/note-on-its-way'
import { makeTeam, password } from '../factories/people'
import { Client } from './client'
import { useServerEnvironment } from './environment'

const folder = mkdtempSync(join(tmpdir(), 'torquill-backup-'))
const otherData = mkdtempSync(join(tmpdir(), 'torquill-restored-'))
let orm: MikroORM
let restored: MikroORM
let empty: { application: string, owner: string, stop: () => void }
let team: Team
let issueId: string
let fileId: string

/** A command of package.json as the terminal runs it. */
const cli = (name: string, to: string, env: Record<string, string>) =>
  spawnSync(process.execPath, [new URL(`../../server/cli/${name}.mjs`, import.meta.url).pathname, to], { encoding: 'utf8', env: { ...process.env, ...env } })
const tablesOf = async (database: MikroORM) => {
  const rows = await database.em.fork().execute<{ name: string }[]>('select tablename as name from pg_tables where schemaname = \'public\' and has_table_privilege(current_user, format(\'%I.%I\', schemaname, tablename), \'select\') order by 1')
  return Object.fromEntries(await Promise.all(rows.map(async ({ name }) => {
    const [row] = await database.em.fork().execute<{ hash: string }[]>(`select count(*) || ' ' || coalesce(md5(string_agg(t::text, '' order by t::text)), '') as hash from ${name} t`)
    return [name, row?.hash]
  })))
}

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  issueId = (await inCheck(orm, team)).id
  const checker = new Client()
  await checker.signIn(team.checker.email, password)
  fileId = (await uploadTo(checker, `/api/issues/${issueId}/files?purpose=attachment`, pixel)).body.id
  empty = await startThrowAway(`restore-${process.pid}`)
})
afterAll(async () => {
  await closeQueue()
  await restored?.close()
  await orm.close()
  empty?.stop()
  for (const path of [folder, otherData]) rmSync(path, { recursive: true, force: true })
})

describe('a backup', () => {
  it('is one folder, and is restored into an empty database, row by row', async () => {
    const { ownerUrl, dataDir, build } = inject('running')
    const made = cli('backup', folder, { DATABASE_OWNER_URL: ownerUrl, TORQUILL_DATA_DIR: dataDir })
    expect(made.stdout + made.stderr).toContain(`Backup in ${folder}`)
    expect(existsSync(join(folder, 'database.dump'))).toBe(true)
    const done = cli('restore', folder, { DATABASE_OWNER_URL: empty.owner, TORQUILL_DATA_DIR: otherData })
    expect(done.stdout + done.stderr).toContain('Restored.')
    expect(run(process.execPath, commandOf(build, 'migrate'), { env: { ...process.env, DATABASE_URL: empty.application, DATABASE_OWNER_URL: empty.owner } })).toContain('newest already')
    restored = await connect(empty.application)
    const then = await tablesOf(restored)
    expect(Object.keys(then)).toContain('trail_row')
    // The running worker may write mail meanwhile; everything else stands still.
    const now = await tablesOf(orm)
    for (const name of Object.keys(now).filter(table => table !== 'mail')) expect([name, then[name]]).toEqual([name, now[name]])
  })

  it('keeps every chain of the trail, every save and every refusal of the database', async () => {
    const heads = await restored.em.fork().find(TrailHeadSchema, {})
    expect(heads.length).toBeGreaterThan(1)
    for (const { chain, seq } of heads) expect(await verifyChain(restored.em, chain)).toMatchObject({ ok: true, rows: seq })
    const { saveNumber, documentHash } = await issueOf(restored, issueId)
    expect(await rebuildSave(restored.em.fork(), issueId, saveNumber)).toMatchObject({ hash: documentHash })
    for (const sql of ['update trail_row set act = \'x\'', 'delete from save', 'delete from issue']) {
      await expect(restored.em.fork().execute(sql), sql).rejects.toMatchObject({ code: '42501' })
    }
  })

  it('runs: the same people sign in, and read the same note and file', async () => {
    const { build, authSecret } = inject('running')
    const port = await freePort()
    const baseUrl = `http://127.0.0.1:${port}`
    const services = await startServices(build, environmentOf({ databaseUrl: empty.application, baseUrl, authSecret, dataDir: otherData, smtpUrl: 'smtp://127.0.0.1:9' }), { port })
    try {
      const checker = new Client(baseUrl)
      expect((await checker.signIn(team.checker.email, password)).ok).toBe(true)
      expect((await checker.get(`/api/issues/${issueId}`)).body).toMatchObject({ state: 'in check', save: (await issueOf(orm, issueId)).saveNumber })
      expect(Buffer.from(await (await checker.raw('GET', `/files/${fileId}`)).arrayBuffer()).equals(pixel)).toBe(true)
    } finally {
      await services.stop()
    }
  })

  it('is not restored over a database that holds something', () => {
    const { ownerUrl, dataDir } = inject('running')
    const refused = cli('restore', folder, { DATABASE_OWNER_URL: ownerUrl, TORQUILL_DATA_DIR: dataDir })
    expect(refused.status).toBe(1)
    expect(refused.stdout).toContain('not empty')
    expect(cli('restore', otherData, { DATABASE_OWNER_URL: empty.owner }).stdout).toContain('Usage')
  })
})
