/**
 * How each act of the table of moves is asked for over HTTP: every way there is,
 * with what makes it well formed and what makes it malformed. A new act does not
 * compile, and fails the matrix, until it is written here.
 */
import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import type { Act } from '#shared/schemas/issue-view'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { RemarkSchema } from '#server/database/entities/remark'
import type { Client } from '../api/client'
import { calculationIn, issueOf } from './note-on-its-way'
import { password } from './people'
import { saveOf, typeText } from './steps'

/** What is known of the issue when the request is made, read from the database then. */
export interface Asked {
  id: string, number: string, document: unknown, calcId: string, answerId: string, guardKey: string, remarkId: string
  expect: { state: string, save: number }
  /** Who is named on submitting and reassigning. */
  checkerId: string, approverId: string
}

type Body = Record<string, unknown>
export interface Way {
  name: string
  method: 'GET' | 'POST' | 'PUT' | 'PATCH'
  /** The route as its file is named, for the test that none is forgotten. */
  route: string
  body?: (asked: Asked) => Body
  /** The same of a save that has moved on. */
  stale?: (asked: Asked) => Body
  malformed?: (asked: Asked) => Body
  /** A file is uploaded. */
  upload?: boolean
}

const reason = 'The reason is written here.'
const old = (asked: Asked) => ({ ...asked, expect: { ...asked.expect, save: asked.expect.save + 98 } })
const issues = '/api/issues/[id]'

/** An act of one sub-path whose body carries what was seen. */
function seen(act: string, body: (asked: Asked) => Body, malformed: Body): Way {
  const whole = (asked: Asked) => ({ expect: asked.expect, ...body(asked) })
  return { name: act, method: 'POST', route: `${issues}/${act}`, body: whole, stale: asked => whole(old(asked)), malformed: asked => ({ ...whole(asked), ...malformed }) }
}
const plain = (name: string, route: string, body: (asked: Asked) => Body, malformed: Body): Way =>
  ({ name, method: 'POST', route: `${issues}/${route}`, body, malformed: asked => ({ ...body(asked), ...malformed }) })

const content = (asked: Asked) => saveOf(asked.document, asked.expect.save, typeText('scope', 'w ')) as unknown as Body
const titleBlock = (asked: Asked) => ({ title: 'Strip under torsion', part: 'X-1', drawingIssue: 'A', changeNote: 'First issue.', save: asked.expect.save })
const upload = (purpose: string): Way => ({ name: `upload ${purpose}`, method: 'POST', route: `${issues}/files?purpose=${purpose}`, upload: true })

export const WAYS: Readonly<Record<Act, readonly Way[]>> = {
  'write': [
    { name: 'save', method: 'PUT', route: `${issues}/content`, body: content, stale: asked => ({ ...content(asked), baseSave: asked.expect.save + 98 }), malformed: asked => ({ ...content(asked), steps: [] }) },
    { name: 'change title block', method: 'PATCH', route: `${issues}/metadata`, body: titleBlock, stale: asked => titleBlock(old(asked)), malformed: asked => ({ ...titleBlock(asked), title: '' }) },
    { name: 'take pen', method: 'POST', route: `${issues}/lease` },
    { name: 'label save', method: 'PATCH', route: `${issues}/saves/[save]`, body: () => ({ label: 'as drawn' }), malformed: () => ({ label: 7 }) },
    upload('figure'),
  ],
  'answer': [
    plain('answer guard', 'answers', ({ calcId, guardKey }) => ({ calcId, guardKey, text: 'Considered again.' }), { text: '' }),
    plain('explain loose number', 'loose', () => ({ blockId: 'none', text: '12 mm', ordinal: 0, reason: null }), { reason: '' }),
  ],
  'submit': [seen('submit', ({ checkerId, approverId }) => ({ checkerId, approverId }), { checkerId: 'nobody' })],
  'recall': [seen('recall', () => ({}), { expect: null })],
  'return': [seen('return', () => ({ reason }), { reason: '' })],
  'pass': [seen('pass', () => ({ password }), { password: '' })],
  'release': [seen('release', () => ({ password, acceptedDeviations: [] }), { password: '' })],
  'abandon': [seen('abandon', () => ({ reason }), { reason: 'x' })],
  'withdraw': [seen('withdraw', () => ({ reason, password }), { reason: '' })],
  'reassign': [seen('reassign', ({ approverId }) => ({ approverId, reason }), { approverId: undefined })],
  'open-next': [{ name: 'open next issue', method: 'POST', route: '/api/notes/[number]/issues' }],
  'remark': [plain('remark', 'remarks', ({ calcId }) => ({ anchor: { kind: 'calculation', calcId }, text: 'Minimum or nominal thickness?' }), { text: ' ' })],
  'reply': [plain('reply', 'remarks/[remark]/replies', () => ({ text: 'Nominal.' }), { text: '' }), upload('attachment')],
  'close-remark': [plain('set remark state', 'remarks/[remark]/state', () => ({ state: 'open' }), { state: 'answered' })],
  'tick': [plain('tick', 'ticks', ({ calcId }) => ({ calcId, ticked: true }), { calcId: 'none' })],
  'accept': [plain('judge answer', 'answers/[answer]/judge', () => ({ accepted: true, note: '' }), { accepted: false })],
  'check-sheet': [plain('fill check sheet', 'check-sheet', () => ({ item: 1, verdict: 'ok', evidence: 'looked at' }), { item: 0 })],
  'see': [
    { name: 'read issue', method: 'GET', route: issues }, { name: 'read saves', method: 'GET', route: `${issues}/saves` },
    { name: 'read save', method: 'GET', route: `${issues}/saves/[save]` }, { name: 'read candidates', method: 'GET', route: `${issues}/candidates` },
    { name: 'read pen', method: 'GET', route: `${issues}/lease` }, { name: 'read note', method: 'GET', route: '/api/notes/[number]' },
  ],
}

export async function askedOf(orm: MikroORM, id: string, named: { checkerId: string, approverId: string }): Promise<Asked> {
  const em = orm.em.fork()
  const issue = await issueOf(orm, id)
  const answer = await em.findOne(GuardAnswerSchema, { issue: id })
  const remark = await em.findOne(RemarkSchema, { issue: id })
  return {
    id, number: issue.note.number, document: JSON.parse(issue.document) as unknown, calcId: calculationIn(issue), answerId: answer?.id ?? randomUUID(),
    guardKey: answer?.guardKey ?? 'none', remarkId: remark?.id ?? randomUUID(), expect: { state: issue.state, save: issue.saveNumber }, ...named,
  }
}

const addressOf = ({ route }: Way, asked: Asked) => route.replace('issues/[id]', `issues/${asked.id}`).replace('[number]', asked.number)
  .replace('[save]', '1').replace('[answer]', asked.answerId).replace('[remark]', asked.remarkId)

/** One pixel, PNG. */
export const pixel = Buffer.from('iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==', 'base64')

export async function uploadTo(client: Client, path: string, bytes: Buffer, name = 'pixel.png'): Promise<{ status: number, body: { id: string, code?: string } }> {
  const form = new FormData()
  form.append('file', new Blob([new Uint8Array(bytes)]), name)
  const response = await client.raw('POST', path, { body: form })
  const json = await response.json() as { id: string, data?: { id: string, code: string } }
  return { status: response.status, body: json.data ?? json }
}

/** Asks as the screens would. */
export function ask(client: Client, way: Way, asked: Asked, shape: 'body' | 'stale' | 'malformed' = 'body'): Promise<{ status: number, body: { code?: string } }> {
  const path = addressOf(way, asked)
  if (way.upload) return uploadTo(client, path, shape === 'malformed' ? Buffer.alloc(0) : pixel)
  return client.call<{ code?: string }>(way.method, path, way.method === 'GET' ? undefined : way[shape]?.(asked) ?? {})
}
