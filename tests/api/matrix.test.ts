/**
 * State × act × person over HTTP, against the built server and PostgreSQL. What
 * is expected comes from the table of moves and from who the persons are, so an
 * act or a state that is added is tried without a word here.
 */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { MikroORM } from '@mikro-orm/postgresql'
import { ACTS } from '#shared/review/abilities'
import { moveOf, movesOf, type Move, type Who } from '#shared/review/transitions'
import type { IssueState } from '#shared/review/states'
import type { Act } from '#shared/schemas/issue-view'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { ask, askedOf, WAYS, type Asked, type Way } from '../factories/act-requests'
import { COLUMNS, IssuesInStates, type Column } from '../factories/issues-in-states'
import { allRoutes } from '../factories/routes'
import { Client } from './client'
import { password } from '../factories/people'
import { useServerEnvironment } from './environment'

/** Everybody who may come along, and what of the table they are. */
const PERSONS = {
  analyst: ['analyst', 'project analyst', 'author', 'submitter', 'reader'],
  colleague: ['analyst', 'project analyst', 'reader'],
  checker: ['checker', 'reader'],
  otherChecker: ['reader'],
  approver: ['approver', 'project approver', 'reader'],
  otherApprover: ['project approver', 'reader'],
  administrator: ['administrator', 'reader'],
  auditor: ['reader'],
  outsider: [],
} as const satisfies Record<string, readonly Who[]>
type Person = keyof typeof PERSONS
const everybody = Object.keys(PERSONS) as Person[]

let orm: MikroORM
let issues: IssuesInStates
const seats = {} as Record<Person, Client>
const standing: Partial<Record<Column, string>> = {}

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  issues = await IssuesInStates.with(orm)
  for (const person of everybody) {
    seats[person] = new Client()
    await seats[person].signIn(issues.people[person].email, password)
  }
  for (const column of COLUMNS) standing[column] = await issues.make(column)
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

const stateOf = (column: Column): IssueState => column === 'being released' ? 'for approval' : column
/** The next letter is opened from the note, so from the issue that superseded this one. */
const asked = (column: Column, act: Act): IssueState => column === 'superseded' && act === 'open-next' ? 'released' : stateOf(column)
const known = (id: string) => askedOf(orm, id, issues.named())
const isOne = (person: Person, move: Move) => move.who.some(who => (PERSONS[person] as readonly Who[]).includes(who))
const locked = (column: Column, move: Move) => column === 'being released' && move.needs.includes('unlocked')

/** What the table says: 404 to whom the note is hidden, 403 to whom the act is not for, 409 out of its state, 200 else. */
function expected(column: Column, act: Act, person: Person): number {
  if (person === 'outsider') return 404
  const move = moveOf(asked(column, act), act)
  if (!move) return movesOf(act).some(other => isOne(person, other)) ? 409 : 403
  if (!isOne(person, move)) return 403
  return locked(column, move) ? 409 : 200
}
const allowed = (column: Column, act: Act) => everybody.filter(person => expected(column, act, person) === 200)
/**
 * One person for each answer that is no yes, not always the same one: all pairs of
 * persons and acts are tried without a server by the tests of the abilities.
 */
function refused(column: Column, act: Act): Person[] {
  const turn = COLUMNS.indexOf(column) + ACTS.indexOf(act)
  return [403, 404, 409].flatMap((status) => {
    const among = everybody.filter(person => expected(column, act, person) === status)
    return among.length ? [among[turn % among.length]!] : []
  })
}
const pairs = (chosen: (column: Column, act: Act) => boolean) => COLUMNS.flatMap(column => ACTS.filter(act => chosen(column, act)).map(act => [column, act] as const))
const rowsOf = async (id: string) => {
  const [row] = await orm.em.fork().execute<{ state: string, save_number: number, refused: string, done: string }[]>(
    'select state, save_number, (select count(*) from trail_row where subject_id = issue.id::text and outcome = \'refused\') as refused, (select count(*) from trail_row where subject_id = issue.id::text and outcome = \'done\') as done from issue where id = ?', [id])
  return row!
}

describe('nothing is forgotten', () => {
  it('each act of the table that a person can do is asked for', () => {
    expect(Object.keys(WAYS).sort()).toEqual([...ACTS].sort())
    for (const act of ACTS) expect(movesOf(act).length, act).toBeGreaterThan(0)
    for (const ways of Object.values(WAYS)) expect(ways.length).toBeGreaterThan(0)
  })

  it('each route that changes an issue is a way to an act', () => {
    const ways = new Set(Object.values(WAYS).flat().map(({ method, route }) => `${method} ${route.replace(/\?.*/, '')}`))
    // The pen is laid down by whoever holds it; a draft is printed by whoever sees it.
    const apart = ['DELETE /api/issues/[id]/lease', 'POST /api/issues/[id]/draft-pdf']
    const changing = allRoutes().filter(r => r.method !== 'GET' && (r.policy === 'see-issue' || r.policy === 'see-note')).map(r => `${r.method} ${r.path}`)
    expect(changing.filter(route => !ways.has(route) && !apart.includes(route))).toEqual([])
  })
})

describe('who may not is refused, and nothing changes', () => {
  it.each(pairs((column, act) => refused(column, act).length > 0))('%s: %s', async (column, act) => {
    const id = standing[column]!
    const [facts, before] = [await known(id), await rowsOf(id)]
    const tries = refused(column, act).flatMap(person => WAYS[act].map(way => ({ person, way })))
    const got = await Promise.all(tries.map(async ({ person, way }) => `${person}, ${way.name}: ${(await ask(seats[person], way, facts)).status}`))
    expect(got).toEqual(tries.map(({ person, way }) => `${person}, ${way.name}: ${expected(column, act, person)}`))
    const after = await rowsOf(id)
    expect({ ...after, refused: null }).toEqual({ ...before, refused: null })
    // A stranger is told nothing and leaves no row; the pen is no act.
    const recorded = tries.filter(({ person, way }) => person !== 'outsider' && way.name !== 'take pen').length
    // The next letter's refusal stands under the issue it would have followed.
    if (asked(column, act) === stateOf(column)) expect(Number(after.refused) - Number(before.refused)).toBe(recorded)
  })
})

/** Moves take the issue away from its state; each is tried on a fresh one. */
const moves = (column: Column, act: Act) => moveOf(asked(column, act), act)!.from !== moveOf(asked(column, act), act)!.to || ['release', 'reassign', 'open-next'].includes(act)

describe('who may, may', () => {
  const stays = pairs((column, act) => allowed(column, act).length > 0 && !moves(column, act))
  it.each(stays)('%s: %s', async (column, act) => {
    const id = standing[column]!
    for (const person of allowed(column, act)) {
      for (const way of WAYS[act]) {
        const answer = await ask(seats[person], way, await known(id))
        expect([person, way.name, answer.status, answer.body.code]).toEqual([person, way.name, 200, undefined])
      }
      if (act === 'write') await seats[person].delete(`/api/issues/${id}/lease`)
    }
  })

  /** One for each sort of person the row names; what is opened from the note is opened from the same issue in both columns. */
  const movers = (column: Column, act: Act) => new Set(moveOf(asked(column, act), act)!.who.map(who => everybody.find(person => (PERSONS[person] as readonly Who[]).includes(who))!))
  const moving = pairs((column, act) => asked(column, act) === stateOf(column) && allowed(column, act).length > 0 && moves(column, act))
    .flatMap(([column, act]) => [...movers(column, act)].map(person => [column, act, person] as const))
  it.each(moving)('%s: %s by the %s', async (column, act, person) => {
    const id = await issues.complete(column)
    for (const way of WAYS[act]) expect(await ask(seats[person], way, await known(id))).toMatchObject({ status: 200 })
    const { from, to } = moveOf(asked(column, act), act)!
    if (from !== to) expect((await rowsOf(id)).state).toBe(to)
  })
})

/** The first state in which an act can be done, and somebody who may. */
function rightful(act: Act): [Column, Person] {
  const column = COLUMNS.find(c => allowed(c, act).length > 0)!
  return [column, allowed(column, act)[0]!]
}
const waysWith = (shape: 'stale' | 'malformed') => ACTS.flatMap(act => WAYS[act].filter(way => way[shape] ?? (shape === 'malformed' && way.upload)).map(way => [way.name, act, way] as [string, Act, Way]))

describe('what is asked wrongly', () => {
  it.each(waysWith('malformed'))('%s, malformed, is 422', async (_, act, way) => {
    const [column, person] = rightful(act)
    const before = await rowsOf(standing[column]!)
    const answer = await ask(seats[person], way, await known(standing[column]!), 'malformed')
    expect(answer).toMatchObject({ status: 422, body: { code: 'invalid-input' } })
    expect(await rowsOf(standing[column]!)).toEqual(before)
  })

  it.each(waysWith('stale'))('%s, of a save that has moved on, is 409', async (_, act, way) => {
    const [column, person] = rightful(act)
    const id = act === 'pass' || act === 'submit' ? await issues.complete(column) : standing[column]!
    const before = await rowsOf(id)
    const answer = await ask(seats[person], way, await known(id), 'stale')
    expect(answer.status).toBe(409)
    expect(['stale', 'save-conflict']).toContain(answer.body.code)
    const after = await rowsOf(id)
    expect({ ...after, refused: Number(after.refused) - 1 }).toEqual({ ...before, refused: Number(before.refused) })
  })

  it.each([['in check', 'pass', 'checker']] as const)('%s: %s while something remains is 409 and says what', async (column, act, person) => {
    const answer = await ask(seats[person], WAYS[act][0]!, await known(standing[column]!))
    expect(answer).toMatchObject({ status: 409, body: { code: 'something-remains', details: { remaining: [expect.objectContaining({ id: 'remarks' })] } } })
  })
})

describe('two at once', () => {
  const both: [Column, Act, Person, Act, Person][] = [
    ['draft', 'submit', 'analyst', 'abandon', 'analyst'], ['in check', 'pass', 'checker', 'recall', 'analyst'], ['in check', 'return', 'checker', 'return', 'checker'],
    ['in check', 'pass', 'checker', 'pass', 'checker'], ['for approval', 'release', 'approver', 'release', 'approver'], ['for approval', 'return', 'approver', 'recall', 'analyst'],
    ['for approval', 'release', 'approver', 'return', 'approver'], ['released', 'withdraw', 'approver', 'withdraw', 'otherApprover'], ['released', 'open-next', 'analyst', 'open-next', 'colleague'],
  ]
  it.each(both)('%s: %s by the %s and %s by the %s: one wins', async (column, one, first, other, second) => {
    const id = await issues.complete(column)
    const facts: Asked = await known(id)
    const answers = await Promise.all([ask(seats[first], WAYS[one][0]!, facts), ask(seats[second], WAYS[other][0]!, facts)])
    expect(answers.map(a => a.status).sort()).toEqual([200, 409])
  })
})
