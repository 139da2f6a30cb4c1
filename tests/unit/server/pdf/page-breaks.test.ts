/** Nothing is lost where a piece is longer than a page. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { renderNotePdf } from '#server/pdf/render'
import { calculation, heading, noteDocument, paragraph, table } from '../../../factories/note-document'
import { HAT, samplePdfData } from '../../../factories/note-pdf-data'
import { hatSection } from '../../../factories/sample-sections'
import { run } from './outside-tools'

const folder = mkdtempSync(join(tmpdir(), 'torquill-pages-'))
afterAll(() => rmSync(folder, { recursive: true }))
const words = (count: number, name: string) => Array.from({ length: count }, (_, i) => `${name}${i}`).join(' ')

describe('long pieces', () => {
  it('run on over pages, and a heading stays with what it heads', async () => {
    const data = samplePdfData()
    const [answer] = data.answers
    const document = noteDocument({
      scope: [paragraph(words(1500, 'scope'))],
      references: [table(['Document', 'Use'], ['one', words(900, 'cell')])],
      description: [...Array.from({ length: 30 }, (_, i) => paragraph(`Line ${i}.`)), heading(2, 'Last heading'), paragraph('What it heads.')],
      'section-analysis': [calculation('Hat', { id: HAT, inputs: hatSection() })],
    })
    const answers = answer ? [{ ...answer, calcId: HAT, text: words(900, 'answer') }] : []
    const file = join(folder, 'long.pdf')
    writeFileSync(file, await renderNotePdf({ ...data, document, answers, figures: {} }))
    const pages = run('pdftotext', file, '-').text.split('\f')
    const all = pages.join(' ')
    for (const last of ['scope1499', 'cell899', 'answer899']) expect(all).toMatch(new RegExp(`\\b${last}\\b`))
    const headed = pages.slice(2).find(page => page.includes('Last heading'))
    expect(headed).toContain('What it heads.')
  })
})
