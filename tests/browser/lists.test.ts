import type { MikroORM } from '@mikro-orm/postgresql'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createNote } from '#server/commands/create-note'
import { MailSchema } from '#server/database/entities/mail'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { useServerEnvironment } from '../api/environment'
import { contextOf, makeTeam, password } from '../factories/people'
import { axe, launch, Seat } from './browser'

let orm: MikroORM
let browser: Browser
let team: Awaited<ReturnType<typeof makeTeam>>
let baseUrl: string
const notes = [['Latch shaft', 'P-1'], ['Guide rail, channel', 'P-2'], ['Hat stiffener between ribs 3 and 4', 'P-3']] as const

beforeAll(async () => {
  const running = useServerEnvironment()
  baseUrl = running.baseUrl
  useQueue(running.databaseUrl)
  orm = await connect(running.databaseUrl)
  team = await makeTeam(orm)
  for (const [title, part] of notes) await createNote(contextOf(orm, team.analyst), { projectId: team.project.id, title, part, drawingIssue: 'A' })
  browser = await launch()
})
afterAll(async () => {
  await browser.close()
  await closeQueue()
  await orm.close()
})

const seatOf = async (person: { email: string }, options = {}) => {
  const seat = await Seat.take(browser, baseUrl, options)
  await seat.signIn(person.email, password)
  return seat
}

describe('signing in', () => {
  it('keeps the address that was asked for, what was typed, and this site', async () => {
    const { page } = await Seat.take(browser, baseUrl)
    await page.goto('/notes?q=hat')
    await page.getByRole('heading', { name: 'Sign in' }).waitFor()
    await page.getByLabel('E-mail').fill(team.analyst.email)
    await page.getByLabel('Password', { exact: true }).fill('not this one')
    await page.keyboard.press('Enter')
    await page.getByRole('alert').waitFor()
    expect(await page.getByLabel('E-mail').inputValue()).toBe(team.analyst.email)
    await page.getByLabel('Password', { exact: true }).fill(password)
    await page.keyboard.press('Enter')
    await page.getByRole('heading', { name: 'Register' }).waitFor()
    expect(new URL(page.url()).search).toBe('?q=hat')
    await page.getByText('1 note found').waitFor()
  })

  it('never leads to another site', async () => {
    const { page } = await Seat.take(browser, baseUrl)
    await page.goto('/sign-in?to=//evil.example')
    await page.getByLabel('E-mail').fill(team.analyst.email)
    await page.getByLabel('Password', { exact: true }).fill(password)
    await page.keyboard.press('Enter')
    await page.getByRole('heading', { name: 'Worklist' }).waitFor()
    expect(new URL(page.url()).origin).toBe(new URL(baseUrl).origin)
  })

  it('is asked of nobody for a page of somebody else\'s duty: 403 in words', async () => {
    const seat = await seatOf(team.analyst, { colorScheme: 'dark' })
    const { page } = seat
    const answer = await page.goto('/people')
    expect(answer?.status()).toBe(403)
    await page.getByText('ask one').waitFor()
    // The page's own content policy must let its scripts run: the ground is set by one of them.
    expect(await page.evaluate(() => document.documentElement.dataset.theme)).toBe('dark')
    expect(seat.faults.filter(fault => fault.includes('Content Security Policy'))).toEqual([])
    expect(await axe(page)).toEqual([])
  })
})

describe('the register', () => {
  it('is searched and sorted in the address, clean in both grounds and on a phone', async () => {
    const seat = await seatOf(team.analyst, { colorScheme: 'dark', viewport: { width: 390, height: 844 } })
    const { page } = seat
    await page.goto('/notes')
    expect(await page.evaluate(() => document.documentElement.dataset.theme)).toBe('dark')
    expect(await axe(page)).toEqual([])
    await page.setViewportSize({ width: 320, height: 800 })
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(320)
    await page.setViewportSize({ width: 1440, height: 900 })
    await page.getByLabel(/^Search number/).fill('latch')
    await page.getByText('1 note found').waitFor()
    expect(page.url()).toContain('q=latch')
    await page.getByRole('link', { name: 'Clear 1 filter' }).click()
    await page.getByText('3 notes', { exact: true }).waitFor()
    await page.getByRole('button', { name: 'Title' }).click()
    await page.waitForURL(url => url.searchParams.get('sort') === 'title')
    await page.waitForFunction(() => document.querySelector('tbody .ti')?.textContent?.startsWith('Guide'))
    expect(await axe(page)).toEqual([])
    expect(seat.faults).toEqual([])
  })

  it('keeps the chosen ground, from the server on', async () => {
    const { page, context } = await seatOf(team.analyst)
    await page.getByRole('button', { name: team.analyst.name }).click()
    await page.getByRole('menuitem', { name: 'Dark' }).click()
    await page.waitForFunction(() => document.documentElement.dataset.theme === 'dark')
    expect(await (await context.request.get('/notes')).text()).toMatch(/<html[^>]*data-theme="dark"/)
  })

  it('opens a note by keys alone', async () => {
    const { page } = await seatOf(team.analyst)
    await page.getByRole('heading', { name: 'Worklist' }).waitFor()
    await page.keyboard.press('/')
    await page.getByRole('dialog', { name: 'Go to a note or part' }).waitFor()
    await page.keyboard.type('latch')
    await page.getByText('1 found').waitFor()
    expect(await axe(page)).toEqual([])
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('Enter')
    await page.waitForURL('**/notes/*-0001')
  })

  it('lets single keys be switched off', async () => {
    const { page } = await seatOf(team.analyst)
    await page.getByRole('heading', { name: 'Worklist' }).waitFor()
    await page.keyboard.press('?')
    await page.getByLabel('Single keys work').uncheck()
    await page.keyboard.press('Escape')
    await page.getByRole('dialog').waitFor({ state: 'hidden' })
    await page.keyboard.press('/')
    expect(await page.getByRole('dialog').count()).toBe(0)
  })
})

describe('people', () => {
  it('are added, given roles, and come in by their link', async () => {
    const seat = await seatOf(team.administrator)
    const { page } = seat
    await page.getByRole('link', { name: 'People', exact: true }).click()
    await page.getByRole('heading', { name: 'People and projects' }).waitFor()
    await page.waitForFunction(() => document.activeElement?.id === 'content')
    await page.getByRole('button', { name: 'Add a person' }).click()
    await page.getByLabel('Name').fill('Greta Olufsen')
    await page.getByLabel('E-mail address').fill('greta')
    await page.getByRole('button', { name: 'Add and send the link' }).click()
    await page.getByText('Type an e-mail address').waitFor()
    await page.getByLabel('E-mail address').fill('greta.olufsen@example.org')
    await page.getByRole('button', { name: 'Add and send the link' }).click()
    await page.getByRole('heading', { name: /Greta Olufsen/ }).waitFor()
    await page.getByRole('group', { name: `Roles in ${team.project.code}` }).getByText('checker').click()
    await page.getByText(`${team.project.code}: checker.`).waitFor()
    expect(await axe(page)).toEqual([])
    expect(seat.faults).toEqual([])

    const mail = await orm.em.fork().findOneOrFail(MailSchema, { recipient: { email: 'greta.olufsen@example.org' } })
    const guest = await Seat.take(browser, baseUrl)
    await guest.page.goto(String(mail.props.url))
    await guest.page.getByLabel('New password').fill('short')
    await guest.page.getByRole('button', { name: 'Set the password' }).click()
    await guest.page.getByText('Use at least 10 characters.').waitFor()
    await guest.page.getByLabel('New password').fill('a warm torsion bar')
    await guest.page.getByRole('button', { name: 'Set the password' }).click()
    await guest.page.getByText('The link cannot be used again.').waitFor()
    await guest.signIn('greta.olufsen@example.org', 'a warm torsion bar')
    await guest.page.getByRole('heading', { name: 'Worklist' }).waitFor()
    expect(await axe(guest.page)).toEqual([])
  })
})

describe('the trail', () => {
  it('lists, filters, opens and verifies', async () => {
    const seat = await seatOf(team.auditor)
    const { page } = seat
    await page.goto('/trail?act=create%20note')
    await page.getByRole('button', { name: 'Create note' }).first().click()
    await page.getByRole('heading', { name: 'What ties it to the chain' }).waitFor()
    await page.getByRole('button', { name: /^Verify all/ }).click()
    await page.getByText(/^All \d+ chains hold\.$/).waitFor()
    expect(await axe(page)).toEqual([])
    expect(seat.faults).toEqual([])
  })
})
