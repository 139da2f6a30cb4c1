import type { MikroORM } from '@mikro-orm/postgresql'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { connect } from '#server/database/orm'
import { closeQueue, useQueue } from '#server/jobs/queue'
import { referenceRows } from '#reference/rows'
import type { ValidationReport } from '#shared/schemas/validation'
import { useServerEnvironment } from '../api/environment'
import { makeTeam, password } from '../factories/people'
import { axe, launch, Seat } from './browser'

let orm: MikroORM
let browser: Browser
let team: Awaited<ReturnType<typeof makeTeam>>
let baseUrl: string

beforeAll(async () => {
  const running = useServerEnvironment()
  baseUrl = running.baseUrl
  useQueue(running.databaseUrl)
  orm = await connect(running.databaseUrl)
  team = await makeTeam(orm)
  browser = await launch()
})
afterAll(async () => {
  await browser.close()
  await closeQueue()
  await orm.close()
})

async function seat(options = {}) {
  const taken = await Seat.take(browser, baseUrl, options)
  await taken.signIn(team.analyst.email, password)
  return taken
}
const all = `All ${referenceRows.length} cases agree.`

/** The page as it stands when the server answers this; reached from another page, so that the browser asks. */
async function answered(change: (report: ValidationReport) => Partial<ValidationReport>) {
  const { page } = await seat()
  await page.route('**/api/validation', async (route) => {
    const report = await (await route.fetch()).json() as ValidationReport
    await route.fulfill({ json: { ...report, ...change(report) } })
  })
  await page.getByRole('link', { name: 'Validation' }).click()
  await page.getByRole('heading', { name: 'Method validation' }).waitFor()
  return page
}

describe('the method validation page', () => {
  it('shows every case, filters in the address, and is clean in both grounds and on a phone', async () => {
    const { page, faults } = await seat({ colorScheme: 'dark' })
    await page.getByRole('link', { name: 'Validation' }).click()
    await page.getByText(all).waitFor()
    expect(await page.locator('tbody tr:not(.group)').count()).toBe(referenceRows.length)
    // Rows are alike: those of one method are enough to look at.
    await page.getByLabel('method').selectOption('10')
    await page.waitForURL(url => url.searchParams.get('method') === '10')
    expect(await axe(page)).toEqual([])
    await page.getByLabel(/^Search case/).fill('°F')
    await page.getByText('2 cases shown').waitFor()
    await page.getByRole('link', { name: 'Clear 2 filters' }).click()
    await page.getByText(`${referenceRows.length} cases shown`).waitFor()
    await page.getByRole('group', { name: 'Outcome' }).getByText('fails').click()
    await page.getByText('No reference case answers to these filters.').waitFor()

    await page.setViewportSize({ width: 390, height: 844 })
    await page.goto('/validation?method=6')
    await page.getByText(all).waitFor()
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390)
    expect(await axe(page)).toEqual([])
    expect(faults).toEqual([])
  })

  it('says at once what fails and what to do', async () => {
    const page = await answered(report => ({ failed: 1, rows: report.rows.map((row, i) => i === 0 ? { ...row, agrees: false, got: null, difference: null, reason: 'Refused: too thin.' } : row) }))
    await page.getByRole('alert').filter({ hasText: '1 case fails.' }).waitFor()
    await page.getByText('Refused: too thin.').waitFor()
    await page.getByRole('link', { name: 'Show what fails' }).click()
    await page.getByText('1 case shown').waitFor()
    expect(await axe(page)).toEqual([])
  })

  it('follows a run that is not at its end', async () => {
    let asked = 0
    const page = await answered((report) => {
      asked += 1
      return asked > 1 ? {} : { state: 'running', judged: 3, rows: report.rows.slice(0, 3), chapters: report.chapters.slice(0, 1) }
    })
    await page.getByRole('progressbar', { name: 'Computing the reference cases' }).waitFor()
    expect(await axe(page)).toEqual([])
    await page.getByText(all).waitFor()
  })

  it('prints what a company files: the cases, what they ran on, and room for signatures', async () => {
    const { page } = await seat()
    await page.goto('/validation')
    await page.getByText(all).waitFor()
    await page.emulateMedia({ media: 'print' })
    expect(await page.getByRole('search').isVisible()).toBe(false)
    expect(await page.getByText('Filed by').isVisible()).toBe(true)
    const pdf = await page.pdf({ preferCSSPageSize: true })
    // A4 landscape in points.
    expect(pdf.toString('latin1')).toMatch(/\/MediaBox \[\s*0 0 84[12](\.\d+)? 59[456](\.\d+)?\s*\]/)
  })
})
