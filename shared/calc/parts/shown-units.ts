/** Units in which computed values are shown, by the system chosen and by what the author typed. */
import type { UnitOf } from '#shared/units/units'

export interface ShownUnits {
  length: UnitOf<'length'>, area: UnitOf<'area'>, inertia: UnitOf<'inertia'>, warping: UnitOf<'warping'>, stiffness: UnitOf<'torsionalStiffness'>
  torque: UnitOf<'torque'>, rate: UnitOf<'rateOfTwist'>, rateDegrees: UnitOf<'rateOfTwist'>, stress: UnitOf<'stress'>
}

const SI: ShownUnits = { length: 'mm', area: 'mm²', inertia: 'mm⁴', warping: 'mm⁶', stiffness: 'N·mm²', torque: 'N·mm', rate: 'rad/m', rateDegrees: '°/m', stress: 'MPa' }
const US: ShownUnits = { length: 'in', area: 'in²', inertia: 'in⁴', warping: 'in⁶', stiffness: 'lbf·in²', torque: 'lbf·in', rate: 'rad/in', rateDegrees: '°/in', stress: 'ksi' }

export function shownUnits(model: { units: 'SI' | 'US' }): ShownUnits {
  return model.units === 'SI' ? SI : US
}
