import type { CalcResult } from '#shared/calc/types'
import type { UnitId } from '#shared/units/units'

/** The unit that stresses of a result are shown in: that of its peak shear, not of a modulus, which is a stress by its dimension too. */
export const stressUnitOf = ({ outputs, margins }: Pick<CalcResult, 'outputs' | 'margins'>): UnitId =>
  outputs.find(({ key, dimension }) => dimension === 'stress' && key.startsWith('tau'))?.unit ?? margins.find(({ dimension }) => dimension === 'stress')?.unit ?? 'MPa'
