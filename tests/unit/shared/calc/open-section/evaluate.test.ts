import { describe, expect, it } from 'vitest'
import { bracketInputs, channelInputs, hatInputs, lippedChannelInputs, quantity, stripInputs } from '../../../../factories/open-section'
import { bracketValues, hatValues, lippedChannel28, lippedChannel30, lippedChannelValues, type ReferenceValue } from '../../../../reference/open-section-calculations'
import { evaluateOpenSection } from '#shared/calc/kinds/open-section/evaluate'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { CalcResult } from '#shared/calc/types'

function resultOf(inputs: unknown): CalcResult {
  const evaluation = evaluateOpenSection(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const outputOf = (result: CalcResult, key: string) => result.outputs.find(o => o.key === key)?.value ?? Number.NaN

function agrees(inputs: unknown, references: ReferenceValue[]) {
  const result = resultOf(inputs)
  for (const { key, value, tolerance, source } of references) {
    expect(Math.abs(outputOf(result, key) - value), `${key} against ${source}`).toBeLessThanOrEqual(tolerance * Math.abs(value))
  }
}

describe('open section against independent programs', () => {
  it('hat stiffener under imposed rates of twist', () => agrees(hatInputs(), hatValues))
  it('lipped channel under torques in lbf·in', () => agrees(lippedChannelInputs(), lippedChannelValues))
  it('lipped channel in 3.0 mm sheet', () => agrees(lippedChannelInputs('3.0'), lippedChannel30))
  it('lipped channel in 2.8 mm sheet', () => agrees(lippedChannelInputs('2.8'), lippedChannel28))
  it('machined angle typed in inches', () => agrees(bracketInputs(), bracketValues))

  it('shear centre, warping constant and sectorial coordinate of a channel (closed forms: 3b²tf/(6btf+htw) and its companions)', () => {
    const result = resultOf(channelInputs())
    expect(outputOf(result, 'J_plain')).toBeCloseTo(2606.66666666667, 8)
    expect(outputOf(result, 'x_S')).toBeCloseTo(-15.2380952380952, 9)
    expect(outputOf(result, 'Gamma') / 182857142.857143).toBeCloseTo(1, 10)
    expect(outputOf(result, 'omega_max')).toBeCloseTo(1238.09523809524, 8)
  })
})

describe('load levels and factors', () => {
  const strip = (change: Partial<OpenSectionInputs>) => resultOf({ ...stripInputs(), ...change })
  const ms = (result: CalcResult, mode: string) => result.margins.find(m => m.mode === mode)?.ms ?? Number.NaN
  const tau = outputOf(resultOf(stripInputs()), 'tau:a@T')
  const factors = stripInputs().factors

  it('raises a limit load by the factor of safety and the highest special factor, not by their product (25.619)', () => {
    const result = strip({ factors: { ...factors, fitting: '1.15', casting: '1.25', bearing: '' } })
    expect(ms(result, 'shear-ultimate')).toBeCloseTo(186 / (tau * 1.5 * 1.25) - 1, 10)
    expect(ms(result, 'shear-yield')).toBeCloseTo(241 / Math.sqrt(3) / (tau * 1.25) - 1, 10)
  })
  it('leaves the special factor off at limit where the criteria say so', () => {
    const result = strip({ factors: { ...factors, fitting: '1.15', onLimit: false } })
    expect(ms(result, 'shear-yield')).toBeCloseTo(241 / Math.sqrt(3) / tau - 1, 10)
  })
  it('raises no load given at ultimate, and divides it for yield and twist only where confirmed', () => {
    const loading = { by: 'torque' as const, torque: quantity('1', 'N·m'), level: 'ultimate' as const, temperature: null, source: '' }
    expect(ms(strip({ loading }), 'shear-ultimate')).toBeCloseTo(186 / tau - 1, 10)
    expect(ms(strip({ loading }), 'shear-yield')).toBeCloseTo(241 / Math.sqrt(3) / tau - 1, 10)
    const divided = strip({ loading, factors: { ...factors, divideUltimate: true } })
    expect(ms(divided, 'shear-yield')).toBeCloseTo(241 / Math.sqrt(3) / (tau / 1.5) - 1, 10)
    expect(ms(divided, 'twist')).toBeCloseTo((ms(strip({ loading }), 'twist') + 1) * 1.5 - 1, 10)
  })
  it('takes each strength at the temperature of its case, linear between points', () => {
    const loading = { by: 'torque' as const, torque: quantity('1', 'N·m'), level: 'limit' as const, temperature: quantity('47', '°C'), source: '' }
    // Half way between 23 °C (1.00) and 71 °C (0.96).
    expect(ms(strip({ loading }), 'shear-ultimate')).toBeCloseTo(186 * 0.98 / (tau * 1.5) - 1, 10)
  })
  it('gives no margin, and no infinity, where nothing is applied', () => {
    const result = strip({ loading: { by: 'torque', torque: quantity('0', 'N·m'), level: 'limit', temperature: null, source: '' } })
    expect(result.governing).toBeNull()
    expect(result.margins.length).toBeGreaterThan(0)
    expect(result.margins.every(m => !m.loaded && m.rf === null && m.ms === null)).toBe(true)
    expect(result.outputs.some(o => o.key === 'MS')).toBe(false)
  })
  it('judges each wall by its own material: the least margin, not the highest stress, governs', () => {
    const inputs = channelInputs()
    const weak = { ...inputs.materials[0]!, id: 'weak', Fsu: quantity('40', 'MPa') }
    const web = inputs.walls[1]!
    const result = resultOf({ ...inputs, materials: [...inputs.materials, weak], walls: [inputs.walls[0], { ...web, material: 'weak' }, inputs.walls[2]] })
    expect(result.cases[0]?.tauMaxWall).toBe('a')
    expect(result.margins.find(m => m.governing)?.wall).toBe('b')
  })
  it('lists what lies within half a per cent of the reserve factor that governs', () => {
    const inputs = lippedChannelInputs()
    const cases = inputs.loading.by === 'cases' ? inputs.loading.cases : []
    const near = { ...cases[3]!, id: 'L07', torque: quantity('15.83', 'lbf·in') }
    const far = { ...cases[3]!, id: 'L08', torque: quantity('15.80', 'lbf·in') }
    const result = resultOf({ ...inputs, loading: { by: 'cases', cases: [...cases, near, far] } })
    const governing = result.margins.find(m => m.governing)?.caseId
    expect(new Set(result.margins.filter(m => m.governingOfMode).map(m => m.caseId))).toEqual(new Set([governing, 'L07']))
  })
})

describe('laws', () => {
  const lengths = (inputs: OpenSectionInputs, factor: number): OpenSectionInputs => {
    const scaled = structuredClone(inputs)
    const grow = (q: { text: string }) => {
      q.text = String(Number(q.text) * factor)
    }
    for (const wall of scaled.walls) {
      grow(wall.t)
      if (wall.end.by === 'point') [wall.end.x, wall.end.y].forEach(grow)
    }
    scaled.junctions.forEach(j => grow(j.radius))
    ;[scaled.start.x, scaled.start.y].forEach(grow)
    return scaled
  }
  it('scales with length: J by the fourth power, Γ by the sixth, stress by minus the third', () => {
    const [one, two] = [resultOf(lippedChannelInputs()), resultOf(lengths(lippedChannelInputs(), 2))]
    expect(outputOf(two, 'J') / outputOf(one, 'J')).toBeCloseTo(16, 9)
    expect(outputOf(two, 'Gamma') / outputOf(one, 'Gamma')).toBeCloseTo(64, 8)
    expect(outputOf(two, 'tau_max') / outputOf(one, 'tau_max')).toBeCloseTo(1 / 8, 9)
  })
  it('gives the same in inches as in millimetres', () => {
    const inches = lippedChannelInputs()
    const [si, us] = [resultOf(inches), resultOf({ ...inches, walls: inches.walls.map(w => ({ ...w, t: quantity(String(2.5 / 25.4), 'in') })) })]
    for (const o of si.outputs) expect(Math.abs(outputOf(us, o.key) - o.value)).toBeLessThanOrEqual(1e-9 * Math.abs(o.value))
  })
  it('shares the whole torque among the walls', () => {
    for (const inputs of [hatInputs(), lippedChannelInputs(), bracketInputs()]) {
      expect(resultOf(inputs).walls.reduce((total, w) => total + w.share, 0)).toBeCloseTo(1, 12)
    }
  })
  it('turns sign with the torque and keeps stress and margins', () => {
    const inputs = stripInputs()
    const back = resultOf({ ...inputs, loading: { ...inputs.loading, torque: quantity('-1', 'N·m') } })
    const there = resultOf(inputs)
    expect(outputOf(back, 'theta@T')).toBe(-outputOf(there, 'theta@T'))
    expect(outputOf(back, 'MS')).toBe(outputOf(there, 'MS'))
  })
  it('places walls by length and direction, by arc, and backwards from a known node', () => {
    const inputs = stripInputs()
    const wall = inputs.walls[0]!
    const L = (text: string, direction: string) => ({ by: 'length' as const, length: quantity(text, 'mm'), direction: quantity(direction, '°') })
    const turned = resultOf({ ...inputs, walls: [{ ...wall, end: L('60', '37') }] })
    expect(outputOf(turned, 'J')).toBeCloseTo(outputOf(resultOf(inputs), 'J'), 9)
    const split = resultOf({ ...inputs, walls: [{ ...wall, end: L('25', '0') }, { ...wall, id: 'b', from: '3', to: '1', end: L('35', '0') }] })
    expect(outputOf(split, 'J')).toBeCloseTo(outputOf(resultOf(inputs), 'J'), 9)
    const arc = resultOf({ ...inputs, walls: [{ ...wall, end: { by: 'arc', radius: quantity('50', 'mm'), sweep: quantity('360', '°'), direction: quantity('0', '°') } }] })
    // Slit tube R 50, t 2: 2πRt³/3 = 837.758 mm⁴ before the ends (methods reference §1.10).
    expect(outputOf(arc, 'J_plain')).toBeCloseTo(837.758, 3)
    expect(outputOf(arc, 'Gamma') / 5065300316.15044).toBeCloseTo(1, 8)
  })
})

describe('faults', () => {
  const faultsOf = (inputs: unknown) => {
    const evaluation = evaluateOpenSection(inputs)
    return evaluation.ok ? [] : evaluation.faults
  }
  it('names every field that cannot be read, by its path', () => {
    const inputs = hatInputs()
    inputs.walls[2]!.t.text = '1,6'
    inputs.materials[0]!.G.text = ''
    expect(faultsOf(inputs).map(f => f.path).sort()).toEqual(['materials.0.G', 'walls.2.t'])
  })
  it('refuses what nothing can be computed from (G-01, G-06)', () => {
    const inputs = stripInputs()
    inputs.walls[0]!.t.text = '-2'
    expect(faultsOf(inputs)[0]).toMatchObject({ path: 'walls.0.t', message: expect.stringContaining('G-01') })
    const flat = stripInputs()
    flat.walls[0]!.end = { by: 'point', x: quantity('0', 'mm'), y: quantity('0', 'mm') }
    expect(faultsOf(flat)[0]).toMatchObject({ path: 'walls.0.end', message: expect.stringContaining('G-06') })
  })
  it('refuses walls that cross away from a node (G-06), and takes them once they stop short', () => {
    const crossing = (x: string) => {
      const inputs = channelInputs()
      const wall = inputs.walls[0]!
      return { ...inputs, junctions: [], walls: [...inputs.walls, { ...wall, id: 'd', from: '4', to: '5', end: { by: 'point', x: quantity(x, 'mm'), y: quantity('50', 'mm') } }] }
    }
    expect(faultsOf(crossing('-10')).some(f => f.message.startsWith('G-06'))).toBe(true)
    expect(faultsOf(crossing('1'))).toEqual([])
  })
  it('refuses what is not one of its fields, and too many walls', () => {
    expect(faultsOf({ ...stripInputs(), extra: 1 })).not.toEqual([])
    expect(faultsOf({ ...stripInputs(), walls: Array.from({ length: 101 }, () => stripInputs().walls[0]) })[0]?.path).toBe('walls')
    expect(faultsOf(null)).not.toEqual([])
  })
  it('names doubled walls, cases and materials', () => {
    const inputs = lippedChannelInputs()
    if (inputs.loading.by === 'cases') inputs.loading.cases[1]!.id = 'L01'
    inputs.walls[1]!.id = 'a'
    inputs.materials.push(inputs.materials[0]!)
    expect(faultsOf(inputs).map(f => f.path).sort()).toEqual(['loading.cases.1.id', 'materials.1.id', 'walls.1.id'])
  })

  it('refuses an allowable next to nothing, whose ratio would leave the range of numbers', () => {
    const inputs = channelInputs()
    inputs.materials.forEach((material) => { material.Fsu = { text: '5e-324', unit: 'MPa' } })
    expect(faultsOf(inputs).map(f => f.path)).toEqual(['materials.0.Fsu'])
  })
})
