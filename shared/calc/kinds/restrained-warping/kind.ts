import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { blankOpenSection } from '#shared/calc/kinds/open-section/blank'
import { evaluateRestrainedWarping } from '#shared/calc/kinds/restrained-warping/evaluate'
import { restrainedWarpingSchema, type RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import type { CalcKind } from '#shared/calc/types'

/** An open section whose warping is held at supports: twist, bimoments, normal and shear stress along the bar. */
export const restrainedWarping: CalcKind<RestrainedWarpingInputs> = {
  kind: 'restrained-warping',
  version: 1,
  title: 'Restrained warping',
  about: 'An open section along its bar with ends that hold twist and warping: bimoments, normal and shear stress, margins.',
  methodRevision: METHOD_REVISION,
  schema: restrainedWarpingSchema,
  blank: () => {
    const { units, start, walls, junctions, factors, declarations } = blankOpenSection('SI')
    return {
      units, start, walls, junctions, materials: [blankMaterial('SI')], length: { text: '', unit: 'mm' },
      supports: [{ z: { text: '0', unit: 'mm' }, twist: 'held', twistStiffness: null, warping: 'held', warpingStiffness: null }],
      cases: [], twistAllowed: null, twistOrigin: '', factors, declarations: { ...declarations, heldAlong: false },
    }
  },
  evaluate: evaluateRestrainedWarping,
}
