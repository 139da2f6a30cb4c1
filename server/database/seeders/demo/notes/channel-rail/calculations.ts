/** Calculations of QSN-40-0009: the rail between built-in ends, the same between forks, and the bent outline as a second method. */
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'
import { bar, declared, factorsOf, fromRecord, linked, polyline, typed, type Corner } from '../../inputs'
import { column, headsOf, loadRecord, ofCase, ROLLERS, type LoadTable } from '../../load-tables'
import { QM_106 } from '../../materials'
import { thickened } from '../../thickened'

const MID_LINE: Corner[] = [['60', '-70'], ['0', '-70'], ['0', '70'], ['60', '70']]
const STATIONS = [['P1', '420'], ['P2', '900'], ['P3', '1380']] as const

const PARTIAL = 'QL8-SC-001 issue 1, paragraph 4: 1.5 on variable loads and 1.00 on yield, partial factors of EN 1993-1-1'
const characteristic = factorsOf(`${PARTIAL}; the twist is judged under characteristic loads.`, { ultimate: '1.0', partial: true })
const design = factorsOf(`${PARTIAL}; the cases are entered at design level, with 1.5 on them, and are judged against yield.`, { ultimate: '1.0', partial: true })

/** Characteristic couples, and the same with the partial factor on them. */
const COUPLES: LoadTable = {
  ...ROLLERS,
  columns: [...ROLLERS.columns, ...ROLLERS.columns.map(({ key, title }) => column(`${key}d`, `${title}, design`, 'torque', 'N·m'))],
  rows: ROLLERS.rows.map(([id, title, temperature, ...cells]) => [id, title, temperature, ...cells, ...cells.map(cell => String(1.5 * Number(cell)))]),
}

const support = (z: string, warping: 'held' | 'free'): RestrainedWarpingInputs['supports'][number] =>
  ({ z: typed(z, 'mm'), twist: 'held', twistStiffness: null, warping, warpingStiffness: null })

interface Run { warping: 'held' | 'free', level: 'characteristic' | 'design', twist: boolean, only?: string }

/** The rail with its ends held or free to warp; `only` leaves one case of the table. */
const rail = ({ warping, level, twist, only }: Run): RestrainedWarpingInputs => ({
  units: 'SI', ...polyline({ corners: MID_LINE, names: ['lower flange', 'web', 'upper flange'], t: ['6.0', '5.0', '6.0'], material: 'QM-106', unit: 'mm' }),
  junctions: [], materials: [fromRecord(QM_106)], length: typed('1800', 'mm'), supports: [support('0', warping), support('1800', warping)],
  cases: headsOf(ROLLERS).filter(({ id }) => only === undefined || id === only).map(head => ({
    ...head, torques: STATIONS.map(([key, z]) => ({ z: typed(z, 'mm'), T: ofCase('ROLLERS', level === 'design' ? `${key}d` : key, head.id, 'N·m') })), distributed: [], eccentric: [], axial: null,
  })),
  twistAllowed: twist ? typed('2.4', '°') : null, twistOrigin: twist ? 'QL8-SC-001 issue 1, paragraph 7: rotation of a roller' : '',
  factors: level === 'design' ? design : characteristic, declarations: { ...declared(), builtIn: warping === 'held', heldAlong: false },
})

export const builtIn = rail({ warping: 'held', level: 'characteristic', twist: true })
export const strength = rail({ warping: 'held', level: 'design', twist: false })
export const forked = rail({ warping: 'free', level: 'characteristic', twist: false, only: 'R06' })

export const outline: GeneralOutlineInputs = {
  units: 'SI', outer: thickened({ corners: MID_LINE, t: [6, 5, 6], inside: '6.0', outside: '11.0' }), holes: [], ends: 'free',
  first: { by: 'given', method: 'open, mid-line only', J: linked('built-in', 'J', 'mm⁴'), W: null, Gamma: linked('built-in', 'Gamma', 'mm⁶'), chi: '', source: 'thin walls to the intersection of the mid-lines' },
  ...bar(QM_106, { by: 'torque', torque: typed('1', 'N·m'), level: 'limit', temperature: null, source: 'unit torque: only the section is compared' }, characteristic),
  declarations: { ...declared(), builtIn: false },
}

export const rollers = loadRecord(COUPLES)
