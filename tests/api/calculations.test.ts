/** Calculations of every kind in a note, as the server stores and computes them. */
import { randomUUID } from 'node:crypto'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { createNote } from '#server/commands/create-note'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import type { Evaluation } from '#shared/calc/types'
import type { SaveAnswer } from '#shared/schemas/issue-view'
import { allSamples } from '../factories/calc-samples'
import { thickAngleInputs } from '../factories/general-outline'
import { calculation, withId } from '../factories/note-document'
import { contextOf, makeTeam, password } from '../factories/people'
import { loadCasesInputs } from '../factories/records'
import { solidBarInputs } from '../factories/solid-bar'
import { insertBlock, saveOf } from '../factories/steps'
import { Client } from './client'
import { useServerEnvironment } from './environment'

let orm: MikroORM
let analyst: Client
let team: Awaited<ReturnType<typeof makeTeam>>

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  analyst = new Client()
  await analyst.signIn(team.analyst.email, password)
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
})

async function newNote() {
  const issue = await createNote(contextOf(orm, team.analyst), { projectId: team.project.id, title: 'Calculations of all kinds', part: 'X-2', drawingIssue: 'A' })
  return issue.id
}
/** Puts calculations into the section analysis, one save each, and gives the last answer. */
async function save(issueId: string, blocks: { id: string, kind: string, inputs: Record<string, unknown> }[]) {
  let answer
  for (const { id, kind, inputs } of blocks) {
    const now = (await analyst.get<{ save: number, document: unknown }>(`/api/issues/${issueId}`)).body
    answer = await analyst.put<SaveAnswer>(`/api/issues/${issueId}/content`, saveOf(now.document, now.save, insertBlock('section-analysis', withId(id, calculation(kind, { kind, inputs })))))
    expect(answer.status, `${kind}: ${JSON.stringify(answer.body).slice(0, 300)}`).toBe(200)
  }
  return answer?.body.results as Record<string, Evaluation>
}
const value = (evaluation: Evaluation | undefined, key: string) => (evaluation?.ok ? evaluation.result.outputs.find(o => o.key === key)?.value : undefined)

it('stores and computes a sample of every kind', async () => {
  const issueId = await newNote()
  const kinds = new Map(allSamples().map(sample => [sample.kind, sample]))
  const blocks = [...kinds.values()].map(({ kind, inputs }) => ({ id: randomUUID(), kind, inputs: inputs as Record<string, unknown> }))
  await save(issueId, blocks)
  const { results } = (await analyst.get<{ results: Record<string, Evaluation> }>(`/api/issues/${issueId}`)).body
  for (const { id, kind } of blocks) expect(results[id]?.ok, kind).toBe(true)
})

it('follows a link from save to save: the torque of a record drives a bar, and a changed record changes it', async () => {
  const issueId = await newNote()
  const [record, bar] = [randomUUID(), randomUUID()]
  const results = await save(issueId, [
    { id: record, kind: 'load-cases', inputs: loadCasesInputs() },
    { id: bar, kind: 'solid-bar', inputs: { ...solidBarInputs(), loading: { by: 'table', table: record, quantity: 'T' } } },
  ])
  expect(value(results[bar], 'T@L01')).toBe(12_500)
  const now = (await analyst.get<{ save: number, document: unknown }>(`/api/issues/${issueId}`)).body
  const changed = { ...loadCasesInputs(), rows: loadCasesInputs().rows.map(row => ({ ...row, cells: ['99', '1'] })) }
  const answer = await analyst.put<SaveAnswer>(`/api/issues/${issueId}/content`, saveOf(now.document, now.save, (change, doc) => {
    doc.descendants((node, pos) => {
      if (node.attrs.id === record) change.setNodeAttribute(pos, 'inputs', changed)
      return !node.isTextblock
    })
  }))
  expect(answer.status).toBe(200)
  expect(value((answer.body.results as Record<string, Evaluation>)[bar], 'T@L01')).toBe(99_000)
})

it('solves an outline of the note away from the event loop: others are answered meanwhile', async () => {
  const issueId = await newNote()
  const id = randomUUID()
  const [results, health] = await Promise.all([save(issueId, [{ id, kind: 'general-outline', inputs: { ...thickAngleInputs() } }]), new Client().get('/api/health')])
  expect(health.status).toBe(200)
  expect(value(results[id], 'J')).toBeGreaterThan(0)
})
