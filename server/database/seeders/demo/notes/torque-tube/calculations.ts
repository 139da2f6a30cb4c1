/** Calculations of QSN-19-0044: the two tubes, and the bar from the horn to the outer rib. */
import type { SolidBarInputs } from '#shared/calc/kinds/solid-bar/schema'
import type { TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import { bar, casesOf, declared, factorsOf, fromRecord, linked, typed } from '../../inputs'
import { cellOf, column, headsOf, loadRecord, TUBE, type LoadTable } from '../../load-tables'
import { QM_104 } from '../../materials'

/** Shares of the drive torque that the ribs take: QW19-FEM-061 issue 4, table 9. */
const SHARES = [['R1', 'rib one', 0.35], ['R2', 'rib two', 0.40], ['R3', 'rib three', 0.25]] as const

const share = (id: string, part: number): string => String(Number((Number(cellOf(TUBE, id, 'T')) * part).toPrecision(6)))

/** The cases of the loads document with the torques of the ribs, and what passes rib one, beside the torque of the drive. */
const DRIVE: LoadTable = {
  ...TUBE,
  columns: [...TUBE.columns, ...SHARES.map(([key, title]) => column(key, `Torque taken by ${title}`, 'torque', 'N·m')), column('T2', 'Torque beyond rib one', 'torque', 'N·m')],
  rows: TUBE.rows.map(([id, title, temperature, ...cells]) => [id, title, temperature, ...cells, ...SHARES.map(([, , part]) => share(id, part)), share(id, 0.65)]),
}

const criteria = 'QW19-SC-002 issue 2: 1.5 on limit loads'
const away = factorsOf(`${criteria}; away from the joint no special factor pertains.`)
const joint = factorsOf(`${criteria}; fitting factor 1.15 on ultimate and on limit (paragraph 5.3).`, { fitting: '1.15', onLimit: true })

const tube = (outer: string, inner: string, torque: string): SolidBarInputs => ({
  units: 'SI', shape: { by: 'tube', outer: typed(outer, 'mm'), inner: typed(inner, 'mm') }, material: 'QM-104',
  ...bar(QM_104, casesOf('TUBE', torque), away, { declarations: declared({ repeated: true }) }),
})

export const inboard = tube('19.0', '17.35', 'T')
export const outboard = tube('17.5', '16.25', 'T2')

const PIECES = [['a', 'horn to rib one', '220', 'inboard'], ['b', 'rib one to step', '150', 'inboard'], ['c', 'step to rib two', '80', 'outboard'], ['d', 'rib two to rib three', '250', 'outboard']] as const

/** From the horn outboard; the stress of the outer pieces stands in their own calculation, without the factor of the joint. */
export const drive: TorqueAlongBarInputs = {
  units: 'SI',
  segments: PIECES.map(([id, title, length, section]) => ({
    id, title, length: typed(length, 'mm'), material: 'QM-104',
    section: { by: 'constants', J: linked(section, 'J', 'mm⁴'), WT: id === 'a' ? linked(section, 'W_T', 'mm³') : null },
  })),
  supports: [{ node: '0', stiffness: null, clearance: null }], materials: [fromRecord(QM_104)],
  cases: headsOf(TUBE).map(head => ({
    ...head, distributed: [],
    torques: ([['1', 'R1'], ['3', 'R2'], ['4', 'R3']] as const).map(([node, key]) => ({ node, T: linked('TUBE', `${key}@${head.id}`, 'N·m') })),
  })),
  twistAllowed: typed('4.75', '°'), twistOrigin: 'QW19-SYS-027 issue 1, paragraph 6.2: wind-up between horn and outer rib',
  factors: joint, declarations: declared({ fitting: true, repeated: true }),
}

export const cases = loadRecord(DRIVE)
