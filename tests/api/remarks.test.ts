/** Remarks with all they carry: attachments, proposed wording, and anchors that follow what the author writes afterwards. */
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { textAnchor, type Anchor } from '#shared/note/anchors'
import { noteSchema, readDocument } from '#shared/note/schema'
import type { IssueView } from '#shared/schemas/issue-view'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { pixel, uploadTo } from '../factories/act-requests'
import { checked, expectOf, inCheck, issueOf, type Team } from '../factories/note-on-its-way'
import { makeTeam, password } from '../factories/people'
import { saveOf } from '../factories/steps'
import { Client, type Answer } from './client'
import { useServerEnvironment } from './environment'

let orm: MikroORM
let team: Team
const seats = {} as Record<'analyst' | 'checker' | 'outsider', Client>

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  for (const who of ['analyst', 'checker', 'outsider'] as const) {
    seats[who] = new Client()
    await seats[who].signIn(team[who].email, password)
  }
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

type Body = IssueView & { code?: string, fields?: Record<string, string> }
const post = (who: keyof typeof seats, id: string, path: string, body: unknown): Promise<Answer<Body>> => seats[who].post<Body>(`/api/issues/${id}/${path}`, body)
const load = async (id: string) => (await seats.checker.get<IssueView>(`/api/issues/${id}`)).body

/** The first paragraph of the scope: `Both hands of the strip.` */
function scopeOf(document: unknown): { blockId: string, text: string, pos: number } {
  const doc = readDocument(document)
  const found: { blockId: string, text: string, pos: number }[] = []
  doc.descendants((node, pos) => {
    if (node.isTextblock && node.textContent.includes('hands')) found.push({ blockId: String(node.attrs.id), text: node.textContent, pos })
  })
  return found[0]!
}
async function anchorOn(id: string, words: string): Promise<Anchor> {
  const { document } = await load(id)
  const { blockId, text } = scopeOf(document)
  return textAnchor(readDocument(document), blockId, text.indexOf(words), text.indexOf(words) + words.length)!
}
async function returned(id: string) {
  expect((await post('checker', id, 'return', { expect: expectOf(await issueOf(orm, id)), reason: 'See the remarks.' })).status).toBe(200)
}
/** The author edits the scope; the answer's remarks say where the anchors went. */
async function edit(id: string, change: (scope: ReturnType<typeof scopeOf>, transform: Parameters<Parameters<typeof saveOf>[2]>[0]) => void) {
  const now = await load(id)
  const answer = await seats.analyst.put<Body>(`/api/issues/${id}/content`, saveOf(now.document, now.save, transform => change(scopeOf(now.document), transform)))
  expect(answer.status).toBe(200)
  return answer.body.remarks
}

describe('an attachment', () => {
  it('goes with a remark, is read by who sees the note, and by nobody else', async () => {
    const { id, calcId } = await inCheck(orm, team)
    const file = await uploadTo(seats.checker, `/api/issues/${id}/files?purpose=attachment`, pixel, '../../etc/mark"up.png')
    expect(file.status).toBe(200)
    const { body } = await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId }, text: 'Marked on the drawing.', fileId: file.body.id })
    expect(body.remarks[0]?.entries[0]?.file).toEqual({ id: file.body.id, name: 'mark%22up.png' })
    const read = await seats.analyst.raw('GET', `/files/${file.body.id}`)
    expect(Buffer.from(await read.arrayBuffer()).equals(pixel)).toBe(true)
    expect((await seats.outsider.raw('GET', `/files/${file.body.id}`)).status).toBe(404)
    expect((await new Client().raw('GET', `/files/${file.body.id}`)).status).toBe(401)
  })

  it('goes with a reply, uploaded by who replies', async () => {
    const { id, calcId } = await inCheck(orm, team)
    const remark = (await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId }, text: 'Source?' })).body.remarks[0]!
    const file = await uploadTo(seats.analyst, `/api/issues/${id}/files?purpose=attachment`, pixel)
    const { body } = await post('analyst', id, `remarks/${remark.id}/replies`, { text: 'Here.', fileId: file.body.id })
    expect(body.remarks[0]).toMatchObject({ state: 'answered', entries: [{ file: null }, { file: { id: file.body.id } }] })
  })

  it('of somebody else, of another issue, or a figure is refused', async () => {
    const [one, other] = [await inCheck(orm, team), await inCheck(orm, team)]
    const anchor = { kind: 'calculation', calcId: one.calcId }
    const theirs = await uploadTo(seats.analyst, `/api/issues/${one.id}/files?purpose=attachment`, pixel)
    const elsewhere = await uploadTo(seats.checker, `/api/issues/${other.id}/files?purpose=attachment`, pixel)
    for (const fileId of [theirs.body.id, elsewhere.body.id, one.id]) {
      const answer = await post('checker', one.id, 'remarks', { anchor, text: 'x', fileId })
      expect(answer).toMatchObject({ status: 404, body: { code: 'not-found', fields: { fileId: expect.any(String) } } })
    }
    expect((await load(one.id)).remarks).toEqual([])
  })

  it('that is no image and no PDF is refused', async () => {
    const { id } = await inCheck(orm, team)
    expect(await uploadTo(seats.checker, `/api/issues/${id}/files?purpose=attachment`, Buffer.from('<svg onload="x"/>'), 'x.png')).toMatchObject({ status: 415, body: { code: 'not-this-kind' } })
  })
})

describe('proposed wording', () => {
  it('is kept as proposed, changes nothing of the note, and is the author\'s once written', async () => {
    const { id } = await inCheck(orm, team)
    const before = await issueOf(orm, id)
    const anchor = await anchorOn(id, 'Both hands')
    const { status, body } = await post('checker', id, 'remarks', { anchor, text: 'Say which.', proposed: 'Left and right hand' })
    expect(status).toBe(200)
    expect(body.remarks[0]).toMatchObject({ anchor, anchorState: 'ok', entries: [{ proposed: 'Left and right hand', author: { id: team.checker.id } }] })
    expect((await issueOf(orm, id)).documentHash).toBe(before.documentHash)
    await returned(id)
    const remarks = await edit(id, ({ pos }, transform) => transform.replaceWith(pos + 1, pos + 1 + 'Both hands'.length, noteSchema().text('Left and right hand')))
    expect(remarks[0]).toMatchObject({ state: 'open', anchor: { quote: 'Both hands' } })
    const { people, document } = await load(id)
    expect(JSON.stringify(document)).toContain('Left and right hand of the strip.')
    expect(people.contributors.map(p => p.id)).toEqual([team.analyst.id])
  })

  it('cannot stand for inputs of a calculation: they are not in it', async () => {
    const { id, calcId } = await inCheck(orm, team)
    const before = (await issueOf(orm, id)).document
    await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId, field: 'walls.0.t' }, text: 'Minimum?', proposed: '7.6 mm' })
    expect((await issueOf(orm, id)).document).toBe(before)
  })

  it('of many thousand characters is refused', async () => {
    const { id, calcId } = await inCheck(orm, team)
    expect((await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId }, text: 'x', proposed: 'x'.repeat(4001) })).status).toBe(422)
  })
})

describe('an anchor', () => {
  it('follows what is typed before it, tells what was changed in it, is an orphan when it is deleted, and comes back', async () => {
    const { id } = await inCheck(orm, team)
    await post('checker', id, 'remarks', { anchor: await anchorOn(id, 'the strip'), text: 'Which?' })
    await returned(id)
    const [moved] = await edit(id, ({ pos }, transform) => transform.insert(pos + 1, noteSchema().text('Serials 1 to 9. ')))
    expect(moved).toMatchObject({ anchorState: 'ok', anchor: { quote: 'the strip', from: 'Serials 1 to 9. Both hands of '.length } })
    const [edited] = await edit(id, ({ pos, text }, transform) => transform.insert(pos + 1 + text.indexOf('strip'), noteSchema().text('flat ')))
    expect(edited).toMatchObject({ anchorState: 'edited', anchor: { quote: 'the strip' } })
    const [orphan] = await edit(id, ({ pos, text }, transform) => transform.delete(pos + 1 + text.indexOf('the flat'), pos + 1 + text.length))
    expect(orphan).toMatchObject({ anchorState: 'orphaned', anchor: { quote: 'the strip' }, state: 'open' })
    const [back] = await edit(id, ({ pos, text }, transform) => transform.insert(pos + 1 + text.length, noteSchema().text('the strip.')))
    expect(back).toMatchObject({ anchorState: 'ok', anchor: { quote: 'the strip' } })
  })

  it('that lost its place blocks the pass until the checker closes the remark', async () => {
    const { id } = await checked(orm, team)
    const remark = (await post('checker', id, 'remarks', { anchor: await anchorOn(id, 'Both hands'), text: 'Which?' })).body.remarks[0]!
    await returned(id)
    const [orphan] = await edit(id, ({ pos, text }, transform) => transform.replaceWith(pos + 1, pos + 1 + text.length, noteSchema().text('Parts 1 to 4, both hands.')))
    expect(orphan?.anchorState).not.toBe('ok')
    expect((await post('analyst', id, 'submit', { expect: expectOf(await issueOf(orm, id)), checkerId: team.checker.id, approverId: team.approver.id })).status).toBe(200)
    expect((await load(id)).remaining.pass.map(r => r.id)).toContain('remarks')
    expect((await post('checker', id, 'pass', { expect: expectOf(await issueOf(orm, id)), password })).body).toMatchObject({ code: 'something-remains' })
    await post('checker', id, `remarks/${remark.id}/state`, { state: 'closed' })
    expect((await load(id)).remaining.pass.map(r => r.id)).not.toContain('remarks')
  })

  it('on a calculation follows its inputs and is an orphan without it', async () => {
    const { id, calcId } = await inCheck(orm, team)
    await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId }, text: 'Source of the thickness?' })
    await returned(id)
    const place = (document: unknown) => {
      let found = -1
      readDocument(document).descendants((node, pos) => {
        if (node.attrs.id === calcId) found = pos
      })
      return found
    }
    const now = await load(id)
    const at = place(now.document)
    const [retitled] = await edit(id, (_, transform) => transform.setNodeAttribute(at, 'title', 'Flat strip'))
    expect(retitled).toMatchObject({ anchorState: 'ok' })
    const [gone] = await edit(id, (_, transform) => transform.delete(at, at + 1))
    expect(gone).toMatchObject({ anchorState: 'orphaned', state: 'open' })
  })

  it.each<[string, (anchor: Anchor) => unknown]>([
    ['words that are not there', anchor => ({ ...anchor, quote: 'other words' })], ['a range past the end', anchor => ({ ...anchor, from: 900, to: 910 })],
    ['a paragraph that is not there', anchor => ({ ...anchor, blockId: '00000000-0000-4000-8000-000000000000' })],
  ])('of %s is refused as stale', async (_, spoil) => {
    const { id } = await inCheck(orm, team)
    expect(await post('checker', id, 'remarks', { anchor: spoil(await anchorOn(id, 'strip')), text: 'x' })).toMatchObject({ status: 409, body: { code: 'stale' } })
  })
})
