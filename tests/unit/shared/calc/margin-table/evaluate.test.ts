/** All margins of a note in one table. */
import { describe, expect, it } from 'vitest'
import { channelInputs, stripInputs } from '../../../../factories/open-section'
import { solidBarInputs } from '../../../../factories/solid-bar'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { NoteCalc } from '#shared/calc/note-links'

const idOf = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`
const calc = (n: number, kind: string, inputs: unknown): NoteCalc => ({ id: idOf(n), label: `C${n}`, title: '', kind, kindVersion: 1, inputs })
const table = (rows: string) => calc(1, 'margin-table', { rows })
const note = (rows: string) => [table(rows), calc(2, 'open-section', channelInputs()), calc(3, 'solid-bar', solidBarInputs()), calc(4, 'open-section', stripInputs())]
const resultOf = (rows: string) => {
  const evaluation = evaluateNote(note(rows)).results[idOf(1)]
  if (!evaluation?.ok) throw new Error(JSON.stringify(evaluation?.faults))
  return evaluation.result
}
const margins = (rows: string) => (resultOf(rows).tables?.[0]?.rows ?? []).map(row => row.cells.at(-1) as number | null)

describe('the margin table', () => {
  it('gathers every margin of the other calculations, least first, wherever it stands', () => {
    const { results } = evaluateNote(note('every margin'))
    const all = [idOf(2), idOf(3), idOf(4)].flatMap((id) => {
      const evaluation = results[id]
      return evaluation?.ok ? evaluation.result.margins : []
    })
    expect(margins('every margin')).toHaveLength(all.length)
    const loaded = margins('every margin').filter(ms => ms !== null)
    expect(loaded).toEqual([...loaded].sort((a, b) => a - b))
    expect(resultOf('every margin').outputs.find(o => o.key === 'MS')?.value).toBe(loaded[0])
  })
  it('lists the least of each mode, or of each mode and calculation', () => {
    const modes = (rows: string) => (resultOf(rows).tables?.[0]?.rows ?? []).map(row => `${row.cells[3]} ${row.cells[0]}`)
    expect(new Set(modes('least of each mode').map(one => one.slice(3))).size).toBe(modes('least of each mode').length)
    expect(new Set(modes('least of each calculation and mode')).size).toBe(modes('least of each calculation and mode').length)
    expect(modes('least of each calculation and mode').length).toBeGreaterThan(modes('least of each mode').length)
  })
  it('counts no margin twice', () => {
    expect(resultOf('every margin').margins).toEqual([])
  })
  it('names a calculation that gives no result', () => {
    const broken = [table('every margin'), calc(2, 'open-section', { ...channelInputs(), walls: [] })]
    expect(evaluateNote(broken).results[idOf(1)]).toMatchObject({ ok: false, faults: [{ message: expect.stringContaining('C2') as string }] })
  })
})
