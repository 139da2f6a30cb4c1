import { blankGeneralOutline } from '#shared/calc/kinds/general-outline/blank'
import { evaluateGeneralOutline } from '#shared/calc/kinds/general-outline/evaluate'
import { generalOutlineSchema, type GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import { METHOD_REVISION } from '#shared/calc/method'
import type { CalcKind } from '#shared/calc/types'

/** General outline: straight and arc edges, holes, one material, solved in two dimensions and compared with a first method. */
export const generalOutline: CalcKind<GeneralOutlineInputs> = {
  kind: 'general-outline',
  version: 1,
  title: 'General outline',
  about: 'Torsion of any outline with holes, solved in two dimensions: stiffness, peak shear with its place and uncertainty, and the check of a first method.',
  heavy: true,
  methodRevision: METHOD_REVISION,
  schema: generalOutlineSchema,
  blank: () => blankGeneralOutline(),
  evaluate: evaluateGeneralOutline,
}
