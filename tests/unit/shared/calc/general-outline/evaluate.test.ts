import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { CalcResult } from '#shared/calc/types'
import { evaluateGeneralOutline } from '#shared/calc/kinds/general-outline/evaluate'
import { boredPlateInputs, corner, firstMethod, keyedShaftInputs, sharpBracketInputs, thickAngleInputs } from '../../../../factories/general-outline'
import { quantity } from '../../../../factories/open-section'

function result(inputs: unknown): CalcResult {
  const evaluation = evaluateGeneralOutline(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (of: CalcResult, key: string): number => of.outputs.find(output => output.key === key)?.value ?? Number.NaN
const faults = (inputs: unknown) => {
  const evaluation = evaluateGeneralOutline(inputs)
  return evaluation.ok ? [] : evaluation.faults
}
const squareInputs = (side = '20'): GeneralOutlineInputs => ({
  ...thickAngleInputs(), first: { by: 'none' },
  outer: { by: 'vertices', vertices: [corner('0', '0'), corner(side, '0'), corner(side, side), corner('0', side)] },
})

describe('a general outline', () => {
  it('has the values of Saint-Venant’s series for a square bar', () => {
    const square = result(squareInputs())
    // β = 0.1405770150, τ = 0.6753144833 Gθ′a, α = 0.2081652599 (exact series, 30 digits).
    expect(value(square, 'J') / 20 ** 4).toBeCloseTo(0.1405770150, 6)
    expect(value(square, 'tau_rate') / 20).toBeCloseTo(0.6753144833, 3)
    expect(value(square, 'W_T') / 20 ** 3).toBeCloseTo(0.2081652599, 3)
    expect(value(square, 'tau_max@T')).toBeCloseTo(3e5 / (0.2081652599 * 8000), 0)
    expect(value(square, 'x_S')).toBeCloseTo(10, 6)
    expect(value(square, 'Gamma') / 20 ** 6).toBeCloseTo(1.3440234557e-4, 7)
  })

  it('carries the load to twist, stress and margins with the factors of each level', () => {
    const angle = result(thickAngleInputs())
    const [J, G, T] = [value(angle, 'J'), 26_200, 300_000]
    expect(value(angle, 'theta@T')).toBeCloseTo(T / (G * J), 12)
    expect(value(angle, 'twist@T')).toBeCloseTo(T * 400 / (G * J), 10)
    const tau = T / value(angle, 'W_T')
    expect(value(angle, 'tau_max@T')).toBeCloseTo(tau, 8)
    // Fsu 186 MPa, Fty 241 MPa; no knock-down at 23 °C; factor of safety 1.5.
    expect(value(angle, 'MS:shear-ultimate')).toBeCloseTo(186 / (1.5 * tau) - 1, 10)
    expect(value(angle, 'MS:shear-yield')).toBeCloseTo(241 / Math.sqrt(3) / tau - 1, 10)
    expect(angle.governing).toBe('shear-ultimate@T')
    expect(angle.tables?.map(({ key }) => key)).toEqual(['meshes', 'maxima', 'checks'])
    expect(angle.compared?.[0]).toMatchObject({ key: 'J', compared: 116_500, used: J })
  })

  it('gives no number for an unbounded peak, and says where it is', () => {
    const sharp = result(sharpBracketInputs())
    expect(sharp.outputs.filter(({ key }) => /^(tau_max|W_T|tau_rate|MS)/.test(key))).toEqual([])
    expect(sharp.margins).toEqual([])
    expect(sharp.cases).toEqual([])
    expect(sharp.guards.find(({ id }) => id === 'G-10')?.message).toMatch(/^Unbounded in linear elasticity at \(8, 8\)/)
    expect(sharp.outputs.filter(({ key }) => key.startsWith('tau_outside')).every(({ label }) => label.includes('outside the discs at sharp vertices, no peak'))).toBe(true)
    // The same corner with its fillet has a peak, there.
    const vertices = [corner('0', '0'), corner('40', '0'), corner('40', '8'), corner('8', '8', { radius: '3' }), corner('8', '30'), corner('0', '30')]
    const filleted = result({ ...sharpBracketInputs(), outer: { by: 'vertices', vertices } })
    expect(filleted.margins.length).toBeGreaterThan(0)
    expect(filleted.cases[0]?.tauMaxWall).toBe('corner 4')
  })

  it('takes an imposed rate of twist, holes, and gives the flow round each', () => {
    const plate = result(boredPlateInputs())
    const rate = 1.5 * Math.PI / 180 / 1000
    expect(value(plate, 'T@R1')).toBeCloseTo(26_200 * value(plate, 'J') * rate, 4)
    // The two bores lie symmetrically.
    expect(value(plate, 'q:A@R1')).toBeCloseTo(value(plate, 'q:B@R1'), 8)
    expect(plate.outputs.some(({ key }) => key === 'Gamma')).toBe(false)
  })

  it('takes inches, ksi and kip·in', () => {
    const shaft = result(keyedShaftInputs())
    expect(shaft.outputs.find(({ key }) => key === 'J')?.unit).toBe('in⁴')
    // Below a plain 2 in shaft, whose J is π/2 in⁴; the keyway takes a sixth (common practice: some 15 to 20 %).
    expect(value(shaft, 'J') / 25.4 ** 4).toBeGreaterThan(0.8 * Math.PI / 2)
    expect(value(shaft, 'J') / 25.4 ** 4).toBeLessThan(0.87 * Math.PI / 2)
  })

  it('does not change when the section is drawn elsewhere, the other way round or in other units', () => {
    const drawn = thickAngleInputs()
    if (drawn.outer.by !== 'vertices') throw new Error('drawn by vertices')
    const { vertices } = drawn.outer
    const at = (typed: { text: string }, by: number) => quantity(String((Number(typed.text) + by) / 25.4), 'in')
    const moved = result({
      ...drawn, outer: { by: 'vertices', vertices: [...vertices].reverse().map(one => ({ ...one, name: '', x: at(one.x, 100), y: at(one.y, -50) })) },
    })
    expect(value(moved, 'J')).toBeCloseTo(value(result(drawn), 'J'), 4)
    expect(value(moved, 'tau_max@T')).toBeCloseTo(value(result(drawn), 'tau_max@T'), 6)
    expect(value(moved, 'x_S')).toBeCloseTo(value(result(drawn), 'x_S') + 100, 6)
  })

  it('scales: stress at one torque falls with the cube of the size', () => {
    fc.assert(fc.property(fc.integer({ min: 5, max: 200 }), (side) => {
      expect(value(result(squareInputs(String(side))), 'tau_max@T') * side ** 3).toBeCloseTo(value(result(squareInputs('20')), 'tau_max@T') * 8000, 0)
    }), { numRuns: 10 })
  })

  it('is evaluated quickly when the outline is known', () => {
    const inputs = thickAngleInputs()
    result(inputs)
    const loaded = result({ ...inputs, loading: { by: 'torque', torque: quantity('600', 'N·m'), level: 'limit', temperature: null, source: '' } })
    expect(value(loaded, 'tau_max@T')).toBeCloseTo(2 * value(result(inputs), 'tau_max@T'), 8)
  })
})

describe('inputs that bound no section', () => {
  const vertices = (...all: ReturnType<typeof corner>[]) => ({ ...squareInputs(), outer: { by: 'vertices' as const, vertices: all } })
  it.each<[string, unknown, string, RegExp]>([
    ['crossing edges', vertices(corner('0', '0'), corner('9', '9'), corner('9', '0'), corner('0', '9')), 'outer', /^G-06: .*meet at \(4\.5, 4\.5\)/],
    ['too few vertices', vertices(corner('0', '0')), 'outer.vertices', /Give the vertices/],
    ['an empty field', vertices(corner('0', '0'), corner('', '0'), corner('9', '9')), 'outer.vertices.1.x', /Give x of vertex 2/],
    ['a radius that does not fit', vertices(corner('0', '0'), corner('9', '0', { radius: '6' }), corner('9', '9', { radius: '6' }), corner('0', '9')), 'outer.vertices', /take 12 mm of an edge of 9 mm/],
    ['a radius at an arc', vertices(corner('0', '0', { sweep: '60' }), corner('9', '0', { radius: '1' }), corner('9', '9')), 'outer.vertices', /joins an arc/],
    ['a full turn', vertices(corner('0', '0', { sweep: '360' }), corner('9', '0'), corner('9', '9')), 'outer.vertices.0.sweep', /less than a full circle/],
    ['a hole outside', { ...squareInputs(), holes: [{ id: 'H', shape: { by: 'circle', x: quantity('90', 'mm'), y: quantity('0', 'mm'), radius: quantity('3', 'mm') } }] }, 'holes', /lies outside the outer loop/],
    ['a hole without radius', { ...squareInputs(), holes: [{ id: 'H', shape: { by: 'circle', x: quantity('10', 'mm'), y: quantity('10', 'mm'), radius: quantity('0', 'mm') } }] }, 'holes.0.shape.radius', /greater than zero/],
    ['no material', { ...squareInputs(), materials: [] }, 'materials', /one material/],
    ['a first method without a value', { ...squareInputs(), first: firstMethod('exact shape', {}) }, 'first.J', /at least one value/],
    ['a closed first method without χ', { ...squareInputs(), first: firstMethod('closed', { J: '1' }) }, 'first.chi', /face factor/],
  ])('%s', (_, inputs, path, message) => {
    expect(faults(inputs)).toContainEqual({ path, message: expect.stringMatching(message) })
  })
})
