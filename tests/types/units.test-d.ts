/** What must not compile: units of one dimension where another is meant. */
import { describe, expectTypeOf, it } from 'vitest'
import type { TypedQuantity } from '#shared/calc/types'
import { output } from '#shared/calc/parts/output'
import { shownUnits, type ShownUnits } from '#shared/calc/parts/shown-units'
import { showQuantity, showValue } from '#shared/units/display'
import { fromEngine, toEngine, type Dimension, type UnitId, type UnitOf } from '#shared/units/units'

describe('units of a dimension', () => {
  it('are its own', () => {
    expectTypeOf<'N·m'>().toExtend<UnitOf<'torque'>>()
    expectTypeOf<'MPa'>().not.toExtend<UnitOf<'torque'>>()
    expectTypeOf<'rad'>().not.toExtend<UnitOf<'rateOfTwist'>>()
    expectTypeOf<'mm²'>().toExtend<UnitOf<'area'> & UnitOf<'sectorial'>>()
    expectTypeOf<UnitOf<'torque'> & UnitOf<'stress'>>().toBeNever()
    expectTypeOf<UnitOf<Dimension>>().toEqualTypeOf<UnitId>()
    expectTypeOf<ShownUnits['torque']>().toEqualTypeOf<UnitOf<'torque'>>()
  })

  it('of another dimension do not compile beside a value', () => {
    showQuantity(1, 'torque', 'N·m')
    // @ts-expect-error a torque is not shown in MPa
    showQuantity(1, 'torque', 'MPa')
    // @ts-expect-error nor an angle in rad/mm
    showValue(1, 'angle', 'rad/mm')
    // @ts-expect-error nor one of several
    showValue(1, 'stress', Math.random() < 0.5 ? 'MPa' : 'mm')
    // @ts-expect-error the units of a system keep their dimension
    showQuantity(1, 'stress', shownUnits({ units: 'SI' }).torque)
    // @ts-expect-error an output of one dimension has no unit of another
    output('J', 'J', 'Torsion constant', 1, 'inertia', 'mm⁶', '§1.9')
    output('J', 'J', 'Torsion constant', 1, 'inertia', 'mm⁴', '§1.9')
    // @ts-expect-error shown units have their own dimension
    expectTypeOf<ShownUnits>({ ...shownUnits({ units: 'US' }), torque: 'ksi' })
  })

  it('chosen by somebody are checked when running', () => {
    const chosen = 'N·m' as UnitId
    showQuantity(1, 'torque', chosen)
  })

  it('are spelt as they are shown', () => {
    // @ts-expect-error no such unit
    toEngine(1, 'Nm')
    // @ts-expect-error no such unit
    fromEngine(1, 'furlong')
    // @ts-expect-error no such unit
    expectTypeOf<TypedQuantity>({ text: '1', unit: 'mm^4' })
  })
})
