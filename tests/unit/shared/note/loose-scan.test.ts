import { describe, expect, it } from 'vitest'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { ScanMemory } from '#shared/note/loose/memory'
import { readDocument } from '#shared/note/schema'
import type { Evaluation } from '#shared/calc/types'
import { noteDocument, paragraph } from '../../../factories/note-document'
import { HOSTILE, largeNote } from '../../../factories/large-note'
import { C1, calculations, RESULTS } from './sample-results'

/** Processor time of one scan in ms, the least of three: other work on the machine only adds to it. */
function cost(make: (characters: number) => ReturnType<typeof largeNote>, characters: number): number {
  const doc = make(characters)
  return Math.min(...[1, 2, 3].map(() => {
    const before = process.cpuUsage()
    scanLooseNumbers(doc, RESULTS)
    const { user, system } = process.cpuUsage(before)
    return (user + system) / 1000
  }))
}

describe('a text made to be slow', () => {
  // Four times the text of a linear scan costs four times as much, of a square one sixteen times.
  it.each(Object.entries(HOSTILE))('%s: costs in proportion to its length', (_, make) => {
    const [short, long] = [cost(make, 10_000), cost(make, 40_000)]
    expect(long).toBeLessThan(10 * short + 60)
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

  it('saves most of the work', () => {
    const doc = largeNote(60)
    const time = (work: () => unknown) => {
      const start = process.cpuUsage().user
      work()
      return process.cpuUsage().user - start
    }
    const kept = new ScanMemory()
    const first = time(() => scanLooseNumbers(doc, RESULTS, {}, kept))
    const again = Math.min(...[1, 2, 3].map(() => time(() => scanLooseNumbers(doc, RESULTS, {}, kept))))
    expect(again).toBeLessThan(first / 2)
  })
})
