import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { evaluateTorqueAlongBar } from '#shared/calc/kinds/torque-along-bar/evaluate'
import { torqueAlongBarSchema, type TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { CalcKind } from '#shared/calc/types'

/** Torque along a bar: stepped and tapering segments, applied and distributed torques, supports that share. */
export const torqueAlongBar: CalcKind<TorqueAlongBarInputs> = {
  kind: 'torque-along-bar',
  version: 1,
  title: 'Torque along a bar',
  about: 'Torque and twist along a stepped or tapering bar with its supports: diagrams, reactions, margins.',
  methodRevision: METHOD_REVISION,
  schema: torqueAlongBarSchema,
  blank: () => {
    const { factors, declarations, materials, twistOrigin } = blankBar('SI', blankMaterial('SI'))
    const mm = () => ({ text: '', unit: 'mm' as const })
    return {
      units: 'SI', segments: [{ id: 'a', title: '', length: mm(), material: 'M1', section: { by: 'circle', d1: mm(), d2: mm() } }],
      supports: [{ node: '0', stiffness: null, clearance: null }], materials, cases: [], twistAllowed: null, twistOrigin, factors, declarations,
    }
  },
  evaluate: evaluateTorqueAlongBar,
}
