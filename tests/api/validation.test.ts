import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import type { ValidationReport } from '#shared/schemas/validation'
import { makeTeam, password } from '../factories/people'
import { referenceRows } from '../reference/rows'
import { Client } from './client'
import { useServerEnvironment } from './environment'

let orm: MikroORM
let outsider: Client

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  const team = await makeTeam(orm)
  outsider = new Client()
  await outsider.signIn(team.outsider.email, password)
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

describe('the built server', () => {
  it('judges every reference case off the event loop and fails none; whoever is signed in may read it', async () => {
    const done = await vi.waitUntil(async () => {
      const { body } = await outsider.get<ValidationReport & Record<string, unknown>>('/api/validation')
      return body.state === 'running' ? false : body
    }, { timeout: 60_000, interval: 250 })
    expect(done).toMatchObject({ state: 'done', cases: referenceRows.length, judged: referenceRows.length, failed: 0, reason: null, finishedAt: expect.any(String) })
    expect(done.rows.filter(row => !row.agrees)).toEqual([])
    expect(done.chapters.reduce((sum, chapter) => sum + chapter.cases, 0)).toBe(referenceRows.length)
  })

  it('says the count with its health, to whoever asks', async () => {
    expect((await new Client().get('/api/health')).body).toMatchObject({ ok: true, validation: { state: 'done', cases: referenceRows.length, failed: 0 } })
  })
})
