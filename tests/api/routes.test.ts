import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createNote } from '#server/commands/create-note'
import type { Issue } from '#server/database/entities/issue'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { contextOf, makeTeam, password } from '../factories/people'
import { allRoutes, type Route } from '../factories/routes'
import { Client } from './client'
import { useServerEnvironment } from './environment'

const routes = allRoutes().filter(route => route.policy !== null)
const reading = (method: string) => method === 'GET'

let orm: MikroORM
let team: Awaited<ReturnType<typeof makeTeam>>
let issue: Issue
let outsider: Client
let analyst: Client
let auditor: Client

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  issue = await createNote(contextOf(orm, team.analyst), { projectId: team.project.id, title: 'Bracket under torsion', part: 'X-1', drawingIssue: 'A' })
  outsider = new Client()
  analyst = new Client()
  auditor = new Client()
  await outsider.signIn(team.outsider.email, password)
  await analyst.signIn(team.analyst.email, password)
  await auditor.signIn(team.auditor.email, password)
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

/** The address with real ids where they exist, fresh ones elsewhere. */
const addressOf = (route: Route) => route.path.replace('[number]', issue.note.number).replace('issues/[id]', `issues/${issue.id}`)
  .replace('[save]', '1').replace(/\[\w+\]/g, () => randomUUID())
const ask = (client: Client, route: Route) => client.call(route.method, addressOf(route), reading(route.method) ? undefined : {})

describe('every route', () => {
  it.each(routes.filter(r => r.policy !== 'public'))('$method $path answers 401 to a stranger', async (route) => {
    const answer = await ask(new Client(), route)
    expect(answer.status).toBe(401)
    expect(answer.body).toMatchObject({ code: 'not-signed-in', message: expect.any(String) })
  })

  it.each(routes.filter(r => r.policy === 'see-issue' || r.policy === 'see-note'))('$method $path answers 404 to somebody of another project', async (route) => {
    expect((await ask(outsider, route)).status).toBe(404)
  })

  it.each(routes.filter(r => r.policy === 'administrator' || r.policy === 'auditor'))('$method $path answers 403 to an analyst', async (route) => {
    expect((await ask(analyst, route)).status).toBe(403)
  })

  it.each(routes.filter(r => r.policy === 'see-issue' && !reading(r.method) && !r.path.includes('draft-pdf') && !r.path.endsWith('/lease')))('$method $path lets an auditor change nothing', async (route) => {
    const before = await orm.em.fork().execute('select save_number, state from issue where id = ?', [issue.id])
    const status = (await ask(auditor, route)).status
    expect([403, 404, 409, 422]).toContain(status)
    expect(await orm.em.fork().execute('select save_number, state from issue where id = ?', [issue.id])).toEqual(before)
  })

  it.each(routes.filter(r => !reading(r.method)))('$method $path refuses another site', async (route) => {
    const response = await fetch(analyst.baseUrl + addressOf(route), { method: route.method, body: '{}', headers: { 'cookie': analyst.cookieHeader(), 'content-type': 'application/json', 'origin': 'https://evil.example', 'sec-fetch-site': 'cross-site' } })
    expect(response.status).toBe(403)
  })
})

describe('files and PDFs', () => {
  it.each(['/files/', '/pdf/'])('%s answers 401 to a stranger and 404 to somebody of another project', async (path) => {
    expect((await new Client().get(`${path}${issue.id}`)).status).toBe(401)
    expect((await outsider.get(`${path}${issue.id}`)).status).toBe(404)
  })
})

describe('a body', () => {
  it('that is no JSON is refused in words', async () => {
    const response = await analyst.raw('POST', '/api/notes', { body: '{"title":', headers: { 'content-type': 'application/json' } })
    expect(response.status).toBe(422)
  })

  it('of another content type is refused', async () => {
    const response = await analyst.raw('POST', '/api/notes', { body: '{}', headers: { 'content-type': 'text/plain' } })
    expect(response.status).toBe(415)
  })

  it('that is too large is refused', async () => {
    expect((await analyst.post('/api/notes', { title: 'x'.repeat(300_000) })).status).toBe(413)
  })

  it('cannot set what is not its to set', async () => {
    const answer = await analyst.post<{ number: string, issueId: string }>('/api/notes', { projectId: team.project.id, title: 'Shaft', part: 'X-2', drawingIssue: 'A', state: 'released', letter: 'Z', version: 9 })
    expect(answer.status).toBe(200)
    const [row] = await orm.em.fork().execute<{ state: string, letter: string }[]>('select state, letter from issue where id = ?', [answer.body.issueId])
    expect(row).toEqual({ state: 'draft', letter: 'A' })
  })
})

describe('the register', () => {
  it('shows a project\'s notes to its members and auditors, and to nobody else', async () => {
    const numbers = async (client: Client) => (await client.get<{ items: { number: string }[] }>('/api/notes?size=100')).body.items.map(i => i.number)
    expect(await numbers(analyst)).toContain(issue.note.number)
    expect(await numbers(auditor)).toContain(issue.note.number)
    expect(await numbers(outsider)).toEqual([])
  })

  it.each(['sort=number;drop table note', 'sort=createdAt', 'dir=up', 'page=0', 'size=1000', 'id[]=1&sort[]=number'])('refuses or ignores %s without failing', async (query) => {
    expect([200, 422]).toContain((await analyst.get(`/api/notes?${query}`)).status)
  })

  it('finds by words of number, title, part and person, whatever signs they hold', async () => {
    const find = async (q: string) => (await analyst.get<{ total: number }>(`/api/notes?q=${encodeURIComponent(q)}`)).body.total
    expect(await find('bracket')).toBe(1)
    expect(await find('anna torsion')).toBe(1)
    expect(await find('100%')).toBe(0)
    expect(await find('\' or 1=1 --')).toBe(0)
  })
})
