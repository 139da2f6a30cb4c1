import { describe, expect, it } from 'vitest'
import { loadEngine } from '../../../reference/engine'
import { deviation } from '../../../reference/row'
import { referenceRows } from '../../../reference/rows'

const engine = await loadEngine()

describe('reference values', () => {
  it.each(referenceRows.map(row => [`${row.id} ${row.quantity} (${row.inputs})`, row] as const))('%s', (_, row) => {
    const value = row.actual(engine)
    expect(deviation(row, value), `${value} ${row.unit}, expected ${row.expected} by ${row.source}`).toBeLessThanOrEqual(1)
  })
})
