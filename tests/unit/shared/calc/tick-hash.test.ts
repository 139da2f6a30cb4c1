import { describe, expect, it } from 'vitest'
import { stripInputs } from '../../../factories/open-section'
import { evaluateCalculation } from '#shared/calc/registry'
import { changedAfterTick, tickHash, type TickedParts } from '#shared/calc/tick-hash'

const parts = (): TickedParts => {
  const inputs = stripInputs()
  return {
    kind: 'open-section', kindVersion: 1, title: 'Strip', inputs, result: evaluateCalculation({ kind: 'open-section', kindVersion: 1, inputs }), methodRevision: 'A',
    answers: [{ guardKey: 'G-02:a', kind: 'answer', text: 'one' }, { guardKey: 'G-18', kind: 'answer', text: 'two' }],
  }
}

describe('the parts a tick stands on', () => {
  it('give the same text in whatever order they are held', () => {
    const turned = parts()
    turned.answers.reverse()
    turned.inputs = Object.fromEntries(Object.entries(turned.inputs as object).reverse())
    expect(tickHash(turned)).toBe(tickHash(parts()))
  })
  it('give another text when anything in them changes', () => {
    const base = tickHash(parts())
    const changed: ((p: TickedParts) => void)[] = [
      p => p.answers.pop(), p => p.answers[0] && (p.answers[0].text = 'other'), p => (p.methodRevision = 'B'), p => (p.kindVersion = 2), p => (p.title = 'Bar'),
      p => (p.inputs = { ...stripInputs(), twistOrigin: 'another note' }), p => p.result.ok && p.result.result.outputs.pop(),
    ]
    for (const change of changed) {
      const now = parts()
      change(now)
      expect(tickHash(now)).not.toBe(base)
    }
  })
  it('raise G-45 as a stop when they differ', () => {
    expect(changedAfterTick('a', 'a')).toBeNull()
    expect(changedAfterTick('a', 'b')).toMatchObject({ id: 'G-45', severity: 'stop', deviable: false })
  })
})
