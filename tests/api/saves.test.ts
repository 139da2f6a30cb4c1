import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createNote } from '#server/commands/create-note'
import { verifyChain } from '#server/audit/verify'
import { connect } from '#server/database/orm'
import { LeaseSchema } from '#server/database/entities/lease'
import { closeQueue, useQueue } from '#server/jobs/queue'
import type { SaveAnswer } from '#shared/schemas/issue-view'
import type { SaveContent } from '#shared/schemas/notes'
import { calculation, paragraph, testId, withId } from '../factories/note-document'
import { insertBlock, saveOf, typeText } from '../factories/steps'
import { contextOf, makePerson, makeTeam, password } from '../factories/people'
import { Client } from './client'
import { useServerEnvironment } from './environment'

interface Loaded { save: number, document: unknown, results: Record<string, unknown> }

let orm: MikroORM
let team: Awaited<ReturnType<typeof makeTeam>>
let analyst: Client
let id: string
let noteId: string

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  analyst = new Client()
  await analyst.signIn(team.analyst.email, password)
})
beforeEach(async () => {
  const issue = await createNote(contextOf(orm, team.analyst), { projectId: team.project.id, title: 'Strip under torsion', part: 'X-1', drawingIssue: 'A' })
  id = issue.id
  noteId = issue.note.id
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

const load = async (client = analyst) => (await client.get<Loaded>(`/api/issues/${id}`)).body
const put = (payload: SaveContent, client = analyst) => client.put<SaveAnswer & { code?: string, details?: Record<string, unknown> }>(`/api/issues/${id}/content`, payload)
async function type(text: string, client = analyst) {
  const now = await load(client)
  return put(saveOf(now.document, now.save, typeText('scope', text)), client)
}

describe('a save', () => {
  it('stores the next version and answers with it', async () => {
    const answer = await type('The bracket carries its torque. ')
    expect(answer.status).toBe(200)
    expect(answer.body.save).toBe(2)
    expect(JSON.stringify((await load()).document)).toContain('The bracket carries its torque.')
  })

  it('is computed by the server from the inputs alone', async () => {
    const calcId = randomUUID()
    const now = await load()
    const answer = await put(saveOf(now.document, now.save, insertBlock('section-analysis', withId(calcId, calculation('Strip')))))
    expect(answer.status).toBe(200)
    expect(answer.body.results[calcId]).toMatchObject({ ok: false, faults: expect.any(Array) })
  })

  it('answers a repeated request again and changes nothing', async () => {
    const now = await load()
    const payload = saveOf(now.document, now.save, typeText('scope', 'Once. '))
    const answers = await Promise.all(Array.from({ length: 8 }, () => put(payload)))
    expect(answers.map(a => a.status)).toEqual(Array.from({ length: 8 }, () => 200))
    expect((await load()).save).toBe(2)
  })

  it('of an older base loses nothing: 409 says who saved', async () => {
    const now = await load()
    await type('First. ')
    const late = await put(saveOf(now.document, now.save, typeText('scope', 'Second. ')))
    expect(late.status).toBe(409)
    expect(late.body).toMatchObject({ code: 'save-conflict', details: { save: 2, savedBy: team.analyst.name } })
  })

  it('has one winner when two are sent at once', async () => {
    const now = await load()
    const statuses = (await Promise.all(['a', 'b', 'c', 'd'].map(text => put(saveOf(now.document, now.save, typeText('scope', text)))))).map(a => a.status)
    expect(statuses.sort()).toEqual([200, 409, 409, 409])
  })

  it('is refused while another holds the pen, and taken when the pen is free', async () => {
    const second = await makePerson(orm, team.administrator, 'Second Analyst')
    const { setMember } = await import('#server/commands/set-member')
    await setMember(contextOf(orm, team.administrator), team.project.id, { personId: second.id, roles: ['analyst'] })
    const other = new Client()
    await other.signIn(second.email, password)
    await analyst.post(`/api/issues/${id}/lease`)
    const refused = await type('Not yet. ', other)
    expect(refused.status).toBe(409)
    expect(refused.body).toMatchObject({ code: 'pen-held', message: expect.stringContaining('Anna Analyst is writing') })
    await analyst.delete(`/api/issues/${id}/lease`)
    expect((await type('Now. ', other)).status).toBe(200)
    expect(await orm.em.fork().count(LeaseSchema, { issue: id, person: second.id })).toBe(1)
  })

  it.each<[string, (payload: SaveContent) => SaveContent]>([
    ['a hash that is not the document\'s', p => ({ ...p, docHash: '0'.repeat(64) })],
    ['steps that do not apply', p => ({ ...p, steps: [{ stepType: 'replace', from: 1, to: 999_999 }] })],
    ['a step of an unknown kind', p => ({ ...p, steps: [{ stepType: 'evil' }] })],
    ['no steps', p => ({ ...p, steps: [] })],
  ])('with %s is refused', async (_, spoil) => {
    const now = await load()
    expect((await put(spoil(saveOf(now.document, now.save, typeText('scope', 'x'))))).status).toBe(422)
    expect((await load()).save).toBe(1)
  })

  it('with a script link is refused', async () => {
    const now = await load()
    const sound = saveOf(now.document, now.save, insertBlock('scope', paragraph({ type: 'text', text: 'x', marks: [{ type: 'link', attrs: { href: 'https://example.org/' } }] })))
    const evil = JSON.parse(JSON.stringify(sound).replace('https://example.org/', 'javascript:alert(1)')) as SaveContent
    expect((await put(evil)).body).toMatchObject({ code: 'invalid-document' })
  })

  it('with an id used twice is refused', async () => {
    const now = await load()
    const block = withId(testId(5), paragraph('x'))
    const payload = saveOf(now.document, now.save, (change, doc) => {
      insertBlock('scope', block)(change, doc)
      insertBlock('scope', block)(change, change.doc)
    })
    expect((await put(payload)).status).toBe(422)
  })

  it('by a checker or an outsider is refused', async () => {
    const now = await load()
    const payload = saveOf(now.document, now.save, typeText('scope', 'x'))
    const [checker, outsider] = [new Client(), new Client()]
    await checker.signIn(team.checker.email, password)
    await outsider.signIn(team.outsider.email, password)
    expect((await put(payload, checker)).status).toBe(403)
    expect((await put(payload, outsider)).status).toBe(404)
  })
})

describe('earlier saves', () => {
  it('are rebuilt byte for byte, past a snapshot', async () => {
    for (let i = 2; i <= 56; i++) expect((await type(`w${i} `)).status).toBe(200)
    for (const save of [1, 2, 37, 50, 51, 56]) {
      const { body } = await analyst.get<{ same: boolean, documentHash: string, rebuiltHash: string }>(`/api/issues/${id}/saves/${save}`)
      expect(body.rebuiltHash).toBe(body.documentHash)
    }
    expect((await analyst.get(`/api/issues/${id}/saves/57`)).status).toBe(404)
  })

  it('are each one row of a chain that holds', async () => {
    for (let i = 0; i < 5; i++) await type(`w${i} `)
    expect(await verifyChain(orm.em, `note:${noteId}`)).toMatchObject({ ok: true, rows: 6 })
  })

  it('can be labelled', async () => {
    const { body } = await analyst.patch<{ items: { label: string }[] }>(`/api/issues/${id}/saves/1`, { label: 'as drawn' })
    expect(body.items[0]).toMatchObject({ save: 1, label: 'as drawn' })
  })
})

describe('the title block', () => {
  it('changes with the save it was read at, and not after a newer one', async () => {
    const block = { title: 'Strip, thicker', part: 'X-2', drawingIssue: 'B', changeNote: 'Thicker.' }
    expect((await analyst.patch(`/api/issues/${id}/metadata`, { ...block, save: 1 })).status).toBe(200)
    await type('x')
    expect((await analyst.patch(`/api/issues/${id}/metadata`, { ...block, save: 1 })).body).toMatchObject({ code: 'stale' })
  })
})
