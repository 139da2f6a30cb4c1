import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { decimals, noValue, showMargin, showQuantity, showReserve, showValue, significant, texNumber, texQuantity, texUnit, withUnit } from '#shared/units/display'
import { dimensions, unitsOf } from '#shared/units/units'

const thin = '\u2009'
const spoken = (text: string): string => text.replaceAll(thin, ' ').replaceAll('\u2212', '-')

describe('a margin (methods reference §10, table (j) of §13)', () => {
  it.each([
    [0.1999, '+0.19'], [0.2, '+0.20'], [0.28999999999999998, '+0.29'], [0, '+0.00'], [-0, '+0.00'], [-1e-15, '-0.01'], [-0.0001, '-0.01'],
    [-0.13, '-0.13'], [-0.129, '-0.13'], [0.57, '+0.57'], [1.1, '+1.10'], [12, '>+10'], [10, '+10.00'], [1.95878838541352, '+1.95'],
    [2.36111144025938, '+2.36'], [0.28036879932896, '+0.28'], [0.354065922853802, '+0.35'], [-0.03091263843374, '-0.04'], [-1, '-1.00'],
  ])('%d is shown as %s', (ms, shown) => {
    expect(spoken(showMargin(ms))).toBe(shown)
  })

  it('says so where nothing is loaded, and shows no number where there is none', () => {
    expect(showMargin(null)).toBe('high (no load)')
    expect(showReserve(null)).toBe('high (no load)')
    for (const ms of [Number.NaN, Infinity, -Infinity]) expect(showMargin(ms)).toBe(noValue)
  })

  it('never shows more than there is, never hides a negative one, and the reserve factor agrees', () => {
    fc.assert(fc.property(fc.double({ min: -1, max: 10, noNaN: true }), (ms) => {
      const shown = Number(spoken(showMargin(ms)))
      expect(shown).toBeLessThanOrEqual(ms + 1e-10)
      expect(shown).toBeGreaterThan(ms - 0.010_000_001 - (ms < 0 ? 0.01 : 0))
      expect(shown < 0).toBe(ms < 0)
      expect(Number(showReserve(ms))).toBeCloseTo(1 + shown, 12)
    }), { numRuns: 1000, seed: 20_261_012 })
    expect(showReserve(-0.0001)).toBe('0.99')
    expect(showReserve(12)).toBe('>11')
  })
})

describe('significant figures', () => {
  it.each([
    [152_380.95, 4, '152 400'], [999_999.6, 5, '1.0000×10⁶'], [2_753_560, 5, '2.7536×10⁶'], [7.326e-5, 4, '73.26×10⁻⁶'], [-7793.98, 4, '-7 794'],
    [0.000_999_999_9, 4, '0.001000'], [0.001, 3, '0.00100'], [0.285, 2, '0.29'], [9.375, 5, '9.3750'], [1.005, 3, '1.01'], [123_456, 5, '123 460'],
    [-12_345_678, 5, '-12.346×10⁶'], [0, 4, '0'], [9.9996, 4, '10.00'], [1e21, 3, '1.00×10²¹'], [155.539, 5, '155.54'],
  ])('%d to %d figures is %s', (value, figures, shown) => {
    expect(spoken(significant(value, figures))).toBe(shown)
  })

  it('rounds half away from zero on the written number, and up or down when asked', () => {
    expect(spoken(significant(-0.285, 2))).toBe('-0.29')
    expect(significant(1565.74, 4, 'down')).toBe(`1${thin}565`)
    expect(significant(2.61807, 3, 'up')).toBe('2.62')
    expect(significant(2.61, 3, 'up')).toBe('2.61')
  })

  it('is within half a unit of the last figure', () => {
    fc.assert(fc.property(fc.double({ min: -1e12, max: 1e12, noNaN: true, noDefaultInfinity: true }), fc.integer({ min: 2, max: 6 }), (value, figures) => {
      fc.pre(Math.abs(value) > 1e-12)
      const match = /^(-?)([\d. ]+?)(?:×10(.+))?$/.exec(spoken(significant(value, figures)))
      const power = Number((match?.[3] ?? '0').replaceAll(/[⁰¹²³⁴⁵⁶⁷⁸⁹⁻]/g, sign => (sign === '⁻' ? '-' : String('⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(sign)))))
      const shown = Number(`${match?.[1]}${match?.[2]?.replaceAll(' ', '')}e${power}`)
      expect(Math.abs(shown - value)).toBeLessThanOrEqual(0.500_001 * 10 ** (Math.floor(Math.log10(Math.abs(value))) - figures + 1))
    }), { seed: 20_261_012 })
  })
})

describe('decimals', () => {
  it.each([[0.0117549, 3, 'up', '0.012'], [0.9996, 3, 'nearest', '1.000'], [9.9996, 3, 'nearest', '10.000'], [0, 3, 'nearest', '0.000'], [1e-9, 3, 'up', '0.001'], [1e-9, 3, 'nearest', '0.000'], [1234.5, 1, 'down', '1 234.5'], [0.05, 1, 'nearest', '0.1'], [0.04, 1, 'nearest', '0.0'], [-0.04, 1, 'nearest', '0.0'], [99.96, 1, 'nearest', '100.0']] as const)('%d to %d places, %s: %s', (value, places, rounding, shown) => {
    expect(spoken(decimals(value, places, rounding))).toBe(shown)
  })
})

describe('a quantity', () => {
  it.each([
    [12.345678, 'stress', 'MPa', '12.35 MPa'], [152_380.95, 'torque', 'N·m', '152.4 N·m'], [155.539, 'inertia', 'mm⁴', '155.54 mm⁴'],
    [7.32627e-5, 'rateOfTwist', 'rad/mm', '73.26×10⁻⁶ rad/mm'], [7.32627e-5, 'rateOfTwist', '°/m', '4.198 °/m'], [0.0300377, 'angle', 'rad', '0.0300 rad'], [0.0300377, 'angle', '°', '1.72°'],
    [0.413585, 'ratio', '', '0.414'], [0.9990001, 'ratio', '', '1.000'], [0.123, 'ratio', '%', '12.3 %'], [71, 'temperature', '°C', '71 °C'], [23, 'temperature', '°F', '73.4 °F'],
    [6.8947572931683, 'stress', 'ksi', '1.000 ksi'], [1.9587, 'margin', '', '+1.95'], [9.375, 'number', '', '9.3750'],
  ] as const)('%d as %s in %s is %s', (value, dimension, unit, shown) => {
    expect(spoken(showQuantity(value, dimension, unit))).toBe(shown)
  })

  it('always shows something, and never NaN', () => {
    const anything = fc.double()
    fc.assert(fc.property(fc.constantFrom(...dimensions), anything, (dimension, value) => {
      for (const unit of unitsOf(dimension)) expect(showValue(value, dimension, unit)).not.toMatch(/NaN|Infinity|undefined|^$/)
    }), { numRuns: 300, seed: 20_261_012 })
  })

  it('sets a typed number before its unit as it was typed', () => {
    expect(withUnit('3/16', 'in')).toBe(`3/16${thin}in`)
    expect(withUnit('1.50', '°')).toBe('1.50°')
  })
})

describe('mathematics', () => {
  it('writes numbers and units in base commands', () => {
    expect(texNumber(2_753_560, 6)).toBe('2.75356\\times 10^{6}')
    expect(texNumber(-7793.98, 6)).toBe('-7\\,793.98')
    expect(texNumber(0, 6)).toBe('0')
    expect(texUnit('N·mm²')).toBe('\\mathrm{N{\\cdot}mm^{2}}')
    expect(texUnit('°/m')).toBe('\\mathrm{{}^{\\circ}/m}')
    expect(texUnit('%')).toBe('\\mathrm{\\%}')
    expect(texQuantity(0.0300377, '°')).toBe('1.72103^{\\circ}')
    expect(texQuantity(1000, 'N·m')).toBe('1.00000\\,\\mathrm{N{\\cdot}m}')
    expect(texQuantity(0.5, '')).toBe('0.500000')
  })
})
