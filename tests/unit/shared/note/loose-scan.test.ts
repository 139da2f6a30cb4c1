import { describe, expect, it, vi } from 'vitest'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { ScanMemory } from '#shared/note/loose/memory'
import { quantitiesIn } from '#shared/note/loose/quantities'
import { readDocument } from '#shared/note/schema'
import type { Evaluation } from '#shared/calc/types'
import { noteDocument, paragraph } from '../../../factories/note-document'
import { HOSTILE, largeNote } from '../../../factories/large-note'
import { C1, calculations, RESULTS } from './sample-results'

vi.mock(import('#shared/note/loose/quantities'), { spy: true })

describe('a text made to be slow', () => {
  // In proportion to the text this takes a second; with its square it would take minutes, and the test's own limit ends it.
  it.each(Object.entries(HOSTILE))('%s: is read to its end', (_, make) => {
    expect(Array.isArray(scanLooseNumbers(make(160_000), RESULTS))).toBe(true)
  })
})

describe('a memory between scans', () => {
  const before = largeNote(4)
  const memory = new ScanMemory()
  const scan = (doc: typeof before, results: Record<string, Evaluation> = RESULTS) => scanLooseNumbers(doc, results, { noteTitle: 'Seal carrier, 3.2 mm' }, memory)
  const plain = (doc: typeof before, results: Record<string, Evaluation> = RESULTS) => scanLooseNumbers(doc, results, { noteTitle: 'Seal carrier, 3.2 mm' })

  it('changes nothing: the same again, after an edit, and back', () => {
    const after = readDocument(noteDocument({ 'description': [paragraph('The bar is 420 mm long.'), paragraph('The bar is 410 mm long.')], 'section-analysis': calculations() }))
    for (const doc of [before, before, after, before]) expect(scan(doc)).toEqual(plain(doc))
  })

  it('is not carried to other results', () => {
    scan(before)
    const without = { ...RESULTS, [C1]: { ok: false as const, faults: [] } }
    expect(scan(before, without)).toEqual(plain(before, without))
    expect(scan(before)).toEqual(plain(before))
  })

  it('reads only the texts that changed', () => {
    const [first, second] = ['The bar is 420 mm long.', 'The rate is 27.28 °/m.']
    const note = (...texts: string[]) => readDocument(noteDocument({ 'description': texts.map(text => paragraph(text)), 'section-analysis': calculations() }))
    const kept = new ScanMemory()
    const read = (doc: typeof before) => {
      vi.mocked(quantitiesIn).mockClear()
      scanLooseNumbers(doc, RESULTS, {}, kept)
      return vi.mocked(quantitiesIn).mock.calls.map(([{ text }]) => text)
    }
    expect(read(note(first, second))).toEqual(expect.arrayContaining([first, second]))
    expect(read(note(first, second))).toEqual([])
    expect(read(note(first, 'The rate is 27.3 °/m.'))).toEqual(['The rate is 27.3 °/m.'])
  })
})
