/** Calculations of QSN-19-0052: the two cells with their fins, and shear of torsion and bending together at the webs. */
import type { ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'
import type { CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import type { WallInput } from '#shared/calc/parts/wall-fields'
import { bar, casesOf, declared, factorsOf, fromRecord, linked, typed } from '../../inputs'
import { BOX, cellOf, headsOf, loadRecord } from '../../load-tables'
import { QM_101, QM_102 } from '../../materials'

const criteria = factorsOf('QW19-SC-002 issue 2: 1.5 on limit loads; no special factor pertains to the walls.')

const PLACES = { A: ['0', '-75'], B: ['0', '75'], C: ['190', '-70'], D: ['190', '70'], E: ['430', '-46'], F: ['430', '46'], P: ['462', '-43'], Q: ['462', '43'] } as const
type Node = keyof typeof PLACES

function wall(id: string, from: Node, to: Node, name: string, t: string, material = 'QM-102'): WallInput {
  const [x, y] = PLACES[to]
  return { id, name, from, to, end: { by: 'point', x: typed(x, 'mm'), y: typed(y, 'mm') }, t: typed(t, 'mm'), material }
}

export const cells: ClosedSectionInputs = {
  units: 'SI', start: { x: typed('0', 'mm'), y: typed('-75', 'mm') },
  walls: [
    wall('a', 'A', 'C', 'lower cover, cell 1', '3.5'), wall('b', 'C', 'E', 'lower cover, cell 2', '2.5'), wall('c', 'E', 'F', 'rear web', '2.5'), wall('d', 'F', 'D', 'upper cover, cell 2', '2.5'),
    wall('e', 'D', 'B', 'upper cover, cell 1', '3.5'), wall('f', 'B', 'A', 'front web', '3.5'), wall('g', 'C', 'D', 'shared web', '2.0', 'QM-101'), wall('h', 'E', 'P', 'lower fin', '2.0'), wall('i', 'F', 'Q', 'upper fin', '2.0'),
  ],
  junctions: [], joints: [{ wall: 'c', pitch: typed('18', 'mm') }], diaphragmSpacing: typed('220', 'mm'), diaphragmAtLoad: typed('0', 'mm'), root: 'free',
  ...bar(QM_102, casesOf('BOX', 'T'), criteria, { length: typed('1180', 'mm'), twistAllowed: typed('1.10', '°'), twistOrigin: 'QW19-SYS-031 issue 1: alignment of the carriages between the ends' }),
  materials: [fromRecord(QM_102), fromRecord(QM_101)],
}

export const cases = loadRecord(BOX)

/** Flexural flow per newton of vertical shear, largest along the wall, by the flows of the closed section at zero twist. */
const REAR = 0.00218035

export const rearWeb: CombinedStressInputs = {
  units: 'SI', rule: { by: 'circle' },
  points: headsOf(BOX).map(head => ({
    ...head, place: 'rear web, middle of its depth', material: 'QM-102', normal: [], torsion: linked('cells', `tau:c@${head.id}`, 'MPa'), warping: typed('0', 'MPa'),
    direct: typed((Math.abs(Number(cellOf(BOX, head.id, 'V'))) * REAR / 2.5).toPrecision(6), 'MPa'),
  })),
  materials: [fromRecord(QM_102)], factors: criteria, declarations: declared(),
}
