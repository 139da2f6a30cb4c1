import type { MikroORM } from '@mikro-orm/postgresql'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'
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

async function atNote(number: string) {
  const seat = await Seat.take(browser, baseUrl)
  await seat.signIn(team.analyst.email, password)
  await seat.page.goto(`/notes/${number}`)
  await seat.page.getByRole('toolbar', { name: 'Writing' }).waitFor()
  return seat
}
const numberOf = async (id: string) => (await issueOf(orm, id)).note.number
async function add(seat: Seat, text: string) {
  await section(seat.page, 'Scope and limits').locator('p').first().click()
  await seat.page.keyboard.press('End')
  await seat.page.keyboard.type(text)
}
const stored = async (id: string) => (await issueOf(orm, id)).document

describe('writing', () => {
  it('in two places at once loses nothing: the later one puts its words on the newest save', async () => {
    const { id } = await draftReady(orm, team)
    const [here, there] = [await atNote(await numberOf(id)), await atNote(await numberOf(id))]
    await add(here, ' First sentence.')
    await saved(here.page)
    await add(there, ' Second sentence.')
    await there.page.getByRole('heading', { name: /kept save \d+ while you wrote/ }).waitFor()
    await there.page.getByText('Second sentence.').first().waitFor()
    expect(await axe(there.page)).toEqual([])
    await there.page.getByRole('button', { name: 'Put mine on the newest save' }).click()
    await expect.poll(() => stored(id), { timeout: 20_000 }).toContain('Second sentence.')
    await here.context.close()
    await there.context.close()
  })

  it('goes on without a connection, and is sent when it is back', async () => {
    const { id } = await draftReady(orm, team)
    const seat = await atNote(await numberOf(id))
    await seat.context.setOffline(true)
    await add(seat, ' Written on the train.')
    await seat.page.getByText(/^No connection since/).waitFor()
    expect(await stored(id)).not.toContain('Written on the train.')
    await seat.context.setOffline(false)
    await saved(seat.page)
    expect(await stored(id)).toContain('Written on the train.')
    await seat.context.close()
  })

  it('comes back after a crash before it was sent', async () => {
    const { id } = await draftReady(orm, team)
    const seat = await atNote(await numberOf(id))
    await seat.context.setOffline(true)
    await add(seat, ' Kept on this machine.')
    await seat.page.getByText(/^No connection since/).waitFor()
    await seat.page.close({ runBeforeUnload: false })
    await seat.context.setOffline(false)
    const page = await seat.context.newPage()
    await page.goto(`/notes/${await numberOf(id)}`)
    await expect.poll(() => stored(id), { timeout: 20_000 }).toContain('Kept on this machine.')
    await seat.context.close()
  })

  it('undoes a field of a calculation, and the result with it', async () => {
    const { id } = await draftReady(orm, team)
    const { page, context } = await atNote(await numberOf(id))
    await page.getByRole('button', { name: 'Open calculation C1' }).click()
    const thickness = page.getByRole('textbox', { name: 'Thickness of wall a', exact: true })
    const before = await thickness.inputValue()
    await field(page, 'Thickness of wall a', '7')
    await saved(page)
    await thickness.press('Control+z')
    await expect.poll(() => thickness.inputValue()).toBe(before)
    await saved(page)
    expect(await stored(id)).not.toContain('"t":{"text":"7"')
    await context.close()
  })
})
