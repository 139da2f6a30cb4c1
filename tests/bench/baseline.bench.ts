/** What the machine does at present: everything else is told in multiples of it, so that runs on two machines or on a busy one compare. */
import { bench, describe } from 'vitest'
import { baselineName } from './baseline-name'

describe('baseline', () => {
  let kept = 0
  bench(baselineName, () => {
    let sum = 0
    for (let i = 1; i <= 1_000_000; i += 1) sum += Math.sqrt(i + kept)
    kept = sum > 0 ? 0 : 1
  })
})
