/** The browser previews what the server computes: both must give the same numbers, whatever engine of JavaScript they run on. */
import { fileURLToPath } from 'node:url'
import { build } from 'esbuild'
import { expect, it } from 'vitest'
import { loadEngine } from '#reference/engine'
import { chapterOf, rowKey, sectionOf } from '#reference/method-sections'
import type { ReferenceRow } from '#reference/row'
import { referenceRows } from '#reference/rows'
import { launch } from './browser'

/**
 * Elementary functions (sin, log, atan2 …) differ in the last bit between versions of V8. Closed forms keep that;
 * the boundary equations of an outline multiply it by their condition, some 10⁴.
 */
const mostFor = (row: ReferenceRow): number => chapterOf(sectionOf(row)) === '4' ? 1e-10 : 1e-12
const root = fileURLToPath(new URL('../..', import.meta.url))

/** The rows and the engine as one script that puts their values on the page. */
async function script(): Promise<string> {
  const { outputFiles: [file] } = await build({
    stdin: { resolveDir: root, contents: `
      import { loadEngine } from '#reference/engine'
      import { referenceRows } from '#reference/rows'
      globalThis.values = loadEngine().then(engine => referenceRows.map(row => row.actual(engine)))` },
    bundle: true, write: false, format: 'iife', platform: 'browser', target: 'chrome120', logLevel: 'warning',
  })
  if (!file) throw new Error('esbuild gave no script')
  return file.text
}

it('Chromium and Node.js give every reference case alike', async () => {
  const engine = await loadEngine()
  const here = referenceRows.map(row => row.actual(engine))
  const browser = await launch()
  try {
    const page = await browser.newPage()
    await page.addScriptTag({ content: await script() })
    const there = await page.evaluate(() => (globalThis as unknown as { values: Promise<number[]> }).values)
    const far = referenceRows.flatMap((row, i) => {
      const [a = Number.NaN, b = Number.NaN] = [here[i], there[i]]
      return Math.abs(a - b) <= mostFor(row) * Math.abs(a) ? [] : [`${rowKey(row)}: ${a} here, ${b} there`]
    })
    expect(there).toHaveLength(referenceRows.length)
    expect(far).toEqual([])
  } finally {
    await browser.close()
  }
})
