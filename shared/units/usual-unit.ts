import { engineUnit, type Dimension, type UnitId } from '#shared/units/units'

const SI: Partial<Record<Dimension, UnitId>> = { torque: 'N·m', rateOfTwist: '°/m', angle: '°', temperature: '°C', distributedTorque: 'N·m/m', decay: '1/m', force: 'N' }
const US: Partial<Record<Dimension, UnitId>> = {
  length: 'in', area: 'in²', firstMoment: 'in³', inertia: 'in⁴', warping: 'in⁶', sectorial: 'in²', force: 'lbf', torque: 'lbf·in', distributedTorque: 'lbf·in/in', stress: 'ksi', angle: '°',
  rateOfTwist: '°/in', temperature: '°F', density: 'lb/in³', bimoment: 'lbf·in²', shearFlow: 'lbf/in', torsionalStiffness: 'lbf·in²', rotationalStiffness: 'lbf·in/rad',
  warpingStiffness: 'lbf·in³/rad', decay: '1/in', rateGradient: 'rad/in²',
}

/** The unit a new field of this dimension begins with. */
export const usualUnit = (dimension: Dimension, units: 'SI' | 'US'): UnitId =>
  (units === 'SI' ? SI : US)[dimension] ?? engineUnit(dimension)
