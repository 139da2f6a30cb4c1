/**
 * A note of two hundred calculations and three hundred pages in use: what a save costs beside a bare transaction of
 * the same payload, and what a key costs in Chromium beside a bare editor with the same text. Run by `npm run bench`,
 * which prints what is written here; nothing is asserted of a time.
 */
import { writeFileSync } from 'node:fs'
import { build } from 'esbuild'
import type { MikroORM } from '@mikro-orm/postgresql'
import type { CDPSession, Page } from 'playwright-core'
import { afterAll, beforeAll, inject, it } from 'vitest'
import { createNote } from '#server/commands/create-note'
import { saveNote } from '#server/commands/save-note'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { noteSchema, readDocument } from '#shared/note/schema'
import type { SaveContent } from '#shared/schemas/notes'
import { useServerEnvironment } from '../api/environment'
import { launch, Seat } from '../browser/browser'
import { calculatedNote, calculationId } from '../factories/calculated-note'
import { issueOf, type Team } from '../factories/note-on-its-way'
import { contextOf, makeTeam, password } from '../factories/people'
import { saveOf, typeText } from '../factories/steps'

export interface Measured { name: string, median: number, least: number, baseline: string, ofBaseline: number }

type Edit = Parameters<typeof saveOf>[2]

/** A smaller note shows sooner where time goes. */
const CALCULATIONS = Number(process.env.TORQUILL_CALCULATIONS ?? 200)
const PAGES = Number(process.env.TORQUILL_PAGES ?? 300)
const found: Measured[] = []
let orm: MikroORM
let team: Team
let issueId: string

const sorted = (times: number[]) => [...times].sort((a, b) => a - b)
const median = (times: number[]) => sorted(times)[times.length >> 1] ?? Number.NaN
function tell(name: string, times: number[], baseline: string, base: number[]) {
  found.push({ name, median: median(times), least: Math.min(...times), baseline, ofBaseline: median(times) / median(base) })
}

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  const issue = await createNote(contextOf(orm, team.analyst), { projectId: team.project.id, title: 'A large note', part: 'X-1', drawingIssue: 'A' })
  issueId = issue.id
  await save((change, doc) => {
    const large = readDocument(calculatedNote(CALCULATIONS, PAGES))
    change.replaceWith(0, doc.content.size, noteSchema().node('doc', null, large.content).content)
  })
})
afterAll(async () => {
  await closeQueue()
  await orm.close()
  const report = process.env.TORQUILL_MEASURED
  if (report) writeFileSync(report, JSON.stringify(found))
})

async function save(edit: Edit): Promise<number> {
  const issue = await issueOf(orm, issueId)
  const payload: SaveContent = saveOf(JSON.parse(issue.document), issue.saveNumber, edit)
  const began = performance.now()
  await saveNote(contextOf(orm, team.analyst), issueId, payload)
  return performance.now() - began
}

async function repeated(times: number, once: (i: number) => Promise<number>): Promise<number[]> {
  const all: number[] = []
  for (let i = 0; i < times; i += 1) all.push(await once(i))
  return all.slice(2)
}

it('saves', { timeout: 300_000 }, async () => {
  const stored = await issueOf(orm, issueId)
  const transaction = await repeated(14, async () => {
    const began = performance.now()
    await orm.em.fork().transactional(async (em) => {
      const run = (sql: string, values: unknown[]) => em.getConnection().execute(sql, values, 'run', em.getTransactionContext())
      await run('select document, results from issue where id = ? for update', [issueId])
      await run('update issue set document = ?, results = ? where id = ?', [stored.document, stored.results, issueId])
    })
    return performance.now() - began
  })
  const load = (kN: string): Edit => (change, doc) => doc.descendants((node, at) => {
    if (node.attrs.id !== calculationId(0)) return
    const inputs = JSON.stringify(node.attrs.inputs).replace(/"text":"[\d.]+","unit":"kN"/, `"text":"${kN}","unit":"kN"`)
    change.setNodeAttribute(at, 'inputs', JSON.parse(inputs) as unknown)
  })
  const words = await repeated(14, () => save(typeText('scope', 'a ')))
  const dependents = await repeated(14, i => save(load(String(11 + i))))
  const everything = await repeated(8, async () => {
    await orm.em.fork().getConnection().execute('update issue set engine_version = ? where id = ?', ['of another engine', issueId])
    return save(typeText('scope', 'b '))
  })
  const baseline = 'a bare transaction of the same payload'
  tell('a save that changes words', words, baseline, transaction)
  tell('a save of one load, and the five bars that take it', dependents, baseline, transaction)
  tell('a save under a new engine: all computed', everything, baseline, transaction)
})

/** Script, style and layout of one key, ms: the mean over a run of keys, since the browser's own counters are coarse. */
async function perKey(cdp: CDPSession, page: Page, text: string): Promise<number> {
  const spent = async () => {
    const { metrics } = await cdp.send('Performance.getMetrics')
    return ['ScriptDuration', 'LayoutDuration', 'RecalcStyleDuration'].reduce((sum, name) => sum + (metrics.find(each => each.name === name)?.value ?? 0), 0) * 1000
  }
  const before = await spent()
  for (const key of text) {
    await page.keyboard.press(key)
    await page.evaluate(() => new Promise(done => requestAnimationFrame(() => requestAnimationFrame(done))))
  }
  return (await spent() - before) / text.length
}

const RUNS = ['torsion of', 'the second', 'flange and', 'a web that', 'is thinner'].map(each => each.replaceAll(' ', 'x'))

it('is typed into', { timeout: 600_000 }, async () => {
  const browser = await launch()
  const seat = await Seat.take(browser, inject('running').baseUrl)
  seat.context.setDefaultTimeout(120_000)
  const bareKeys = await bareEditor(await seat.context.newPage())
  await seat.signIn(team.analyst.email, password)
  const began = performance.now()
  await seat.page.goto(`/notes/${(await issueOf(orm, issueId)).note.number}`)
  await seat.page.getByRole('toolbar', { name: 'Writing' }).waitFor()
  const opened = performance.now() - began
  const cdp = await seat.context.newCDPSession(seat.page)
  await cdp.send('Performance.enable')
  await seat.page.getByRole('region', { name: /Scope and limits$/ }).locator('p').first().click()
  const keys: number[] = []
  for (const run of RUNS) keys.push(await perKey(cdp, seat.page, run))
  const field = seat.page.getByRole('textbox', { name: 'Radius', exact: true }).first()
  if (!await field.isVisible()) await seat.page.getByRole('button', { name: /^Open/ }).nth(1).click()
  await field.click()
  const preview: number[] = []
  for (const run of ['18', '181', '19', '20', '21']) {
    await field.fill('')
    preview.push(await perKey(cdp, seat.page, run))
  }
  const baseline = 'a bare editor with the same text'
  tell('a key in the text', keys, baseline, bareKeys)
  tell('a key in a field of a calculation, with its preview', preview, baseline, bareKeys)
  found.push({ name: 'opening the note', median: opened, least: opened, baseline: '', ofBaseline: Number.NaN })
  await browser.close()
})

/** ProseMirror with the note's text as plain paragraphs and nothing else. */
async function bareEditor(page: Page): Promise<number[]> {
  const doc = readDocument(calculatedNote(CALCULATIONS, PAGES))
  const texts: string[] = []
  doc.descendants((node) => {
    if (node.isTextblock) texts.push(node.textContent)
  })
  const source = `import { EditorState } from '@tiptap/pm/state'; import { EditorView } from '@tiptap/pm/view'; import { Schema } from '@tiptap/pm/model'
    const schema = new Schema({ nodes: { doc: { content: 'paragraph+' }, paragraph: { content: 'text*', toDOM: () => ['p', 0] }, text: {} } })
    const texts = ${JSON.stringify(texts)}
    const doc = schema.node('doc', null, texts.map(text => schema.node('paragraph', null, text ? [schema.text(text)] : [])))
    window.view = new EditorView(document.body, { state: EditorState.create({ doc }) })`
  const { outputFiles } = await build({ stdin: { contents: source, resolveDir: process.cwd() }, bundle: true, write: false, format: 'iife' })
  await page.setContent('<!doctype html><body></body>')
  await page.addScriptTag({ content: outputFiles[0]?.text ?? '' })
  const cdp = await page.context().newCDPSession(page)
  await cdp.send('Performance.enable')
  await page.locator('p').first().click()
  const keys: number[] = []
  for (const run of RUNS) keys.push(await perKey(cdp, page, run))
  return keys
}
