import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'
import { verifyChain } from '#server/audit/verify'
import { MailSchema } from '#server/database/entities/mail'
import { SignatureSchema } from '#server/database/entities/signature'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { startMailCatcher } from '#server/mail/catcher'
import { checked, draftReady, forApproval, inCheck, issueOf, type Team } from '../factories/note-on-its-way'
import { makeTeam, password } from '../factories/people'
import { Client, type Answer } from './client'
import { useServerEnvironment } from './environment'

let orm: MikroORM
let team: Team
const seats = {} as Record<'analyst' | 'checker' | 'approver' | 'auditor' | 'administrator' | 'outsider', Client>

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  for (const who of ['analyst', 'checker', 'approver', 'auditor', 'administrator', 'outsider'] as const) {
    seats[who] = new Client()
    await seats[who].signIn(team[who].email, password)
  }
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

const expectNow = async (id: string) => {
  const { state, saveNumber } = await issueOf(orm, id)
  return { state, save: saveNumber }
}
const post = async (who: keyof typeof seats, id: string, act: string, body: Record<string, unknown> = {}): Promise<Answer<{ code?: string, fields?: Record<string, string>, state?: string }>> =>
  seats[who].post(`/api/issues/${id}/${act}`, { expect: await expectNow(id), ...body })
const stateOf = async (id: string) => (await issueOf(orm, id)).state
const named = () => ({ checkerId: team.checker.id, approverId: team.approver.id })
const reason = 'The reason is written here.'

async function released(id: string) {
  await expect.poll(() => stateOf(id), { timeout: 30_000, interval: 250 }).toBe('released')
}

describe('the way of an issue', () => {
  it('goes from draft to released, each act by the one it is for', async () => {
    const { id } = await draftReady(orm, team)
    expect((await post('checker', id, 'submit', named())).status).toBe(403)
    expect((await post('analyst', id, 'submit', named())).body).toMatchObject({ state: 'in check' })
    expect((await post('approver', id, 'pass', { password })).status).toBe(403)
    expect((await post('checker', id, 'pass', { password })).body).toMatchObject({ code: 'something-remains' })
    expect((await post('analyst', id, 'recall')).body).toMatchObject({ state: 'draft' })
  })

  it('is returned with a reason, and not without', async () => {
    const { id } = await inCheck(orm, team)
    const bare = await post('checker', id, 'return', { reason: '' })
    expect(bare.status).toBe(422)
    expect(bare.body.fields).toHaveProperty('reason')
    expect((await post('analyst', id, 'return', { reason })).status).toBe(403)
    expect((await post('checker', id, 'return', { reason })).body).toMatchObject({ state: 'draft' })
    expect(await orm.em.fork().count(SignatureSchema, { issue: id, voidedAt: null })).toBe(0)
  })

  it('passes with the checker\'s own password only', async () => {
    const { id } = await checked(orm, team)
    expect((await post('checker', id, 'pass', { password: 'wrong' })).body).toMatchObject({ code: 'password-wrong' })
    expect((await post('checker', id, 'pass', { password })).body).toMatchObject({ state: 'for approval' })
    expect((await issueOf(orm, id)).contentHash).toMatch(/^[0-9a-f]{64}$/)
    expect((await post('checker', id, 'release', { password, acceptedDeviations: [] })).status).toBe(403)
    expect((await post('approver', id, 'return', { reason })).body).toMatchObject({ state: 'draft' })
  })

  it('is released once, whole and signed, and superseded by the next letter', async () => {
    const { id } = await forApproval(orm, team)
    const statuses = (await Promise.all(Array.from({ length: 10 }, () => post('approver', id, 'release', { password, acceptedDeviations: [] })))).map(a => a.status)
    expect(statuses.filter(s => s === 200)).toHaveLength(1)
    expect(statuses.filter(s => s === 409)).toHaveLength(9)
    await released(id)
    const em = orm.em.fork()
    expect(await em.count(SignatureSchema, { issue: id, meaning: 'released', voidedAt: null })).toBe(1)
    const files = await em.find(StoredFileSchema, { issue: id, purpose: 'released-pdf' })
    expect(files).toHaveLength(1)
    const pdf = Buffer.from(await (await seats.analyst.raw('GET', `/files/${files[0]!.id}`)).arrayBuffer())
    expect(createHash('sha256').update(pdf).digest('hex')).toBe(files[0]!.sha256)
    const file = join(mkdtempSync(join(tmpdir(), 'torquill-pdf-')), 'note.pdf')
    writeFileSync(file, pdf)
    expect(spawnSync('pdfsig', [file], { encoding: 'utf8' }).stdout).toMatch(/Total document signed[\s\S]*Signature is Valid/)
    expect((await seats.outsider.get(`/files/${files[0]!.id}`)).status).toBe(404)
    const issue = await issueOf(orm, id)
    const next = await seats.analyst.post<{ letter: string, state: string }>(`/api/notes/${issue.note.number}/issues`)
    expect(next.body).toMatchObject({ letter: 'B', state: 'draft' })
    expect((await seats.analyst.post(`/api/notes/${issue.note.number}/issues`)).status).toBe(409)
    expect((await post('approver', id, 'withdraw', { reason, password })).body).toMatchObject({ state: 'withdrawn' })
    expect(await verifyChain(orm.em, `note:${issue.note.id}`)).toMatchObject({ ok: true })
  })

  it('is unlocked with the reason when the release cannot be made', async () => {
    const { id } = await forApproval(orm, team)
    const { failRelease } = await import('#server/commands/fail-release')
    const { requestRelease } = await import('#server/commands/request-release')
    const { contextOf } = await import('../factories/people')
    await requestRelease(contextOf(orm, team.approver), id, { expect: await expectNow(id), password, acceptedDeviations: [] })
    const signature = await orm.em.fork().findOneOrFail(SignatureSchema, { issue: id, meaning: 'released' })
    await failRelease({ em: orm.em.fork(), clock: () => new Date() }, { issueId: id, signatureId: signature.id, reason: 'the store is full' })
    const issue = await issueOf(orm, id)
    // The worker may have been quicker; then there was nothing left to fail.
    if (issue.state === 'released') return
    expect(issue).toMatchObject({ state: 'for approval', releaseRequestedAt: null, releaseFailure: 'the store is full' })
    expect(await orm.em.fork().count(SignatureSchema, { issue: id, meaning: 'released', voidedAt: null })).toBe(0)
  })
})

describe('races', () => {
  it.each([
    ['submit', draftReady, 'analyst', () => named()], ['return', inCheck, 'checker', () => ({ reason })],
    ['pass', checked, 'checker', () => ({ password })], ['recall', inCheck, 'analyst', () => ({})],
  ] as const)('of two who %s at once, one wins and the other gets 409', async (act, make, who, body) => {
    const { id } = await make(orm, team)
    const seen = await expectNow(id)
    const statuses = (await Promise.all([1, 2].map(() => seats[who].post(`/api/issues/${id}/${act}`, { expect: seen, ...body() })))).map(a => a.status)
    expect(statuses.sort()).toEqual([200, 409])
  })
})

/** Acts that do not belong to the state, by somebody who has the right to them elsewhere. */
const wrongState: [state: string, act: string, make: typeof draftReady, who: keyof typeof seats, body: () => Record<string, unknown>][] = [
  ['draft', 'recall', draftReady, 'analyst', () => ({})], ['draft', 'withdraw', draftReady, 'approver', () => ({ reason, password })],
  ['in check', 'submit', inCheck, 'analyst', named], ['in check', 'abandon', inCheck, 'analyst', () => ({ reason })], ['in check', 'withdraw', inCheck, 'approver', () => ({ reason, password })],
  ['for approval', 'submit', forApproval, 'analyst', named], ['for approval', 'abandon', forApproval, 'analyst', () => ({ reason })],
]

describe('acts out of their state', () => {
  it.each(wrongState)('%s: %s', async (state, act, make, who, body) => {
    const { id } = await make(orm, team)
    const answer = await post(who, id, act, body())
    expect([answer.status, await stateOf(id)]).toEqual([409, state])
    const refused = await orm.em.fork().execute<{ n: string }[]>('select count(*) as n from trail_row where subject_id = ? and outcome = \'refused\'', [id])
    expect(Number(refused[0]?.n)).toBe(1)
  })

  it.each(['submit', 'recall', 'return', 'pass', 'release', 'abandon', 'withdraw', 'reassign'])('%s on a save that has moved on is stale', async (act) => {
    const { id } = act === 'submit' || act === 'abandon' ? await draftReady(orm, team) : await inCheck(orm, team)
    const who = act === 'pass' || act === 'return' ? 'checker' : act === 'release' || act === 'withdraw' ? 'approver' : 'analyst'
    const answer = await post(who, id, act, { expect: { ...await expectNow(id), save: 99 }, ...named(), reason, password, acceptedDeviations: [] })
    expect([409, 403]).toContain(answer.status)
    expect(['draft', 'in check']).toContain(await stateOf(id))
  })
})

describe('independence', () => {
  it('keeps one person from two parts, also in the database', async () => {
    const { id } = await inCheck(orm, team)
    const { setMember } = await import('#server/commands/set-member')
    const { contextOf } = await import('../factories/people')
    await setMember(contextOf(orm, team.administrator), team.project.id, { personId: team.analyst.id, roles: ['analyst', 'checker', 'approver'] })
    const { body } = await seats.analyst.get<{ checkers: { id: string, eligible: boolean, why: string }[] }>(`/api/issues/${id}/candidates`)
    expect(body.checkers.find(c => c.id === team.analyst.id)).toMatchObject({ eligible: false, why: expect.stringContaining('contributed') })
    const swapped = await post('analyst', id, 'reassign', { checkerId: team.analyst.id, reason })
    expect(swapped.status).toBe(403)
    await expect(orm.em.fork().execute('insert into issue_part (id, issue_id, person_id, part, at) values (gen_random_uuid(), ?, ?, \'checker\', now())', [id, team.analyst.id])).rejects.toMatchObject({ code: '23505' })
    await setMember(contextOf(orm, team.administrator), team.project.id, { personId: team.analyst.id, roles: ['analyst'] })
  })

  it('freezes an issue outside draft, also in the database', async () => {
    const { id } = await inCheck(orm, team)
    for (const field of ['title = \'x\'', 'document = \'{}\'', 'results = \'{}\'', 'save_number = 99']) {
      await expect(orm.em.fork().execute(`update issue set ${field} where id = ?`, [id])).rejects.toMatchObject({ code: '23514' })
    }
    await expect(orm.em.fork().execute('update issue set state = \'released\' where id = ?', [id])).rejects.toMatchObject({ code: '23514' })
  })
})

describe('the check', () => {
  it('stands on ticks, judgements and a sheet that lapse with what they were given for', async () => {
    const { id, calcId } = await checked(orm, team)
    const load = async () => (await seats.checker.get<{ ticks: { holds: boolean }[], remaining: { pass: unknown[] } }>(`/api/issues/${id}`)).body
    expect((await load()).remaining.pass).toEqual([])
    await post('checker', id, 'ticks', { calcId, ticked: false })
    expect((await load()).remaining.pass).toMatchObject([{ id: 'ticks', count: 1 }])
    await post('checker', id, 'check-sheet', { item: 1, verdict: 'not ok', evidence: 'another drawing issue' })
    expect((await load()).remaining.pass).toMatchObject([{ id: 'ticks' }, { id: 'not-ok' }])
  })

  it('takes remarks on what is in the note, and blocks the pass while one is open', async () => {
    const { id, calcId } = await checked(orm, team)
    expect((await post('checker', id, 'remarks', { anchor: { kind: 'calculation', calcId: team.project.id }, text: 'Where?' })).status).toBe(409)
    expect((await post('analyst', id, 'remarks', { anchor: { kind: 'calculation', calcId }, text: 'Mine' })).status).toBe(403)
    const { body } = await seats.checker.post<{ remarks: { id: string, state: string }[] }>(`/api/issues/${id}/remarks`, { anchor: { kind: 'calculation', calcId }, text: 'Minimum or nominal thickness?' })
    const remark = body.remarks[0]!
    expect((await post('checker', id, 'pass', { password })).body).toMatchObject({ code: 'something-remains' })
    expect((await post('analyst', id, `remarks/${remark.id}/replies`, { text: 'Nominal.' })).status).toBe(200)
    expect((await post('analyst', id, `remarks/${remark.id}/state`, { state: 'closed' })).status).toBe(403)
    expect((await post('checker', id, `remarks/${remark.id}/state`, { state: 'closed' })).status).toBe(200)
    expect((await post('checker', id, 'pass', { password })).status).toBe(200)
  })
})

describe('mail', () => {
  it('goes later, once, when no mail server ran during the act', async () => {
    const { id } = await inCheck(orm, team)
    const rows = () => orm.em.fork().find(MailSchema, { recipient: team.checker.id, template: 'submitted', event: { $like: `submit:${id}%` } })
    const [row, ...others] = await rows()
    expect(others).toEqual([])
    expect(row?.sentAt ?? null).toBeNull()
    const catcher = await startMailCatcher({ port: inject('running').mailPort, clock: () => new Date() })
    try {
      await expect.poll(async () => (await rows())[0]?.sentAt ?? null, { timeout: 55_000, interval: 500 }).not.toBeNull()
      const mine = catcher.caught().filter(mail => mail.to.includes(team.checker.email) && mail.text.includes((row?.props as { number: string }).number))
      expect(mine).toHaveLength(1)
      expect(mine[0]).toMatchObject({ subject: expect.stringContaining('A'), html: expect.stringContaining('<html') })
    } finally {
      await catcher.close()
    }
  })
})
