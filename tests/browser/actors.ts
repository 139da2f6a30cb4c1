import type { Locator, Page } from 'playwright-core'
import type { Seat } from './browser'

export const password = 'a warm torsion bar 41'

/** A new person's first steps: the link from the mail, a password, the sign-in page. */
export async function setPasswordByLink(seat: Seat, link: string, email: string) {
  const { page } = seat
  await page.goto(link)
  await page.getByLabel('New password').fill(password)
  await page.getByRole('button', { name: 'Set the password' }).click()
  await page.getByText('The link cannot be used again.').waitFor()
  await seat.signIn(email, password)
  await page.getByRole('heading', { name: 'Worklist' }).waitFor()
}

export const section = (page: Page, title: string): Locator => page.getByRole('region', { name: new RegExp(`${title}$`) })

/** Marks a section not applicable, as an analyst does: the switch, then the reason. */
export async function notApplicable(page: Page, title: string, reason: string) {
  await page.getByRole('button', { name: `Mark ${title} not applicable` }).click()
  const field = page.getByRole('textbox', { name: `${title} is not applicable because` })
  await field.fill(reason)
  await field.press('Tab')
}

/** Types into the first paragraph of a section. */
export async function write(page: Page, title: string, text: string) {
  await section(page, title).locator('p').first().click()
  await page.keyboard.type(text)
}

/** Fills a field of a calculation and commits it as Enter does. */
export async function field(page: Page, label: string, text: string) {
  const input = page.getByRole('textbox', { name: label, exact: true })
  await input.fill(text)
  await input.press('Enter')
}

/** The strip's own word that everything typed is stored. */
export async function saved(page: Page) {
  await page.locator('[role=status][aria-label="Saving"][data-phase="saved"]').waitFor()
}
