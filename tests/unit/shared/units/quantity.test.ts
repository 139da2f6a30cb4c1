import { describe, expect, it } from 'vitest'
import type { Dimension } from '#shared/units/units'
import { parseQuantity } from '#shared/units/quantity'

const read = (text: string, unit: string, dimension: Dimension) => parseQuantity({ text, unit }, dimension)
const value = (text: string, unit: string, dimension: Dimension): number => {
  const parsed = read(text, unit, dimension)
  if (!parsed.ok) throw new Error(parsed.message)
  return parsed.value
}
const message = (text: string, unit: string, dimension: Dimension): string => {
  const parsed = read(text, unit, dimension)
  return parsed.ok ? 'was read' : parsed.message
}

describe('reading a typed number', () => {
  it.each([
    ['12.5', 12.5], [' 12.5 ', 12.5], ['+3', 3], ['-3', -3], ['\u22123', -3], ['.5', 0.5], ['5.', 5], ['0', 0],
    ['1.2e3', 1200], ['1.2E-3', 0.0012], ['1.2×10³', 1200], ['1.2 × 10^-3', 0.0012], ['1.2*10^3', 1200], ['73.26×10⁻⁶', 73.26e-6],
    ['3/16', 0.1875], ['1 3/16', 1.1875], ['1-3/16', 1.1875], ['-1 3/16', -1.1875], ['3 / 16', 0.1875],
    ['1 234.5', 1234.5], ['12\u2009345', 12345], ['1\u202F234\u00A0567', 1234567],
  ])('%s is %d', (text, expected) => {
    expect(value(text, 'mm', 'length')).toBe(expected)
  })

  it.each([['abc'], ['1.2.3'], ['1 2'], ['12 34'], ['3/'], ['--3'], ['1e'], ['NaN'], ['Infinity'], ['0x10'], ['1_000'], ['∞']])('%s is refused', (text) => {
    expect(read(text, 'mm', 'length').ok).toBe(false)
  })

  it('asks what a comma means instead of guessing', () => {
    for (const text of ['12,5', '1,000', '1.000,5', ',5']) expect(message(text, 'mm', 'length')).toMatch(/decimal sign as a point/)
  })

  it('refuses what is empty, without end or far too long', () => {
    expect(message('', 'mm', 'length')).toBe('Write a value.')
    expect(message('\u2009 ', 'mm', 'length')).toBe('Write a value.')
    for (const text of ['1e400', '1/0', '0/0']) expect(message(text, 'mm', 'length')).toMatch(/not finite/)
    expect(message('1e308', 'm', 'length')).toMatch(/too large/)
    expect(message('1'.repeat(81), 'mm', 'length')).toMatch(/too long/)
  })

  it('stays quick on text made to be slow', () => {
    expect(read(`${'1 '.repeat(39)}x`, 'mm', 'length').ok).toBe(false)
    expect(read(`${'111 '.repeat(19)}/`, 'mm', 'length').ok).toBe(false)
  })
})

describe('the unit inside the text', () => {
  it.each([
    ['12.5 kip·in', 'N·m', 'torque', 'kip·in'], ['12.5 kip-in', 'N·m', 'torque', 'kip·in'], ['12.5kip in', 'N·m', 'torque', 'kip·in'],
    ['12 ft-lb', 'N·m', 'torque', 'lbf·ft'], ['12 in-lbf', 'N·m', 'torque', 'lbf·in'], ['12 lb-in', 'N·m', 'torque', 'lbf·in'],
    ['2 Nm', 'N·mm', 'torque', 'N·m'], ['2 N.mm', 'N·m', 'torque', 'N·mm'], ['2 N*m', 'N·mm', 'torque', 'N·m'], ['2 N⋅m', 'N·mm', 'torque', 'N·m'],
    ['4 mm^4', 'cm⁴', 'inertia', 'mm⁴'], ['4 in4', 'mm⁴', 'inertia', 'in⁴'], ['4 mm6', 'in⁶', 'warping', 'mm⁶'], ['4 mm2', 'in²', 'area', 'mm²'],
    ['3/16 in', 'mm', 'length', 'in'], ['3/16"', 'mm', 'length', 'in'], ['71 degF', '°C', 'temperature', '°F'], ['1.5°', 'rad', 'angle', '°'],
    ['1.5 deg', 'rad', 'angle', '°'], ['2.45 deg/m', 'rad/m', 'rateOfTwist', '°/m'], ['5%', '', 'ratio', '%'], ['71 ksi', 'MPa', 'stress', 'ksi'], ['71 N/mm2', 'MPa', 'stress', 'N/mm²'],
  ] as const)('%s overrides %s', (text, field, dimension, unit) => {
    expect(read(text, field, dimension)).toMatchObject({ ok: true, unit })
  })

  it('is kept from the field where the text has none, and both values are given', () => {
    expect(read('3/16', 'in', 'length')).toEqual({ ok: true, value: 0.1875, unit: 'in', engine: 4.7625 })
    expect(read('71', '°F', 'temperature')).toMatchObject({ value: 71, unit: '°F' })
  })

  it('must be of the dimension asked for', () => {
    expect(message('10 kN', 'N·m', 'torque')).toBe('kN is a force; a torque is asked for. Write it in N·mm, N·m, kN·m, lbf·in.')
    expect(message('10', 'MPa', 'torque')).toMatch(/^MPa is a stress/)
    expect(message('10', '', 'length')).toMatch(/^A number without a unit was given/)
    expect(message('1.5 mm', '', 'number')).toBe('mm is a length; a bare number is asked for. Write a number without a unit.')
  })

  it('is refused when unknown or when it can be two things', () => {
    expect(message('5 lb', 'N', 'force')).toMatch(/“lb” is not known/)
    expect(message('5 mPa', 'MPa', 'stress')).toMatch(/not known/)
    expect(message('5', 'furlong', 'length')).toMatch(/“furlong” is not known/)
    expect(message('5', '__proto__', 'length')).toMatch(/not known/)
    expect(message('5 constructor', 'mm', 'length')).toMatch(/not known/)
  })
})
