import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { MailSchema } from '#server/database/entities/mail'
import { PersonSchema, type Person } from '#server/database/entities/person'
import { connect } from '#server/database/orm'
import { makeAdministrator, makePerson, makeTeam, password } from '../factories/people'
import { Client } from './client'
import { useServerEnvironment } from './environment'

let orm: MikroORM
let administrator: Person
const client = new Client()

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  administrator = await makeAdministrator(orm)
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

async function signedIn(person: Person) {
  const fresh = new Client()
  expect((await fresh.signIn(person.email, password)).ok).toBe(true)
  return fresh
}

async function linkOf(person: Person, template: string) {
  const mails = await orm.em.fork().find(MailSchema, { recipient: person.id, template }, { orderBy: { createdAt: 'desc' } })
  return String(mails[0]?.props.url)
}

describe('signing in', () => {
  it('refuses everything to a stranger', async () => {
    expect((await client.get('/api/me')).status).toBe(401)
    expect((await client.get('/api/notes')).body).toMatchObject({ code: 'not-signed-in' })
  })

  it('takes the right password and says who it is, without any hash', async () => {
    const me = await (await signedIn(administrator)).get('/api/me')
    expect(me.status).toBe(200)
    expect(me.body).toMatchObject({ email: administrator.email, administrator: true, projects: [] })
    expect(JSON.stringify(me.body)).not.toMatch(/argon2|passwordHash/)
  })

  it('takes no wrong password, unknown address or disabled person, and answers all alike', async () => {
    const disabled = await makePerson(orm, administrator, 'Dora Disabled')
    await (await signedIn(administrator)).patch(`/api/people/${disabled.id}`, { disabled: true })
    const answers = await Promise.all([[administrator.email, 'wrong'], ['nobody@example.org', password], [disabled.email, password]].map(([email, typed]) => new Client().signIn(email!, typed!)))
    expect(answers.map(a => a.ok)).toEqual([false, false, false])
    expect(new Set(answers.map(a => new URL(a.url).searchParams.get('error'))).size).toBe(1)
  })

  it('closes an account for a while after five wrong passwords', async () => {
    const person = await makePerson(orm, administrator, 'Theo Throttled')
    for (let i = 0; i < 5; i++) await new Client().signIn(person.email, `wrong ${i}`)
    const answer = await new Client().signIn(person.email, password)
    expect(answer.ok).toBe(false)
    expect(answer.url).toContain('throttled')
  })

  it('ends the session of whoever is disabled at the next request', async () => {
    const person = await makePerson(orm, administrator, 'Lena Leaving')
    const hers = await signedIn(person)
    expect((await hers.get('/api/me')).status).toBe(200)
    await (await signedIn(administrator)).patch(`/api/people/${person.id}`, { disabled: true })
    expect((await hers.get('/api/me')).status).toBe(401)
  })

  it('does not take a session back after signing out', async () => {
    const person = await makePerson(orm, administrator, 'Otto Outgoing')
    const his = await signedIn(person)
    const cookie = his.cookieHeader()
    await his.signOut()
    const replay = await fetch(`${his.baseUrl}/api/me`, { headers: { cookie } })
    expect(replay.status).toBe(401)
  })

  it('keeps the session cookie out of scripts and of other sites', async () => {
    const fresh = new Client()
    const { body: { csrfToken } } = await fresh.get<{ csrfToken: string }>('/api/auth/csrf')
    const response = await fresh.raw('POST', '/api/auth/callback/credentials', {
      body: new URLSearchParams({ csrfToken, email: administrator.email, password, json: 'true' }), headers: { 'content-type': 'application/x-www-form-urlencoded' },
    })
    const session = response.headers.getSetCookie().find(line => line.includes('session-token'))
    expect(session).toMatch(/HttpOnly/i)
    expect(session).toMatch(/SameSite=Lax/i)
  })
})

describe('one-time links', () => {
  it('work once, and set a password that then signs in', async () => {
    const person = await makePerson(orm, administrator, 'Fatima Forgetful')
    expect((await client.post('/api/password/forgot', { email: person.email })).body).toEqual({ ok: true })
    const token = (await linkOf(person, 'forgotten-password')).split('/').pop()!
    expect((await client.get(`/api/password/link?token=${token}`)).body).toMatchObject({ email: person.email })
    const fresh = 'another long sentence 7'
    expect((await client.post('/api/password/set', { token, password: fresh })).status).toBe(200)
    expect((await client.post('/api/password/set', { token, password: fresh })).body).toMatchObject({ code: 'link-spent' })
    expect((await new Client().signIn(person.email, fresh)).ok).toBe(true)
    expect((await new Client().signIn(person.email, password)).ok).toBe(false)
  })

  it('answer the same for an address that nobody has', async () => {
    expect((await client.post('/api/password/forgot', { email: 'nobody-at-all@example.org' })).body).toEqual({ ok: true })
  })

  it('refuse a weak password with a sentence beside the field', async () => {
    const answer = await client.post('/api/password/set', { token: 'x'.repeat(43), password: 'short' })
    expect(answer.status).toBe(422)
    expect(answer.body).toMatchObject({ code: 'invalid-input', fields: { password: expect.stringContaining('10 characters') } })
  })
})

describe('administration', () => {
  it('never gives an address to another, even after disabling', async () => {
    const admin = await signedIn(administrator)
    const person = await makePerson(orm, administrator, 'Una Unique')
    await admin.patch(`/api/people/${person.id}`, { disabled: true })
    expect((await admin.post('/api/people', { email: person.email.toUpperCase(), name: 'Somebody Else' })).status).toBe(409)
  })

  it('lets nobody change their own roles', async () => {
    const answer = await (await signedIn(administrator)).patch(`/api/people/${administrator.id}`, { auditor: true })
    expect(answer.status).toBe(403)
  })

  it('keeps the last administrator', async () => {
    const second = await makePerson(orm, administrator, 'Ben Backup', { administrator: true })
    const em = orm.em.fork()
    await em.nativeUpdate(PersonSchema, { administrator: true, id: { $nin: [administrator.id, second.id] } }, { administrator: false })
    const [a, b] = [await signedIn(administrator), await signedIn(second)]
    const [first, other] = await Promise.all([a.patch(`/api/people/${second.id}`, { disabled: true }), b.patch(`/api/people/${administrator.id}`, { disabled: true })])
    // Each wants to disable the other at once: one of them wins, and one administrator remains.
    expect([first!.status, other!.status].filter(s => s === 200)).toHaveLength(1)
    expect(await em.count(PersonSchema, { administrator: true, disabledAt: null })).toBe(1)
    await em.nativeUpdate(PersonSchema, { id: administrator.id }, { disabledAt: null })
  })

  it('is closed to everybody else', async () => {
    const { analyst } = await makeTeam(orm)
    const hers = await signedIn(analyst)
    expect((await hers.get('/api/people')).status).toBe(403)
    expect((await hers.post('/api/projects', {})).status).toBe(403)
    expect((await hers.get('/api/trail')).status).toBe(403)
  })
})

describe('requests of other sites', () => {
  it.each([
    ['another origin', { 'origin': 'https://evil.example', 'sec-fetch-site': 'cross-site' }],
    ['no origin at all', { 'origin': '', 'sec-fetch-site': '' }],
    ['a sandboxed page', { 'origin': 'null', 'sec-fetch-site': 'cross-site' }],
    ['a sibling host', { 'origin': 'http://127.0.0.1:1', 'sec-fetch-site': 'same-site' }],
  ])('from %s change nothing', async (_, headers) => {
    const admin = await signedIn(administrator)
    const response = await fetch(`${admin.baseUrl}/api/people`, {
      method: 'POST', body: JSON.stringify({ email: 'x@example.org', name: 'Cross Site' }),
      headers: { 'cookie': admin.cookieHeader(), 'content-type': 'application/json', ...Object.fromEntries(Object.entries(headers).filter(([, v]) => v)) },
    })
    expect(response.status).toBe(403)
    expect(response.headers.get('access-control-allow-origin')).toBeNull()
  })

  it('are sent to the canonical host when they only read', async () => {
    const port = new URL(client.baseUrl).port
    const { request } = await import('node:http')
    const location = await new Promise<[number, string | undefined]>((resolve, reject) => {
      request({ host: '127.0.0.1', port, path: '/sign-in', headers: { host: 'torquill.evil.example' } }, r => resolve([r.statusCode!, r.headers.location])).on('error', reject).end()
    })
    expect(location).toEqual([308, `${client.baseUrl}/sign-in`])
  })
})
