import { blankOpenSection } from '#shared/calc/kinds/open-section/blank'
import { evaluateOpenSection } from '#shared/calc/kinds/open-section/evaluate'
import { METHOD_REVISION } from '#shared/calc/method'
import { openSectionSchema, type OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { CalcKind } from '#shared/calc/types'

/** Open section: straight and arc walls of differing thickness and shear modulus, junctions and branches. */
export const openSection: CalcKind<OpenSectionInputs> = {
  kind: 'open-section',
  version: 1,
  title: 'Open section',
  about: 'Torsion of straight and arc walls with branches and corners: stiffness, twist, stresses and margins per wall.',
  methodRevision: METHOD_REVISION,
  schema: openSectionSchema,
  blank: () => blankOpenSection(),
  evaluate: evaluateOpenSection,
}
