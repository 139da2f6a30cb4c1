import { evaluateSolidBar } from '#shared/calc/kinds/solid-bar/evaluate'
import { solidBarSchema, type SolidBarInputs } from '#shared/calc/kinds/solid-bar/schema'
import { blankMaterial } from '#shared/calc/kinds/material/kind'
import { METHOD_REVISION } from '#shared/calc/method'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { CalcKind } from '#shared/calc/types'

/** Solid bar: the shapes whose torsion is known in closed form, by a series or by a table. */
export const solidBar: CalcKind<SolidBarInputs> = {
  kind: 'solid-bar',
  version: 1,
  title: 'Solid bar',
  about: 'Torsion of circles, tubes, rectangles, triangles, sectors, D-shafts and polygons: constant, peak stress with its place, margins.',
  methodRevision: METHOD_REVISION,
  schema: solidBarSchema,
  blank: () => ({ units: 'SI', shape: { by: 'circle', radius: { text: '', unit: 'mm' } }, material: 'M1', ...blankBar('SI', blankMaterial('SI')) }),
  evaluate: evaluateSolidBar,
}
