/** The engine alone on large thin-walled sections and bars. */
import { bench, describe } from 'vitest'
import { respondOfCells, torsionOfCells } from '#shared/torsion/cells/torsion-of-cells'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { respondToTorque } from '#shared/torsion/response'
import { sectorialProperties } from '#shared/torsion/sectorial'
import { sectorialRun } from '#shared/torsion/warping/sectorial-run'
import { stressPeaks } from '#shared/torsion/warping/stress-peaks'
import { warpingBar, type BarCase } from '#shared/torsion/warping/warping-bar'
import { given } from '../reference/engine'
import { chain, channel, graph } from '../reference/sections'

const cases = Array.from({ length: 1000 }, (_, i) => 1000 + 37 * i)

const meander = chain(Array.from({ length: 101 }, (_, i) => [10 * Math.ceil(i / 2), i % 4 < 2 ? 0 : 30] as const), 1.6)
/** A ladder of 33 cells: 34 webs of 60 and 33 pairs of covers of 50 mm make 100 walls. */
const ladder = graph(
  Array.from({ length: 68 }, (_, i) => [50 * Math.floor(i / 2), i % 2 === 0 ? 0 : 60] as const),
  [
    ...Array.from({ length: 34 }, (_, i) => ({ from: 2 * i, to: 2 * i + 1, t: 2 })),
    ...Array.from({ length: 33 }, (_, i) => [{ from: 2 * i, to: 2 * i + 2, t: 1.5 }, { from: 2 * i + 1, to: 2 * i + 3, t: 1.2 }]).flat(),
  ],
)

describe('thin walls', () => {
  bench('open section: 100 walls, torsion and sectorial properties, 1,000 cases', () => {
    const torsion = given(torsionOfOpenSection(meander))
    sectorialProperties(meander)
    for (const torque of cases) respondToTorque(torsion, torque)
  })
  bench('closed section: 33 cells, 100 walls, 1,000 cases', () => {
    const torsion = given(torsionOfCells(ladder))
    for (const torque of cases) respondOfCells(torsion, torque)
  })
})

const properties = given(sectorialProperties(channel))
const members = Array.from({ length: 20 }, (_, i) => ({ length: 60 + i, GJ: 26_900 * (2600 + 10 * i), EG: 71_000 * properties.gamma }))
const loads = Array.from({ length: 50 }, (_, i): BarCase => ({ torques: [{ node: 5 + i % 10, T: 6000 + 100 * i }, { node: 17, T: -2000 }], distributed: [{ member: i % 20, m: 12 }], bimoments: [] }))

describe('restrained warping', () => {
  const { fibres } = given(sectorialRun(channel))
  const stresses = stressPeaks(channel.walls.map(({ id }) => ({ fibres: fibres.filter(fibre => fibre.wall === id), normal: 441, shear: 269 })))
  bench('20 members, 50 cases, 21 stations a member, largest stresses of every wall', () => {
    const bar = given(warpingBar(members, [{ node: 0, twist: 'fixed', warping: 'fixed' }, { node: 20, twist: 'fixed', warping: 'free' }]))
    for (const load of loads) {
      const response = bar.respond(load)
      if ('ok' in response) throw new Error(response.reason)
      stresses({ run: bar.run(response), ends: response.members, gamma: properties.gamma, axial: 0 })
    }
  })
})
