import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')

/** Debian's Chromium, without the connections it would make by itself. */
export function launch(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
  })
}

interface AxeResult { violations: { id: string, impact: string | null, nodes: { target: string[], failureSummary: string }[] }[] }

/** What axe-core finds against WCAG 2.2 AA on the page as it stands, in lines. */
export async function axe(page: Page): Promise<string[]> {
  // Injected by the driver, so that the page's own content policy stays as it is.
  await page.evaluate(axeSource)
  const { violations } = await page.evaluate(() => (window as unknown as { axe: { run: (where: Document, how: object) => Promise<AxeResult> } }).axe
    .run(document, { runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'] }))
  return violations.flatMap(v => v.nodes.map(n => `${v.id}: ${n.target.join(' ')}: ${n.failureSummary.replace(/\s+/g, ' ')}`))
}

/** A person at a browser of their own; console errors and requests to other hosts are kept for the test to judge. */
export class Seat {
  readonly faults: string[] = []
  private constructor(readonly context: BrowserContext, readonly page: Page, readonly baseUrl: string) {}

  static async take(browser: Browser, baseUrl: string, options: { colorScheme?: 'light' | 'dark', viewport?: { width: number, height: number } } = {}) {
    const context = await browser.newContext({ baseURL: baseUrl, viewport: options.viewport ?? { width: 1440, height: 900 }, colorScheme: options.colorScheme ?? 'light', reducedMotion: 'reduce' })
    context.setDefaultTimeout(20_000)
    const seat = new Seat(context, await context.newPage(), baseUrl)
    seat.page.on('console', message => message.type() === 'error' && !/status of 4\d\d/.test(message.text()) && seat.faults.push(message.text()))
    seat.page.on('pageerror', error => seat.faults.push(String(error)))
    seat.page.on('request', request => !request.url().startsWith(baseUrl) && !/^(data|blob|about):/.test(request.url()) && seat.faults.push(`asked ${request.url()}`))
    return seat
  }

  async signIn(email: string, password: string) {
    await this.page.goto('/sign-in')
    await this.page.getByLabel('E-mail').fill(email)
    await this.page.getByLabel('Password', { exact: true }).fill(password)
    await this.page.getByRole('button', { name: 'Sign in' }).click()
    await this.page.waitForURL(url => !url.pathname.startsWith('/sign-in'))
  }
}
