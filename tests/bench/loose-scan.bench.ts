/** What the scan of loose numbers costs: on a note of three hundred pages, after one changed paragraph, and on texts made to be slow. */
import { bench, describe } from 'vitest'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { ScanMemory } from '#shared/note/loose/memory'
import { HOSTILE, largeNote } from '../factories/large-note'
import { RESULTS } from '../unit/shared/note/sample-results'

describe('three hundred pages', () => {
  const doc = largeNote(300)
  const memory = new ScanMemory()
  scanLooseNumbers(doc, RESULTS, {}, memory)
  bench('the first scan', () => void scanLooseNumbers(doc, RESULTS), { iterations: 3 })
  bench('a scan that remembers the one before', () => void scanLooseNumbers(doc, RESULTS, {}, memory), { iterations: 3 })
})

describe('forty thousand hostile characters', () => {
  for (const [name, make] of Object.entries(HOSTILE)) {
    const doc = make(40_000)
    bench(name, () => void scanLooseNumbers(doc, RESULTS), { iterations: 3 })
  }
})
