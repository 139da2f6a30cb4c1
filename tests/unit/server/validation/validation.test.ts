import { describe, expect, it } from 'vitest'
import { loadEngine } from '#reference/engine'
import { rel, abs, row } from '#reference/row'
import { judgeRow } from '#server/validation/judge-row'
import { report } from '#server/validation/report'

const engine = await loadEngine()
const made = (got: number | (() => number), tolerance = rel(1e-6), expected = 100, id = '§1.9') =>
  judgeRow(row(id, 'J', 'a strip', expected, 'mm⁴', tolerance, 'algebra', () => typeof got === 'number' ? got : got()), engine)

describe('one reference case', () => {
  it('agrees up to its tolerance and no further', () => {
    expect(made(100.00009)).toMatchObject({ agrees: true, difference: expect.closeTo(9e-7, 12), section: '1.9', chapter: '1' })
    expect(made(100.000101).agrees).toBe(false)
    expect(made(100.000101, abs(0.001))).toMatchObject({ agrees: true, difference: expect.closeTo(0.000101, 9) })
  })

  it('fails, with the reason, where the engine refuses or gives no number', () => {
    expect(made(() => {
      throw new Error('Refused: too thin')
    })).toMatchObject({ agrees: false, got: null, difference: null, reason: 'Refused: too thin' })
    expect(made(Number.NaN)).toMatchObject({ agrees: false, got: null, reason: expect.stringContaining('finite') })
    expect(made(Infinity).agrees).toBe(false)
  })

  it('is filed under the section of its number', () => {
    expect([made(1, rel(1), 1, 'C-44').section, made(1, rel(1), 1, 'C-111').section, made(1, rel(1), 1, '§10 rule 5').section, made(1, rel(1), 1, 'hat').section]).toEqual(['1.10', '3.5', '10', 'P'])
  })
})

describe('the report', () => {
  it('stands in the order of the methods and counts what fails', () => {
    const { rows, chapters, ...summary } = report({
      state: 'done', cases: 5, reason: null, finishedAt: '2026-10-12T09:00:00Z',
      rows: [made(1, rel(1), 1, 'hat'), made(1, rel(1), 1, '§10'), made(3, rel(1e-3), 1, '§2.1'), made(1, rel(1), 1, '§1.10'), made(1, rel(1), 1, '§1.9')],
    })
    expect(rows.map(one => one.section)).toEqual(['1.9', '1.10', '2.1', '10', 'P'])
    expect(summary).toMatchObject({ state: 'done', cases: 5, judged: 5, failed: 1 })
    expect(chapters.map(({ chapter, cases, failed }) => [chapter, cases, failed])).toEqual([['1', 2, 0], ['2', 1, 1], ['10', 1, 0], ['P', 1, 0]])
  })
})
