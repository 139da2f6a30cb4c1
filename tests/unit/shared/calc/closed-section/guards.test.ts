/** Every guard of a closed section, fired and not fired. */
import { describe, expect, it } from 'vitest'
import { boxInputs, finnedBoxInputs, inchTubeInputs, straight, twoCellInputs } from '../../../../factories/closed-section'
import { quantity } from '../../../../factories/open-section'
import { evaluateClosedSection } from '#shared/calc/kinds/closed-section/evaluate'
import type { ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'

const mm = (text: string) => quantity(text, 'mm')
const guardsOf = (inputs: ClosedSectionInputs) => {
  const evaluation = evaluateClosedSection(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result.guards
}
const keys = (inputs: ClosedSectionInputs) => guardsOf(inputs).map(guard => guard.key)
const find = (inputs: ClosedSectionInputs, key: string) => guardsOf(inputs).find(guard => guard.key === key)

/** A square tube of side 60 mm on the mid-line, whose χ is 2t/60 (§2.1). */
const square = (t: string): ClosedSectionInputs => ({
  ...boxInputs(), walls: [straight('a', '1', ['2', '60', '0'], t), straight('b', '2', ['3', '60', '60'], t), straight('c', '3', ['4', '0', '60'], t), straight('d', '4', ['1', '0', '0'], t)],
})

describe('thickness (G-04, G-05)', () => {
  it.each([['1.5', []], ['1.6', ['G-04']], ['6', ['G-04']], ['6.1', ['G-05']]])('square tube 60 of %s mm: %j', (t, expected) => {
    expect(keys(square(t)).filter(key => key === 'G-04' || key === 'G-05')).toEqual(expected)
  })
  it('is a stop that may be deviated from only above 0.2', () => {
    expect(find(square('3'), 'G-04')).toMatchObject({ severity: 'caution', values: { 'χ': expect.closeTo(0.1, 12) as number } })
    expect(find(square('9'), 'G-05')).toMatchObject({ severity: 'stop', deviable: true })
  })
  it('says nothing of a shared web whose flows nearly cancel', () => {
    // Its χ is about 18, its stress next to nothing (Amendment 1).
    expect(guardsOf(twoCellInputs()).filter(guard => guard.wall === 'g' && (guard.id === 'G-04' || guard.id === 'G-05'))).toEqual([])
  })
})

describe('seams and joints (G-07, G-12)', () => {
  it('tells a wall that misses its node, where another cell still closes', () => {
    const inputs = { ...twoCellInputs(), walls: twoCellInputs().walls.map(wall => wall.id === 'g' ? straight('g', '2', ['5', '100', '79'], '3') : wall) }
    expect(find(inputs, 'G-07:g')).toMatchObject({ severity: 'stop', values: { 'gap, mm': expect.closeTo(1, 9) as number } })
    expect(keys(twoCellInputs()).filter(key => key.startsWith('G-07'))).toEqual([])
  })
  it('asks for the fasteners of a declared joint', () => {
    // q = 130.767 N/mm at 5000 N·m; the heaviest at ultimate is 7500 N·m: 130.767 · 1.5 · 25 mm.
    const evaluation = evaluateClosedSection(twoCellInputs())
    const force = evaluation.ok ? evaluation.result.outputs.find(o => o.key === 'F_joint:b')?.value : null
    expect(force).toBeCloseTo(130.767167382 * 1.5 * 25, 4)
    expect(find(twoCellInputs(), 'G-12:b')).toMatchObject({ severity: 'caution', wall: 'b', caseId: 'L01' })
    expect(keys(boxInputs())).not.toContain('G-12:a')
  })
})

describe('shape of the cells (G-15)', () => {
  // The box is 60 mm deep.
  it.each([['120', '60', []], ['121', '60', ['G-15:spacing']], ['120', '61', ['G-15:load']]])('spacing %s, load at %s: %j', (spacing, load, expected) => {
    expect(keys({ ...boxInputs(), diaphragmSpacing: mm(spacing), diaphragmAtLoad: mm(load) }).filter(key => key.startsWith('G-15'))).toEqual(expected)
  })
  it('asks where nothing is declared', () => {
    expect(keys(inchTubeInputs())).toEqual(expect.arrayContaining(['G-15:spacing', 'G-15:load']))
  })
})

describe('built-in root (G-20)', () => {
  // Face of the covers 36.27 MPa for 1000 N·m; half of Fsu 265 MPa is met at 132.5/(1.5·36.27) = 2.436 times that.
  const loaded = (torque: string, root: ClosedSectionInputs['root']): ClosedSectionInputs => ({ ...boxInputs(), root, loading: { by: 'torque', torque: quantity(torque, 'N·m'), level: 'limit', temperature: null, source: '' } })
  it.each([['2400', 'built in', false], ['2460', 'built in', true], ['2460', 'unknown', true], ['2460', 'free', false]] as const)('%s N·m, root %s: %s', (torque, root, expected) => {
    expect(keys(loaded(torque, root)).includes('G-20')).toBe(expected)
  })
  it('says nothing of a section that does not warp, whatever its stress (Amendment 6)', () => {
    const heavy = { by: 'torque' as const, torque: quantity('60', 'kip·in'), level: 'limit' as const, temperature: null, source: '' }
    expect(keys({ ...inchTubeInputs(), loading: heavy })).toContain('G-26')
    expect(keys({ ...inchTubeInputs(), loading: heavy })).not.toContain('G-20')
  })
})

describe('corners, fins, short bars', () => {
  it('tells corners without a radius, small ones and those no factor covers', () => {
    expect(keys({ ...boxInputs(), junctions: [] })).toEqual(expect.arrayContaining(['G-10:1', 'G-10:2', 'G-10:3', 'G-10:4']))
    expect(keys(boxInputs()).filter(key => /^G-(09|10)/.test(key))).toEqual([])
    const node1 = (radius: string, make: 'bent' | 'machined') => keys({ ...boxInputs(), junctions: [{ node: '1', radius: mm(radius), make }] })
    expect(node1('0.4', 'bent')).toContain('G-09:1')
    expect(node1('8', 'machined')).toContain('G-09:factor:1')
  })
  it('tells no corner of a round tube', () => {
    expect(keys(inchTubeInputs()).filter(key => /^G-(09|10)/.test(key))).toEqual([])
  })
  it('judges a fin by its slenderness', () => {
    const short = { ...finnedBoxInputs(), walls: [...boxInputs().walls, straight('fin', '1', ['5', '0', '-15'], '2')] }
    expect(keys(finnedBoxInputs())).not.toContain('G-02:fin')
    expect(keys(short)).toContain('G-02:fin')
  })
  it('tells a bar shorter than its section', () => {
    expect(keys({ ...boxInputs(), length: mm('119') })).toContain('G-39')
    expect(keys({ ...boxInputs(), length: mm('120') })).not.toContain('G-39')
  })
})
