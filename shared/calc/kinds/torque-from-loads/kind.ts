import { evaluateTorqueFromLoads } from '#shared/calc/kinds/torque-from-loads/evaluate'
import { torqueFromLoadsSchema, type TorqueFromLoadsInputs } from '#shared/calc/kinds/torque-from-loads/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import type { CalcKind } from '#shared/calc/types'

const origin = () => ({ text: '0', unit: 'mm' as const })

/** Torque from loads: forces and their arms about the shear centre, or a couple, case by case. */
export const torqueFromLoads: CalcKind<TorqueFromLoadsInputs> = {
  kind: 'torque-from-loads',
  version: 1,
  title: 'Torque from loads',
  about: 'The torque of offset forces and couples about the shear centre, for each load case.',
  methodRevision: METHOD_REVISION,
  schema: torqueFromLoadsSchema,
  blank: () => ({ units: 'SI', reference: { is: 'shear centre', x: origin(), y: origin() }, points: [{ id: 'P1', title: '', x: { text: '', unit: 'mm' }, y: { text: '', unit: 'mm' } }], cases: [] }),
  evaluate: evaluateTorqueFromLoads,
}
