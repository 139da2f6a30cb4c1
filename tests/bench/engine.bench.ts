/** What one keystroke costs: the engine runs in the browser while a section is typed. */
import { bench, describe } from 'vitest'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { sectorialProperties } from '#shared/torsion/sectorial'
import { respondToTorque } from '#shared/torsion/response'
import { parseQuantity } from '#shared/units/quantity'
import { showQuantity } from '#shared/units/display'
import { chain, hat } from '../reference/sections'

/** Sixty walls in a meander: more than any section of a note. */
const long = chain(Array.from({ length: 61 }, (_, index) => [10 * Math.ceil(index / 2), index % 4 < 2 ? 0 : 30] as const), 1.6)

describe('open section', () => {
  bench('torsion of a hat with bends', () => void torsionOfOpenSection(hat))
  bench('sectorial properties of a hat with bends', () => void sectorialProperties(hat))
  bench('torsion of sixty walls', () => void torsionOfOpenSection(long))
  bench('sectorial properties of sixty walls', () => void sectorialProperties(long))
  const torsion = torsionOfOpenSection(hat)
  bench('one hundred load cases on a hat', () => {
    if (torsion.ok) for (let index = 0; index < 100; index += 1) respondToTorque(torsion, 1000 + index)
  })
})

describe('units', () => {
  bench('read a quantity', () => void parseQuantity({ text: '1 3/16 in', unit: 'mm' }, 'length'))
  bench('show a quantity', () => void showQuantity(152_380.95, 'torque', 'N·m'))
})
