/** Other kinds of calculation than the open section: chosen, filled in, linked and drawn, on the page. */
import type { MikroORM } from '@mikro-orm/postgresql'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, expect, inject, it } from 'vitest'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { useServerEnvironment } from '../api/environment'
import { draftReady, issueOf, type Team } from '../factories/note-on-its-way'
import { makeTeam, password } from '../factories/people'
import { field, saved, section } from './actors'
import { axe, launch, Seat } from './browser'

let orm: MikroORM
let team: Team
let browser: Browser
const { baseUrl } = inject('running')

beforeAll(async () => {
  const { databaseUrl } = useServerEnvironment()
  useQueue(databaseUrl)
  orm = await connect(databaseUrl)
  team = await makeTeam(orm)
  browser = await launch()
})
afterAll(async () => {
  await browser.close()
  await closeQueue()
  await orm.close()
})

async function insert(seat: Seat, kind: RegExp) {
  await section(seat.page, 'Scope and limits').locator('p').first().click()
  await seat.page.getByRole('toolbar', { name: 'Writing' }).getByRole('button', { name: 'Insert calculation' }).click()
  await seat.page.getByRole('group', { name: 'Insert calculation' }).getByRole('button', { name: kind }).click()
}

it('a solid bar takes its torque from the section before it, and its margin follows what is typed', async () => {
  const { id } = await draftReady(orm, team)
  const seat = await Seat.take(browser, baseUrl)
  await seat.signIn(team.analyst.email, password)
  const { page } = seat
  await page.goto(`/notes/${(await issueOf(orm, id)).note.number}`)
  await page.getByRole('toolbar', { name: 'Writing' }).waitFor()

  await insert(seat, /^Solid bar/)
  const bar = page.getByRole('region', { name: /^Calculation C\d/ }).filter({ has: page.getByLabel('Title of calculation C1') })
  await page.getByLabel('Title of calculation C1').fill('Drive shaft')
  await page.getByLabel('Title of calculation C1').press('Enter')
  await field(page, 'Radius', '18')
  await field(page, 'Name of M1', 'Steel of the example')
  await field(page, 'Shear modulus G of M1', '79')
  await field(page, 'Fsu of M1', '390')
  await field(page, 'Fty of M1', '517')
  await page.getByRole('button', { name: 'Link Torque to a value of the note' }).click()
  const dialog = page.getByRole('dialog')
  expect(await axe(page)).toEqual([])
  await dialog.getByRole('option').first().click()
  await bar.getByRole('button', { name: /^Torque comes from C2/ }).waitFor()
  await bar.getByText('Torsional modulus').first().waitFor()
  await saved(page)
  expect(await axe(page)).toEqual([])

  // An unlinked field takes typed numbers again, and the picture and margin follow at once.
  await bar.getByRole('button', { name: 'Unlink Torque' }).click()
  await field(page, 'Torque', '400')
  // By hand at ultimate: 1.5 · 16 · 400 000 N·mm/(π · 36³ mm³).
  await expect.poll(() => bar.locator('.gov').first().innerText()).toMatch(/65\.50\sMPa of 390/)
  await saved(page)
  await page.screenshot({ path: 'tests/browser/screens/kind-solid-bar.png', fullPage: true })

  // Ten times the torque is too much; the radius that serves is asked for, taken, and passes.
  await field(page, 'Torque', '4000')
  await expect.poll(() => bar.locator('.gov').first().innerText()).toContain('\u22120.41')
  await bar.getByRole('button', { name: 'Ask' }).click()
  await bar.getByLabel('Zero margin by').selectOption({ label: await bar.getByRole('option', { name: /^Radius,/ }).first().innerText() })
  await bar.getByRole('button', { name: 'Find' }).click()
  // By hand: r = ½∛(16 · 4 000 000 N·mm · 1.5/(π · 390 MPa)) = 21.396 mm, rounded up.
  const proposal = bar.getByRole('button', { name: /^Take 21\.4\smm$/ })
  await proposal.waitFor()
  expect(await axe(page)).toEqual([])
  await bar.getByRole('button', { name: 'Compare' }).click()
  await bar.getByRole('cell', { name: 'Radius', exact: true }).waitFor()
  await page.screenshot({ path: 'tests/browser/screens/take-solid-bar.png', fullPage: true })
  await proposal.click()
  await expect.poll(() => bar.locator('.gov').first().innerText()).toContain('+0.00')
  await saved(page)
  await seat.context.close()
})

it('a bar along a span shows its diagrams with a value at every station', async () => {
  const { id } = await draftReady(orm, team)
  const seat = await Seat.take(browser, baseUrl)
  await seat.signIn(team.analyst.email, password)
  const { page } = seat
  await page.goto(`/notes/${(await issueOf(orm, id)).note.number}`)
  await page.getByRole('toolbar', { name: 'Writing' }).waitFor()
  await insert(seat, /^Torque along a bar/)
  await field(page, 'Length of segment 1', '400')
  await field(page, 'Diameter at the start of segment 1', '30')
  await field(page, 'Diameter at the end of segment 1', '30')
  await field(page, 'Shear modulus G of M1', '79')
  await page.getByRole('button', { name: 'Add case' }).click()
  await field(page, 'Id of case 1', 'L01')
  await page.getByRole('button', { name: 'Add torque', exact: true }).click()
  await field(page, 'Node of torque 1', '1')
  await field(page, 'Torque of torque 1', '120')
  const plot = page.getByRole('region', { name: 'Torque along the bar' })
  await plot.getByRole('slider').focus()
  await page.keyboard.press('End')
  await expect.poll(() => plot.getByRole('status').innerText()).toContain('120.0')
  await saved(page)
  expect(await axe(page)).toEqual([])
  await page.screenshot({ path: 'tests/browser/screens/kind-torque-along-bar.png', fullPage: true })
  await seat.context.close()
})
