import { evaluateClosedSection } from '#shared/calc/kinds/closed-section/evaluate'
import { closedSectionSchema, type ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'
import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { METHOD_REVISION } from '#shared/calc/method'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { CalcKind } from '#shared/calc/types'

const mm = (text: string) => ({ text, unit: 'mm' as const })

/** Closed section: one cell or several with shared walls and fins. */
export const closedSection: CalcKind<ClosedSectionInputs> = {
  kind: 'closed-section',
  version: 1,
  title: 'Closed section',
  about: 'Torsion of thin walls that close one or more cells, with shared webs and fins: stiffness, shear flows, stresses and margins per wall.',
  methodRevision: METHOD_REVISION,
  schema: closedSectionSchema,
  blank: () => ({
    units: 'SI', start: { x: mm('0'), y: mm('0') },
    walls: [{ id: 'a', name: '', from: '1', to: '2', end: { by: 'length', length: mm(''), direction: { text: '0', unit: '°' } }, t: mm(''), material: 'M1' }],
    junctions: [], joints: [], diaphragmSpacing: null, diaphragmAtLoad: null, root: 'unknown', ...blankBar('SI', blankMaterial('SI')),
  }),
  evaluate: evaluateClosedSection,
}
