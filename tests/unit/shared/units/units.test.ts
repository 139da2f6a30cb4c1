import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { given } from '../../../reference/engine'
import { graph, strip30x3 } from '../../../reference/sections'
import { torsionOfCells } from '#shared/torsion/cells/torsion-of-cells'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { respondToTorque } from '#shared/torsion/response'
import type { Solid } from '#shared/torsion/solids/solid'
import { torsionOfSolid } from '#shared/torsion/solids/torsion-of-solid'
import { parseQuantity } from '#shared/units/quantity'
import type { UnitId } from '#shared/units/units'
import { parseUnit } from '#shared/units/parse-unit'
import { dimensionOf, dimensions, engineUnit, fromEngine, intervalFromEngine, intervalToEngine, isUnit, toEngine, unitFits, unitsOf } from '#shared/units/units'

const everyUnit = dimensions.flatMap(dimension => unitsOf(dimension).map(unit => [dimension, unit] as const))
const ulps = (a: number, b: number): number => Math.abs(a - b) / (Number.EPSILON * Math.max(Math.abs(a), Number.MIN_VALUE))

describe('conversion', () => {
  it.each(everyUnit)('%s in %s comes back within two units of the last place', (dimension, unit) => {
    // A scale with its own zero loses what the shift of the zero costs.
    const slack = unit === '°F' || unit === 'K' ? 1e3 : 2
    fc.assert(fc.property(fc.double({ min: 1e-3, max: 1e9, noNaN: true }), (value) => {
      expect(ulps(value, fromEngine(toEngine(value, unit), unit))).toBeLessThanOrEqual(unit === '°F' || unit === 'K' ? slack * Math.max(1, 300 / value) : slack)
    }), { numRuns: 200, seed: 20_261_012 })
    expect(unitFits(unit, dimension)).toBe(true)
  })

  it('leaves the engine\'s own units untouched', () => {
    for (const dimension of dimensions) expect(toEngine(12.345, engineUnit(dimension))).toBe(12.345)
  })

  it('is proportional and monotone', () => {
    fc.assert(fc.property(fc.constantFrom(...everyUnit), fc.double({ min: 1e-3, max: 1e6, noNaN: true }), ([, unit], value) => {
      expect(intervalToEngine(2 * value, unit)).toBe(2 * intervalToEngine(value, unit))
      expect(toEngine(value + 1, unit)).toBeGreaterThan(toEngine(value, unit))
    }))
  })

  it('takes the offset of a temperature, but not of a difference', () => {
    expect(toEngine(32, '°F')).toBe(0)
    expect(fromEngine(100, '°F')).toBeCloseTo(212, 12)
    expect(intervalToEngine(18, '°F')).toBeCloseTo(10, 12)
    expect(intervalFromEngine(10, '°F')).toBeCloseTo(18, 12)
    expect(toEngine(273.15, 'K')).toBe(0)
  })
})

describe('the common slips (methods reference §10) each differ by what they should', () => {
  const ratio = (a: UnitId, b: UnitId): number => toEngine(1, a) / toEngine(1, b)
  it.each([
    ['N·m against N·mm', 'N·m', 'N·mm', 1e3], ['cm⁴ against mm⁴', 'cm⁴', 'mm⁴', 1e4], ['m⁴ against mm⁴', 'm⁴', 'mm⁴', 1e12],
    ['cm⁶ against mm⁶', 'cm⁶', 'mm⁶', 1e6], ['GPa against MPa', 'GPa', 'MPa', 1e3], ['lbf·ft against lbf·in', 'lbf·ft', 'lbf·in', 12],
    ['kip against lbf', 'kip', 'lbf', 1e3], ['ksi against psi', 'ksi', 'psi', 1e3], ['Msi against ksi', 'Msi', 'ksi', 1e3],
    ['kPa against Pa', 'kPa', 'Pa', 1e3], ['kPa against hPa', 'kPa', 'hPa', 10], ['lbf·in against N·mm', 'lbf·in', 'N·mm', 112.9848290276167],
    ['slug against lbm', 'slug/ft³', 'lb/ft³', 32.17404855643044], ['°/m taken as rad/mm', '°/m', 'rad/mm', Math.PI / 180e3], ['rad/m taken as rad/mm', 'rad/m', 'rad/mm', 1e-3],
  ] as const)('%s', (_, a, b, expected) => {
    expect(ratio(a, b) / expected).toBeCloseTo(1, 13)
  })
})

/** Slips of geometry and of load: what the result says of them. */
describe('the common slips in a calculation', () => {
  const J = (solid: Solid) => given(torsionOfSolid(solid)).J
  it('the diameter entered for the radius, or the full axes of an ellipse for the semi-axes: J × 16', () => {
    expect(J({ shape: 'circle', outerRadius: 24, innerRadius: 0 }) / J({ shape: 'circle', outerRadius: 12, innerRadius: 0 })).toBeCloseTo(16, 12)
    expect(J({ shape: 'ellipse', semiMajor: 40, semiMinor: 24, ratio: 0 }) / J({ shape: 'ellipse', semiMajor: 20, semiMinor: 12, ratio: 0 })).toBeCloseTo(16, 12)
  })

  it('outer dimensions taken for those of the mid-line: a box 102 × 52 × 2 has 4A²t/ΣL of 100 × 50', () => {
    const box = (b: number, h: number) => given(torsionOfCells(graph([[0, 0], [b, 0], [b, h], [0, h]], [[0, 1], [1, 2], [2, 3], [3, 0]].map(([from = 0, to = 0]) => ({ from, to, t: 2 }))))).GJ / 26_900
    expect(box(100, 50)).toBeCloseTo(4 * 5000 ** 2 * 2 / 300, 6)
    expect(box(102, 52) / box(100, 50)).toBeCloseTo((102 * 52 / 5000) ** 2 * 300 / 308, 10)
  })

  it('the torque of a pair taken for that of one part: stress and twist × 2', () => {
    const open = given(torsionOfOpenSection(strip30x3))
    const [one, pair] = [given(respondToTorque(open, 500)), given(respondToTorque(open, 1000))]
    expect([pair.tauMax / one.tauMax, pair.rate / one.rate]).toEqual([2, 2])
  })

  it('a decimal comma is asked for, never guessed', () => {
    expect(parseQuantity({ text: '12,5', unit: 'N·m' }, 'torque').ok).toBe(false)
  })
})

describe('names', () => {
  it('reads back every unit as it is shown', () => {
    for (const [, unit] of everyUnit) expect(parseUnit(unit)).toBe(unit)
  })

  it('knows its units and nothing else', () => {
    expect(isUnit('MPa')).toBe(true)
    for (const text of ['mpascal', 'toString', '__proto__', 'MPA']) expect(isUnit(text)).toBe(false)
    expect(dimensionOf('mm²')).toBe('area')
    expect(unitFits('mm²', 'sectorial')).toBe(true)
    expect(dimensionOf('')).toBe('number')
    expect(() => dimensionOf('x' as UnitId)).toThrow()
    expect(() => toEngine(1, 'x' as UnitId)).toThrow()
  })
})
