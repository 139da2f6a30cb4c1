import { describe, expect, it } from 'vitest'
import { answerLapsed, guardFacts, maskNumbers } from '#shared/calc/lapse'
import type { Guard } from '#shared/calc/types'

const guard: Guard = {
  id: 'G-02', key: 'G-02:a', severity: 'caution', deviable: false, title: 'Wall slenderness',
  message: 'Wall a has L/t = 9.375; thin-wall theory asks for 10.', ask: 'Write why.', values: { 'L/t': 9.375 }, wall: 'a', source: '§1.9',
}
const given = guardFacts(guard, 'A')

describe('an answer', () => {
  it('holds while values move by no more than 1 %', () => {
    expect(answerLapsed(given, guard, 'A')).toBeNull()
    expect(answerLapsed(given, { ...guard, message: guard.message.replace('9.375', '9.469'), values: { 'L/t': 9.375 * 1.01 } }, 'A')).toBeNull()
    expect(answerLapsed(given, { ...guard, values: { 'L/t': 9.375 * 0.99 } }, 'A')).toBeNull()
  })
  it('lapses when a value moves further, appears, disappears or leaves zero', () => {
    expect(answerLapsed(given, { ...guard, values: { 'L/t': 9.375 * 1.0101 } }, 'A')).toContain('moved by')
    expect(answerLapsed(given, { ...guard, values: { 'L/t': 9.375 * 0.9899 } }, 'A')).toContain('moved by')
    expect(answerLapsed(given, { ...guard, values: {} }, 'A')).toContain('other values')
    expect(answerLapsed(given, { ...guard, values: { 'L/t': 9.375, 'r/t': 1 } }, 'A')).toContain('other values')
    expect(answerLapsed({ ...given, values: { 'L/t': 0 } }, { ...guard, values: { 'L/t': 1e-6 } }, 'A')).toContain('zero')
  })
  it('lapses when severity, wall, case, method revision or wording changes', () => {
    expect(answerLapsed(given, { ...guard, severity: 'stop' }, 'A')).toContain('stop')
    expect(answerLapsed(given, { ...guard, wall: 'b' }, 'A')).toContain('wall b')
    expect(answerLapsed(given, { ...guard, caseId: 'L04' }, 'A')).toContain('case L04')
    expect(answerLapsed(given, guard, 'B')).toContain('from A to B')
    expect(answerLapsed(given, { ...guard, message: 'Wall a has L/t = 9.375; the method asks for 10.' }, 'A')).toContain('wording')
    expect(answerLapsed(given, { ...guard, ask: 'Write more.' }, 'A')).toContain('wording')
  })
  it('has nothing to lapse from once the guard no longer fires', () => {
    expect(answerLapsed(given, undefined, 'A')).toBeNull()
  })
})

it('masks numbers however they are written, and keeps words', () => {
  for (const written of ['9.375', '−0.13', '>+10', '12\u2009400', '1.2×10⁻³', '73.26×10⁻⁶', '1e-5']) expect(maskNumbers(`is ${written} MPa`), written).toBe('is # MPa')
  expect(maskNumbers('below 10, not above')).toBe('below #, not above')
})
