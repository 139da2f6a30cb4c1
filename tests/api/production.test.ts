/** npm run start:production and npm run admin:create, run as they are: what they refuse, and what they bring up. */
import { execFile, spawn, spawnSync, type ChildProcess } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, inject, it, vi } from 'vitest'
import { connect } from '#server/database/orm'
import { freePort } from '../../server/cli/cluster.mjs'
import { stop } from '../../server/cli/shell.mjs'
import { startThrowAway } from '../../server/cli/throw-away.mjs'
import { Client } from './client'

const path = (name: string) => new URL(`../../server/cli/${name}.mjs`, import.meta.url).pathname
const dataDir = mkdtempSync(join(tmpdir(), 'torquill-production-'))
let database: { application: string, owner: string, stop: () => void }
let env: Record<string, string>
let child: ChildProcess | undefined

beforeAll(async () => {
  database = await startThrowAway(`production-${process.pid}`)
  const port = await freePort()
  env = {
    DATABASE_URL: database.application, DATABASE_OWNER_URL: database.owner, NUXT_AUTH_SECRET: 'a-secret-for-tests-only-0123456789', PORT: String(port),
    TORQUILL_BASE_URL: `http://127.0.0.1:${port}`, SMTP_URL: 'smtp://127.0.0.1:9', TORQUILL_DATA_DIR: dataDir, TORQUILL_BUILD: inject('running').build,
  }
})
afterAll(async () => {
  await stop(child)
  database.stop()
  rmSync(dataDir, { recursive: true, force: true })
})

/** The environment with nothing of the test server in it. */
const bare = () => Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^(DATABASE|TORQUILL|NUXT|SMTP|PORT)/.test(name)))
const tried = (change: Record<string, string | undefined>) =>
  spawnSync(process.execPath, [path('production')], { encoding: 'utf8', timeout: 50_000, env: Object.fromEntries(Object.entries({ ...bare(), ...env, ...change }).filter(([, value]) => value !== undefined)) })

describe('start:production', () => {
  it.each(['DATABASE_URL', 'DATABASE_OWNER_URL', 'NUXT_AUTH_SECRET', 'TORQUILL_BASE_URL', 'SMTP_URL', 'TORQUILL_DATA_DIR'])('refuses to start without %s, and names it', (name) => {
    const { status, stdout } = tried({ [name]: undefined })
    expect(status).toBe(1)
    expect(stdout).toContain(`Set these first: ${name}.`)
  })

  it('refuses the owner as the application\'s role, and leaves the database as it is', async () => {
    const { status, stdout } = tried({ DATABASE_URL: database.owner })
    expect(status).toBe(1)
    expect(stdout).toContain('name the same role')
    const orm = await connect(database.owner)
    expect(await orm.em.fork().execute('select 1 from pg_tables where schemaname = \'public\'')).toEqual([])
    await orm.close()
  })

  it('refuses an application role that owns a table', async () => {
    const [owner, application] = [await connect(database.owner), await connect(database.application)]
    await owner.em.fork().execute('grant create on schema public to torquill_app')
    await application.em.fork().execute('create table own_thing (id int)')
    const { status, stdout } = tried({})
    await application.em.fork().execute('drop table own_thing')
    await owner.em.fork().execute('revoke create on schema public from torquill_app')
    await Promise.all([owner.close(), application.close()])
    expect(status).toBe(1)
    expect(stdout).toContain('owns tables')
  })

  it('starts with all of them: no demonstration, no people, no mail to read', async () => {
    const lines: string[] = []
    child = spawn(process.execPath, [path('production')], { env: { ...bare(), ...env }, stdio: ['ignore', 'pipe', 'pipe'] })
    child.stdout?.on('data', (text: Buffer) => lines.push(String(text)))
    await vi.waitFor(() => expect(lines.join('')).toContain('Torquill answers'), { timeout: 50_000, interval: 200 })
    const client = new Client(env.TORQUILL_BASE_URL)
    expect((await client.get('/api/health')).status).toBe(200)
    expect((await client.get('/api/caught-mail')).status).toBe(404)
    expect((await client.get(`/api/caught-mail/${crypto.randomUUID()}`)).status).toBe(404)
    expect(JSON.stringify((await client.get('/api/demonstration')).body)).not.toMatch(/@|password/)
    expect(lines.join('')).not.toMatch(/sign-in|password/i)
  })

  it('takes its first administrator from admin:create, whose link works once', async () => {
    // Not in step: a process that waits so long would not see the server close a resting connection.
    const make = (...args: string[]) => new Promise<{ code: number, stdout: string, stderr: string }>(resolve => execFile(
      process.execPath, [path('from-build'), 'create-administrator', ...args], { env: { ...bare(), ...env } }, (error, stdout, stderr) => resolve({ code: error ? 1 : 0, stdout, stderr })))
    expect(await make('no address')).toMatchObject({ code: 1, stderr: expect.stringContaining('Usage: npm run admin:create') })
    const { stdout } = await make('first@example.org', 'Fina', 'First')
    const link = /https?:\S+/.exec(stdout)?.[0] ?? ''
    expect(link).toMatch(`${env.TORQUILL_BASE_URL}/`)
    const token = link.slice(link.lastIndexOf('/') + 1)
    const client = new Client(env.TORQUILL_BASE_URL)
    expect((await client.raw('GET', new URL(link).pathname)).status).toBe(200)
    const words = 'eleven quiet herons 4'
    expect((await client.post('/api/password/set', { token, password: words })).status).toBe(200)
    expect((await client.post('/api/password/set', { token, password: words })).body).toMatchObject({ code: 'link-spent' })
    expect((await client.signIn('first@example.org', words)).ok).toBe(true)
    expect((await client.get('/api/me')).body).toMatchObject({ name: 'Fina First', administrator: true })
    // Whoever has lost every password gets a new link by the same command, and keeps their name.
    const again = await make('first@example.org', 'Again')
    expect(again).toMatchObject({ code: 0, stdout: expect.not.stringContaining(token) })
    expect((await client.get('/api/me')).body).toMatchObject({ name: 'Fina First' })
  })

  it('ends in order when it is told to', async () => {
    await stop(child)
    expect(child?.exitCode).toBe(0)
    await expect(fetch(`${env.TORQUILL_BASE_URL}/api/health`)).rejects.toThrow()
  })
})
