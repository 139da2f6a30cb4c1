/** The closed section as an analyst gives it, against the values of its methods. */
import { describe, expect, it } from 'vitest'
import { boxInputs, cellRowInputs, finnedBoxInputs, inchTubeInputs, straight, twoCellInputs } from '../../../../factories/closed-section'
import { largeTable, withLargeTable } from '../../../../factories/large-section'
import { quantity } from '../../../../factories/open-section'
import { evaluateNote } from '#shared/calc/evaluate-note'
import { evaluateClosedSection } from '#shared/calc/kinds/closed-section/evaluate'
import type { ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'

const resultOf = (inputs: unknown) => {
  const evaluation = evaluateClosedSection(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(o => o.key === key)?.value ?? Number.NaN
const faults = (inputs: unknown) => {
  const evaluation = evaluateClosedSection(inputs)
  return evaluation.ok ? [] : evaluation.faults
}
const close = (actual: number, expected: number, relative: number) => expect(Math.abs(actual / expected - 1), `${actual} for ${expected}`).toBeLessThan(relative)

describe('values', () => {
  it('gives the worked box: constant, flow, mean and face stress', () => {
    const inputs = boxInputs()
    // §2.1 of the methods reference: J 1 296 000, q 69.444, covers 34.722 MPa.
    close(value(inputs, 'J'), 1_296_000, 1e-12)
    close(value(inputs, 'A:1'), 7200, 1e-12)
    close(Math.abs(value(inputs, 'q:cell-1@T')), 69.4444444444444, 1e-12)
    // χ = t²/(2A)·∮ds/t, and the face (1 + χ) times the mean (§2.1).
    const chi = 4 / (2 * 7200) * 160
    close(value(inputs, 'tau:a@T'), 34.7222222222222 * (1 + chi), 1e-12)
    close(value(inputs, 'chi_max'), 9 / (2 * 7200) * 160, 1e-12)
    close(value(inputs, 'share:1'), 1, 1e-12)
    close(value(inputs, 'theta@T'), 1e6 / (26_900 * 1_296_000), 1e-12)
    // MS = Fsu/(1.5 τ) − 1 at the face.
    close(value(inputs, 'MS:shear-ultimate'), 265 / (1.5 * 34.7222222222222 * (1 + chi)) - 1, 1e-10)
  })
  it('gives the worked pair of cells with signs from node to node', () => {
    const inputs = twoCellInputs()
    // §2.2 of the methods reference.
    close(value(inputs, 'J'), 4_423_831.89122373, 1e-12)
    close(value(inputs, 'q:cell-1@L01'), 129.425965665, 1e-10)
    close(value(inputs, 'q:cell-2@L01'), 130.767167382, 1e-10)
    close(value(inputs, 'share:1'), 0.414163, 1e-5)
    // The shared web runs upwards with the first cell on its left: q₁ − q₂.
    close(value(inputs, 'q:g@L01'), -1.341201717, 1e-8)
    close(value(inputs, 'q:g@L02'), 1.341201717 * 4200 / 5000, 1e-8)
    // The right web's mean is 87.178 MPa.
    const walls = resultOf(inputs).tables?.find(table => table.key === 'walls')
    const mean = walls?.rows.find(row => row.id === 'c')?.cells[6]
    close(Number(mean) * 5000 / (value(inputs, `T@${walls?.title.match(/L\d+/)?.[0]}`) / 1000), 87.178, 1e-4)
  })
  it('gives the corner of bent sheet its closed form', () => {
    // §2.3: K = (t/r)/ln(1 + t/r) on the mean of the wall with the higher product; t = 2, r = 4.
    const K = 0.5 / Math.log(1.5)
    close(value(boxInputs(), 'K:1'), K, 1e-12)
    close(value(boxInputs(), 'tau_corner:1@T'), K * 34.7222222222222, 1e-12)
  })
  it('gives a machined corner the table, and none beyond it', () => {
    const machined = (radius: string) => ({ ...boxInputs(), junctions: [{ node: '1', radius: quantity(radius, 'mm'), make: 'machined' as const }] })
    // §2.3 table: r/t = 0.5 → 1.46 in the cover of 2 mm.
    close(value(machined('1'), 'tau_corner:1@T'), 1.46 * 34.7222222222222, 1e-12)
    expect(value(machined('7'), 'K:1')).toBeNaN()
  })
  it('gives a round tube in two shells its constant, in inches', () => {
    // Bredt: J = 2πR³t.
    close(value(inchTubeInputs(), 'J'), 2 * Math.PI * 1.5 ** 3 / 16 * 25.4 ** 4, 1e-9)
    // Exact outer stress T·R_o/J_exact is met within 0.1 % by half of the variation (§2.1).
    const [Ro, Ri] = [1.5 + 1 / 32, 1.5 - 1 / 32]
    const exact = 12_000 * Ro / (Math.PI / 2 * (Ro ** 4 - Ri ** 4)) * 6.894757293168361e-3
    close(value(inchTubeInputs(), 'tau_max@T'), exact, 1e-3)
  })
  it('adds a lip as a strip, and takes an imposed rate', () => {
    const strip = 25 * 8 / 3
    close(value(finnedBoxInputs(), 'J'), 1_296_000 + strip, 1e-12)
    close(value(finnedBoxInputs(), 'T@R1'), 26_900 * (1_296_000 + strip) * 2e-5, 1e-12)
    close(value(finnedBoxInputs(), 'tau:fin@R1'), 26_900 * 2 * 2e-5, 1e-12)
  })
  it('joins seams within a millionth of the size, and only those', () => {
    const shifted = (gap: string): ClosedSectionInputs => ({ ...boxInputs(), walls: boxInputs().walls.map(wall => wall.id === 'd' ? straight('d', '4', ['1', '0', gap], '3') : wall) })
    close(value(shifted('1e-5'), 'J'), 1_296_000, 1e-6)
    expect(faults(shifted('0.5')).map(f => f.message).join(' ')).toMatch(/close no cell.*G-07: wall d/s)
  })
  it('shows what the strips of the walls would add, and the mean alone', () => {
    const compared = resultOf(boxInputs()).compared ?? []
    // ⅓∮t³ds = (2·120·8 + 2·60·27)/3.
    close(compared.find(c => c.key === 'J')?.compared ?? 0, 1_296_000 + (2 * 120 * 8 + 2 * 60 * 27) / 3, 1e-12)
    close(compared.find(c => c.key === 'tau')?.compared ?? 0, 34.7222222222222, 1e-12)
  })
})

describe('laws', () => {
  it('gives the same for a wall typed the other way round, with its flow reversed', () => {
    const reversed = { ...boxInputs(), walls: boxInputs().walls.map(wall => wall.id === 'b' ? { ...wall, from: '3', to: '2', end: { by: 'length' as const, length: quantity('60', 'mm'), direction: quantity('-90', '°') } } : wall) }
    close(value(reversed, 'J'), 1_296_000, 1e-12)
    close(value(reversed, 'q:b@T'), -value(boxInputs(), 'q:b@T'), 1e-12)
  })
  it('shares add up, and flows balance where three walls meet', () => {
    const inputs = twoCellInputs()
    close(value(inputs, 'share:1') + value(inputs, 'share:2'), 1, 1e-12)
    // At node 2: wall a arrives; b and g leave.
    close(value(inputs, 'q:a@L01'), value(inputs, 'q:b@L01') + value(inputs, 'q:g@L01'), 1e-12)
  })
  it('gives three equal cells the rational constant', () => {
    // C-58: 4 000 000/7 mm⁴ for 50 × 50 mm cells of 1 mm.
    close(value(cellRowInputs(3), 'J'), 4_000_000 / 7, 1e-12)
  })
})

describe('a hundred walls under a thousand cases', () => {
  const large: ClosedSectionInputs = { ...cellRowInputs(33), loading: { by: 'table', table: '7b1c9f6e-52f4-4c0b-9d57-2b7f6e0c4a11', quantity: 'T' } }
  it('keeps every case, and the walls of those that decide', () => {
    const evaluation = evaluateNote(withLargeTable('closed-section', large)).results.section
    if (!evaluation?.ok) throw new Error(JSON.stringify(evaluation))
    expect(large.walls).toHaveLength(100)
    expect(evaluation.result.cases).toHaveLength(largeTable().rows.length)
    const governing = evaluation.result.margins.find(row => row.governing)
    expect(evaluation.result.outputs.some(o => o.key === `tau:w5@${governing?.caseId}`)).toBe(true)
    expect(evaluation.result.outputs.length).toBeLessThan(20_000)
  })
})

describe('faults', () => {
  it('stand at their fields', () => {
    expect(faults({ ...boxInputs(), joints: [{ wall: 'z', pitch: quantity('25', 'mm') }] })[0]?.path).toBe('joints.0.wall')
    expect(faults({ ...boxInputs(), joints: [{ wall: 'a', pitch: quantity('0', 'mm') }] })[0]?.path).toBe('joints.0.pitch')
    expect(faults({ ...boxInputs(), walls: boxInputs().walls.slice(0, 3), junctions: [] })[0]).toMatchObject({ path: 'walls', message: expect.stringContaining('no cell') as string })
    expect(faults({ ...boxInputs(), more: 1 })).not.toEqual([])
  })
})
