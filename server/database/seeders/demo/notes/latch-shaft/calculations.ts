/** Calculations of QSN-40-0012: the seat of the lever, the splined length, and the twist of the shaft, as they were submitted. */
import type { SolidBarInputs } from '#shared/calc/kinds/solid-bar/schema'
import type { TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import { bar, casesOf, declared, factorsOf, fromRecord, linked, typed } from '../../inputs'
import { cellOf, column, headsOf, LATCH, loadRecord, type LoadTable } from '../../load-tables'
import { QM_105 } from '../../materials'

/** The torque that the analyst gave each lever: half of the shaft's. */
const LEVERS: LoadTable = {
  ...LATCH,
  columns: [...LATCH.columns, column('half', 'Torque per lever', 'torque', 'N·m')],
  rows: LATCH.rows.map(([id, title, temperature, ...cells]) => [id, title, temperature, ...cells, String(Number(cellOf(LATCH, id, 'T')) / 2)]),
}

const joint = factorsOf('QL8-SC-001 issue 1: 1.5 on variable loads; fitting factor 1.15 on ultimate and on limit at the seat and the spline.', { fitting: '1.15', onLimit: true })
const notched = { declarations: declared({ fitting: true, repeated: true }) }

export const seat: SolidBarInputs = {
  units: 'SI', shape: { by: 'segment', radius: typed('9.0', 'mm'), depth: typed('1.8', 'mm') }, material: 'QM-105', ...bar(QM_105, casesOf('LATCH', 'half'), joint, notched),
}
export const spline: SolidBarInputs = {
  units: 'SI', shape: { by: 'circle', radius: typed('7.7', 'mm') }, material: 'QM-105', ...bar(QM_105, casesOf('LATCH', 'half'), joint, { declarations: declared({ fitting: true }) }),
}

export const shaft: TorqueAlongBarInputs = {
  units: 'SI',
  segments: [
    { id: 'a', title: 'seat of the lever', length: typed('46', 'mm'), material: 'QM-105', section: { by: 'constants', J: linked('seat', 'J', 'mm⁴'), WT: null } },
    { id: 'b', title: 'splined length', length: typed('88', 'mm'), material: 'QM-105', section: { by: 'constants', J: linked('spline', 'J', 'mm⁴'), WT: null } },
  ],
  supports: [{ node: '0', stiffness: null, clearance: null }], materials: [fromRecord(QM_105)],
  cases: headsOf(LATCH).map(head => ({ ...head, torques: [{ node: '2', T: linked('LATCH', `half@${head.id}`, 'N·m') }], distributed: [] })),
  twistAllowed: null, twistOrigin: '', factors: joint, declarations: declared({ fitting: true }),
}

export const cases = loadRecord(LEVERS)
