import { describe, expect, it } from 'vitest'
import { loadCasesInputs } from '../../../../factories/records'
import { evaluateLoadCases } from '#shared/calc/kinds/load-cases/evaluate'

function resultOf(inputs: unknown) {
  const evaluation = evaluateLoadCases(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}

describe('a table of load cases', () => {
  it('gives every case with its values for a checker to compare, an empty cell as no value', () => {
    const [table] = resultOf(loadCasesInputs()).tables ?? []
    expect(table?.columns.map(({ label, unit }) => [label, unit])).toEqual([['Case', ''], ['Title', ''], ['Level', ''], ['Temperature', '°C'], ['Torque', 'N·m'], ['Shear force', 'kN']])
    // 90 lbf·in is 90 · 112.9848290276167 N·mm.
    expect(table?.rows).toEqual([
      { id: 'L01', cells: ['L01', 'Gust up', 'limit', 20, 12_500, 3200] },
      { id: 'L02', cells: ['L02', 'Gust down', 'limit', null, -14_000, null] },
      { id: 'L03', cells: ['L03', 'Landing', 'ultimate', -40, expect.closeTo(10_168.6346, 4), -1100] },
    ])
  })

  it('has no column of temperatures where none is given', () => {
    const cold = { ...loadCasesInputs(), rows: loadCasesInputs().rows.map(row => ({ ...row, temperature: '' })) }
    expect(resultOf(cold).tables?.[0]?.columns.some(({ key }) => key === 'temperature')).toBe(false)
  })

  it('tells each fault at its cell and keeps the rest', () => {
    const bad = { ...loadCasesInputs(), rows: loadCasesInputs().rows.map((row, i) => (i === 1 ? { ...row, cells: ['1,5', ''] } : row)) }
    const evaluation = evaluateLoadCases(bad)
    expect(evaluation.ok ? [] : evaluation.faults.map(({ path }) => path)).toEqual(['rows.1.cells.0'])
  })
})
