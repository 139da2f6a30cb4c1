/** The largest section with a thousand cases: everything that decides is kept, and nothing that a reader never asks for. */
import { describe, expect, it } from 'vitest'
import { evaluateNote } from '#shared/calc/evaluate-note'
import { evaluateOpenSection } from '#shared/calc/kinds/open-section/evaluate'
import { largeOpenSection, largeTable, withLargeTable } from '../../../../factories/large-section'
import { quantity } from '../../../../factories/open-section'

const evaluation = evaluateNote(withLargeTable('open-section', largeOpenSection())).results.section
if (!evaluation?.ok) throw new Error(JSON.stringify(evaluation))
const { result } = evaluation
const outputs = new Map(result.outputs.map(output => [output.key, output]))

describe('a hundred walls under a thousand cases', () => {
  it('keeps a row and the values that others take for every case', () => {
    expect(result.cases).toHaveLength(1000)
    const missing = largeTable().rows.flatMap(({ id, cells }) => ['T', 'theta', 'tau_max', ...(cells[0] === '0' ? [] : ['MS'])].map(key => `${key}@${id}`)).filter(key => !outputs.has(key))
    expect(missing).toEqual([])
  })

  it('keeps the least margin of every mode, and the values by wall of the cases that decide', () => {
    const governing = result.margins.find(row => row.governing)
    expect(governing?.ms).toBe(Math.min(...result.margins.flatMap(row => row.ms === null ? [] : [row.ms])))
    expect(new Set(result.margins.map(row => row.mode))).toEqual(new Set(['shear-ultimate', 'shear-yield', 'corner-ultimate', 'corner-yield', 'twist']))
    expect(outputs.has(`tau:w1@${governing?.caseId}`)).toBe(true)
    expect(result.outputs.length).toBeLessThan(20_000)
    expect(result.margins.length).toBeLessThan(10_000)
  })

  it('gives each kept number as the case alone gives it', () => {
    const { caseId = '' } = result.margins.find(row => row.governing) ?? {}
    const row = largeTable().rows.find(one => one.id === caseId)
    if (!row) throw new Error(caseId)
    const alone = evaluateOpenSection({
      ...largeOpenSection(),
      loading: { by: 'cases', cases: [{ id: row.id, title: row.title, source: 'table', level: row.level, torque: quantity(row.cells[0] ?? '', 'N·m'), temperature: quantity(row.temperature, '°C') }] },
    })
    if (!alone.ok) throw new Error(JSON.stringify(alone.faults))
    const single = new Map(alone.result.outputs.map(output => [output.key, output.value]))
    for (const key of [`T@${caseId}`, `tau_max@${caseId}`, `tau:w50@${caseId}`, `MS@${caseId}`, 'MS']) expect(outputs.get(key)?.value, key).toBeCloseTo(single.get(key) ?? Number.NaN, 12)
    const least = new Map(alone.result.margins.map(margin => [margin.key, margin.ms]))
    for (const margin of result.margins.filter(one => one.caseId === caseId)) expect(margin.ms, margin.key).toBeCloseTo(least.get(margin.key) ?? Number.NaN, 12)
  })
})
