import { describe, expect, it } from 'vitest'
import { inchBarInputs, solidBarInputs } from '../../../factories/solid-bar'
import { calcKind } from '#shared/calc/registry'
import { stressUnitOf } from '#shared/calc/stress-unit'

const unitOf = (inputs: unknown) => {
  const evaluation = calcKind('solid-bar').evaluate(inputs)
  return evaluation.ok ? stressUnitOf(evaluation.result) : null
}

describe('the unit of the stresses in a table', () => {
  it('is not that of the shear modulus, which stands before them among the values', () => {
    expect(unitOf(solidBarInputs())).toBe('MPa')
    expect(unitOf(inchBarInputs())).not.toBe('GPa')
  })
  it('is MPa where nothing is stressed', () => {
    expect(stressUnitOf({ outputs: [], margins: [] })).toBe('MPa')
  })
})
