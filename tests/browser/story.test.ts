import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { execFileSync, spawnSync } from 'node:child_process'
import smtpTester from 'smtp-tester'
import { afterAll, afterEach, beforeAll, describe, expect, inject, it } from 'vitest'
import type { Browser } from 'playwright-core'
import { commandOf } from '../../server/cli/services.mjs'
import { field, notApplicable, password, saved, section, setPasswordByLink, write } from './actors'
import { axe, launch, Seat } from './browser'

interface Letter { headers: { subject: string }, body: string, html: string, receivers: Record<string, boolean> }

const running = inject('running')
const title = 'Bracket lug under torsion'
const people = {
  analyst: { name: 'Berit Aamodt', email: 'berit.aamodt@example.org' },
  checker: { name: 'Joaquim Pires', email: 'joaquim.pires@example.org' },
  approver: { name: 'Saoirse Lynn', email: 'saoirse.lynn@example.org' },
  auditor: { name: 'Wanjiru Kamau', email: 'wanjiru.kamau@example.org' },
}
const administrator = { name: 'Emil Sorge', email: 'emil.sorge@example.org' }

let browser: Browser
let mailServer: ReturnType<typeof smtpTester.init>
const letters: Letter[] = []
const seats = {} as Record<keyof typeof people | 'administrator', Seat>
let folder: string

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'torquill-story-'))
  mailServer = smtpTester.init(running.mailPort)
  mailServer.bind((_address: string, _id: number, letter: unknown) => letters.push(letter as Letter))
  browser = await launch()
  for (const name of ['administrator', 'analyst', 'checker', 'approver', 'auditor'] as const) seats[name] = await Seat.take(browser, running.baseUrl)
})
// What each person saw when a step failed.
afterEach(async ({ task }) => {
  if (task.result?.state !== 'fail') return
  for (const [name, seat] of Object.entries(seats)) await seat.page.screenshot({ path: `tests/browser/screens/${name}.png` })
})
afterAll(async () => {
  await browser?.close()
  mailServer?.stop(() => undefined)
})

/** The newest letter to somebody whose subject says so, once it has come. */
async function letterTo(email: string, subject: RegExp): Promise<Letter> {
  const found = () => letters.findLast(l => email in l.receivers && subject.test(l.headers.subject))
  await expect.poll(() => found() !== undefined, { timeout: 20_000, message: `a letter to ${email} about ${subject}` }).toBe(true)
  return found()!
}
const linkIn = (letter: Letter) => /https?:\/\/\S+\/(password|notes)\/\S+/.exec(letter.body)![0]

/** No page of the story has a finding of axe-core, an error in its console, or a request to another host. */
async function clean(seat: Seat, place: string) {
  expect(await axe(seat.page), place).toEqual([])
  expect(seat.faults, place).toEqual([])
}

async function open(seat: Seat) {
  await seat.page.goto('/')
  await seat.page.getByRole('link', { name: /^P-\d+/ }).first().click()
  await seat.page.getByRole('heading', { name: title }).waitFor()
}

describe.sequential('from an empty register to a released PDF', () => {
  it('the administrator opens a project and adds four people, who set their passwords', async () => {
    const seat = seats.administrator
    const link = execFileSync(process.execPath, commandOf(running.build, 'create-administrator', administrator.email, administrator.name), {
      encoding: 'utf8', env: { ...process.env, DATABASE_URL: running.databaseUrl, TORQUILL_BASE_URL: running.baseUrl, NUXT_AUTH_SECRET: running.authSecret },
    }).trim().split('\n').pop()!
    await setPasswordByLink(seat, link, administrator.email)
    const { page } = seat
    await page.getByRole('link', { name: 'People', exact: true }).click()
    await page.getByRole('button', { name: 'Add a project' }).click()
    await page.getByLabel('Code').fill('P-77')
    await page.getByLabel('Name').fill('Cargo hoist')
    await page.getByLabel('Note numbers').fill('P-77-{0000}')
    await page.getByLabel(/^Basis of certification/).fill('CS-25.303, 25.305, 25.613')
    await page.getByRole('button', { name: 'Add the project' }).click()
    await page.getByRole('dialog').waitFor({ state: 'hidden' })
    for (const [role, { name, email }] of Object.entries(people)) {
      await page.getByRole('button', { name: 'Add a person' }).click()
      await page.getByLabel('Name').fill(name)
      await page.getByLabel('E-mail address').fill(email)
      if (role === 'auditor') await page.getByRole('dialog').getByLabel('Auditor').check()
      await page.getByRole('button', { name: 'Add and send the link' }).click()
      await page.getByRole('heading', { name: new RegExp(name) }).waitFor()
      if (role === 'auditor') continue
      await page.getByRole('group', { name: 'Roles in P-77' }).getByText(role).click()
      await page.getByText(`P-77: ${role}.`).waitFor()
    }
    await clean(seat, 'people')
    for (const role of Object.keys(people) as (keyof typeof people)[]) {
      await setPasswordByLink(seats[role], linkIn(await letterTo(people[role].email, /Torquill/)), people[role].email)
    }
    await clean(seats.analyst, 'empty worklist')
  })

  it('the analyst drafts a note with a live calculation', async () => {
    const { page } = seats.analyst
    await page.getByRole('link', { name: 'Register', exact: true }).click()
    await page.getByRole('heading', { name: 'Register' }).waitFor()
    await clean(seats.analyst, 'empty register')
    await page.getByRole('button', { name: 'New note' }).first().click()
    const dialog = page.getByRole('dialog', { name: 'New note' })
    await dialog.getByLabel('Title').fill(title)
    await dialog.getByLabel('Part number').fill('P77-2104-11')
    await dialog.getByLabel('Drawing issue').fill('A')
    await page.getByRole('button', { name: 'Open the note' }).click()
    await page.getByRole('heading', { name: title }).waitFor()
    await write(page, 'Scope and limits', 'The lug of the hoist bracket, both hands. Fatigue and the pin are treated elsewhere.')
    await saved(page)

    await section(page, 'Section analysis').locator('p').first().click()
    await page.getByRole('toolbar', { name: 'Writing' }).getByRole('button', { name: 'Insert calculation' }).click()
    await page.getByRole('group', { name: 'Insert calculation' }).getByRole('button', { name: /^Open section/ }).click()
    await page.getByLabel('Title of calculation C1').fill('Lug strip')
    await page.getByLabel('Title of calculation C1').press('Enter')
    await field(page, 'Length of wall a', '60')
    await field(page, 'Thickness of wall a', '5')
    await field(page, 'Torque', '20')
    await field(page, 'Source of the torque', 'P77-LDS-03 issue 2, page 14')
    await field(page, 'Name of M1', '7050-T7451')
    await field(page, 'Specification of M1', 'P77-MS-7050')
    await field(page, 'Form of M1', 'plate')
    await field(page, 'Thickness range of M1', '4 to 25 mm')
    await field(page, 'Source of M1', 'P77-MD-12 table 1')
    await field(page, 'Edition of M1', '2')
    await page.getByRole('group', { name: 'Material M1' }).getByText('A', { exact: true }).click()
    await field(page, 'Modulus E of M1', '71')
    await field(page, 'Shear modulus G of M1', '26.9')
    await field(page, 'Poisson ratio of M1', '0.33')
    await field(page, 'Ftu of M1', '510')
    await field(page, 'Fty of M1', '441')
    await field(page, 'Fsu of M1', '296')
    await saved(page)
    // 60 × 5 mm strip: J = 60·5³/3·(1 − 0.630249·5/60) = 2368.7 mm⁴ (methods §1.9), face stress T·t/J = 42.218 MPa.
    await page.getByText('server, save').waitFor()
    await page.getByText('42.22').first().waitFor()
    await clean(seats.analyst, 'open calculation')
    await page.getByRole('button', { name: 'Close calculation C1' }).click()
  })

  it('ties a number, explains the rest and finishes the text', async () => {
    const { page } = seats.analyst
    await write(page, 'Stresses', 'The peak shear on the faces is ')
    await page.keyboard.press('Control+Shift+E')
    await page.getByLabel('Search outputs').fill('largest face')
    await page.getByLabel('Search outputs').press('Enter')
    await page.keyboard.type(', far below the allowable.')
    await write(page, 'Conclusion and statement of compliance', 'Adequate for torsion at limit and ultimate load.')
    for (const name of ['References', 'Description', 'Assumptions', 'Geometry', 'Materials and allowables', 'Load cases', 'Span analysis', 'Stability', 'Deflections', 'Sensitivity', 'Open points and limitations']) {
      await notApplicable(page, name, 'the lug is a plain strip and this note is short')
    }
    await saved(page)
    await expect.poll(() => section(page, 'Stresses').innerText()).toContain('42.2')
    await clean(seats.analyst, 'draft')
  })

  it('answers what the guards ask and submits for check', async () => {
    const { page } = seats.analyst
    await page.getByRole('button', { name: 'Open calculation C1' }).click()
    const asked = page.getByRole('textbox', { name: /^(Answer|Deviation) to / })
    while (await asked.count()) {
      const before = await asked.count()
      await asked.first().fill('The lug is plane, its ends are free and its load is static by the loads document.')
      await page.getByRole('button', { name: /^Keep (answer|deviation)$/ }).first().click()
      await expect.poll(() => asked.count()).toBeLessThan(before)
    }
    await page.getByRole('button', { name: 'Close calculation C1' }).click()
    const submit = page.getByRole('button', { name: 'Submit for check', exact: true })
    await submit.first().waitFor()
    await submit.first().click()
    const dialog = page.getByRole('dialog', { name: 'Submit for check' })
    await dialog.getByLabel('Checker').selectOption({ label: people.checker.name })
    await dialog.getByLabel('Approver').selectOption({ label: people.approver.name })
    await clean(seats.analyst, 'submit dialog')
    await dialog.getByRole('button', { name: 'Submit for check' }).click()
    await dialog.waitFor({ state: 'hidden' })
    await page.getByText('in check', { exact: false }).first().waitFor()
  })

  it('the checker remarks and returns it', async () => {
    await letterTo(people.checker.email, /P-77-0001 A/)
    await open(seats.checker)
    const { page } = seats.checker
    await section(page, 'Conclusion and statement of compliance').locator('p').first().click({ clickCount: 3 })
    await page.getByRole('button', { name: 'Remark', exact: true }).first().click()
    await page.getByRole('textbox', { name: 'Remark', exact: true }).fill('Name the paragraph that is met.')
    await page.getByRole('button', { name: 'Keep remark' }).click()
    await page.getByRole('group', { name: 'Remark 1, open' }).first().waitFor()
    await clean(seats.checker, 'check')
    await page.getByRole('button', { name: 'Return', exact: true }).click()
    const dialog = page.getByRole('dialog')
    await dialog.getByLabel('Reason').fill('The conclusion names no paragraph.')
    await dialog.getByRole('button', { name: 'Return' }).click()
    await dialog.waitFor({ state: 'hidden' })
  })

  it('the analyst mends it, answers the remark and submits again', async () => {
    const letter = await letterTo(people.analyst.email, /returned by Joaquim Pires/)
    const { page } = seats.analyst
    await page.goto(linkIn(letter))
    await page.getByRole('heading', { name: title }).waitFor()
    await section(page, 'Conclusion and statement of compliance').locator('p').first().click()
    await page.keyboard.press('End')
    await page.keyboard.type(' CS-25.305 is met.')
    await saved(page)
    await page.getByRole('button', { name: 'Reply to remark 1' }).first().click()
    await page.getByRole('textbox', { name: 'Reply to remark 1' }).fill('The paragraph is named now.')
    await page.getByRole('button', { name: 'Send reply' }).click()
    await page.getByRole('group', { name: 'Remark 1, answered' }).first().waitFor()
    await page.getByRole('button', { name: 'Submit for check', exact: true }).first().click()
    const dialog = page.getByRole('dialog', { name: 'Submit for check' })
    await dialog.getByRole('button', { name: 'Submit for check' }).click()
    await dialog.waitFor({ state: 'hidden' })
  })

  it('the checker follows everything and passes it', async () => {
    await letterTo(people.analyst.email, /remark 1/)
    await open(seats.checker)
    const { page } = seats.checker
    await page.getByRole('button', { name: 'Close remark 1' }).first().click()
    await page.getByRole('button', { name: 'Open calculation C1' }).click()
    const accept = page.getByRole('button', { name: /^Accept the / })
    while (await accept.count()) {
      const before = await accept.count()
      await accept.first().click()
      await expect.poll(() => accept.count()).toBeLessThan(before)
    }
    await page.getByLabel(/^I have followed calculation/).first().check()
    await page.getByText(/^Ticked: /).first().waitFor()
    await page.getByRole('button', { name: 'Close calculation C1' }).click()
    const items = page.getByRole('region', { name: 'Check sheet' }).getByRole('group', { name: /^Item \d+$/ })
    for (let i = 0; i < await items.count(); i++) {
      await items.nth(i).getByText('OK', { exact: true }).click()
      await expect.poll(() => items.nth(i).getByRole('radio', { checked: true }).count()).toBe(1)
    }
    await clean(seats.checker, 'check sheet')
    await page.getByRole('button', { name: 'Pass', exact: true }).click()
    const dialog = page.getByRole('dialog')
    await dialog.getByLabel(/^Your password/).fill('not this')
    await dialog.getByRole('button', { name: 'Pass' }).click()
    await dialog.getByText('This is not your password').first().waitFor()
    await dialog.getByLabel(/^Your password/).fill(password)
    await dialog.getByRole('button', { name: 'Pass' }).click()
    await dialog.waitFor({ state: 'hidden' })
  })

  it('the approver releases it, and the signed PDF is made', async () => {
    await letterTo(people.approver.email, /P-77-0001 A/)
    await open(seats.approver)
    const { page } = seats.approver
    await page.getByRole('button', { name: 'Release', exact: true }).click()
    const dialog = page.getByRole('dialog')
    for (const box of await dialog.getByRole('checkbox').all()) await box.check()
    await dialog.getByLabel(/^Your password/).fill(password)
    await clean(seats.approver, 'release dialog')
    await dialog.getByRole('button', { name: 'Release' }).click()
    await page.getByRole('link', { name: 'Signed PDF' }).waitFor({ timeout: 60_000 })
    await clean(seats.approver, 'released')
    const letter = await letterTo(people.analyst.email, /P-77-0001 A: released/i)
    expect(letter.html).toContain('P-77-0001')
  })

  it('outside tools find the PDF whole, signed and not changed since', async () => {
    const { context, page } = seats.approver
    const href = await page.getByRole('link', { name: 'Signed PDF' }).getAttribute('href')
    const pdf = await (await context.request.get(href!)).body()
    const file = join(folder, 'note.pdf')
    writeFileSync(file, pdf)
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-')
    const says = (command: string, ...args: string[]) => spawnSync(command, args, { encoding: 'utf8' })
    expect(says('pdfsig', file).stdout).toMatch(/Total document signed[\s\S]*Signature is Valid/)
    expect(says('qpdf', '--check', file).status).toBe(0)
    expect(says('mutool', 'sign', '-v', file).stdout).toContain('The document is unchanged since signing')
    const text = says('pdftotext', '-layout', file, '-').stdout
    for (const { name } of [people.analyst, people.checker, people.approver]) expect(text).toContain(name)
    expect(text).toMatch(/P-77-0001/)
    expect((await seats.administrator.context.request.get(href!)).status()).toBe(200)
    // A stranger is led to the sign-in page, and gets no PDF.
    const stranger = await (await browser.newContext({ baseURL: running.baseUrl })).request.get(href!)
    expect(stranger.headers()['content-type']).not.toContain('pdf')
    expect((await stranger.body()).subarray(0, 5).toString()).not.toBe('%PDF-')
  })

  it('the auditor reads the trail, opens a save and verifies the chain', async () => {
    const { page } = seats.auditor
    await page.getByRole('link', { name: 'Trail', exact: true }).click()
    await page.getByRole('heading', { name: 'Trail' }).waitFor()
    for (const act of ['Release', 'Pass', 'Return', 'Submit', 'Create note']) await page.getByRole('button', { name: act, exact: true }).first().waitFor()
    await page.getByRole('button', { name: /^Verify all/ }).click()
    await page.getByText(/^All \d+ chains hold\.$/).waitFor()
    await clean(seats.auditor, 'trail')
  })
})
