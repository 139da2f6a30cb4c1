/**
 * Tables of load cases of the invented loads documents, as a note holds them. All
 * cases at limit level. Values are typed text: what is stored is what was typed.
 */
import type { LoadCasesInputs } from '#shared/calc/kinds/load-cases/schema'
import type { UnitId } from '#shared/units/units'
import { linked } from './inputs'

type Column = LoadCasesInputs['columns'][number]
/** Id, title, temperature, then one value per column. */
type Row = [id: string, title: string, temperature: string, ...values: string[]]

export interface LoadTable { document: string, temperatureUnit: '°C' | '°F', source: (index: number) => string, columns: Column[], rows: Row[] }

export const column = (key: string, title: string, dimension: Column['dimension'], unit: UnitId): Column => ({ key, title, dimension, unit })

/** The record of a note. */
export const loadRecord = ({ document, temperatureUnit, source, columns, rows }: LoadTable): LoadCasesInputs => ({
  document, temperatureUnit, columns,
  rows: rows.map(([id, title, temperature, ...cells], index) => ({ id, title, source: source(index + 1), level: 'limit', temperature, cells })),
})

/** What every case of a calculation says of itself, taken from a table. */
export const headsOf = ({ temperatureUnit, source, rows }: LoadTable) => rows.map(([id, title, temperature], index) => ({
  id, title, source: source(index + 1), level: 'limit' as const, temperature: { text: temperature, unit: temperatureUnit },
}))

/** A value of one case of the record called `name`. */
export const ofCase = <Unit extends UnitId>(name: string, key: string, id: string, unit: Unit) => linked(name, `${key}@${id}`, unit)

/** The typed value of one case. */
export function cellOf({ columns, rows }: LoadTable, id: string, key: string): string {
  const cell = rows.find(([row]) => row === id)?.[3 + columns.findIndex(one => one.key === key)]
  if (cell === undefined) throw new Error(`The table has no ${key} for ${id}`)
  return cell
}

/** QW19-LDS-020 issue 3, group TUBE: torque of the drive. */
export const TUBE: LoadTable = {
  document: 'QW19-LDS-020 issue 3, group TUBE', temperatureUnit: '°C', source: index => `QW19-DYN-104 issue 3, sheet ${40 + index}`,
  columns: [column('T', 'Torque of the drive', 'torque', 'N·m')],
  rows: [
    ['T01', 'Take-off flap 15, symmetric gust up', '23', '318'],
    ['T02', 'Take-off flap 15, symmetric gust down', '23', '-204'],
    ['T03', 'Take-off flap 15, cold soak', '-40', '331'],
    ['T04', 'Approach flap 25, steady', '23', '436'],
    ['T05', 'Approach flap 25, gust up', '23', '548'],
    ['T06', 'Approach flap 25, gust up, hot day', '71', '541'],
    ['T07', 'Landing flap 40, steady at placard speed', '23', '602'],
    ['T08', 'Landing flap 40, gust up', '23', '692'],
    ['T09', 'Landing flap 40, gust up, hot soak', '85', '684'],
    ['T10', 'Landing flap 40, gust up, cold soak', '-40', '688'],
    ['T11', 'Landing flap 40, gust down', '23', '-163'],
    ['T12', 'Landing flap 40, sideslip 12°', '23', '571'],
    ['T13', 'Retraction at placard speed', '23', '497'],
    ['T14', 'Outboard rib jammed, drive at cut-out torque', '23', '655'],
    ['T15', 'Ground gust from astern, locked', '23', '-412'],
    ['T16', 'Ground gust from astern, hot soak', '85', '-405'],
  ],
}

/** QW19-LDS-020 issue 3, group BOX: torque about the shear centre and vertical shear through it. */
export const BOX: LoadTable = {
  document: 'QW19-LDS-020 issue 3, group BOX', temperatureUnit: '°C', source: index => `QW19-LDS-118 issue 2, table 7 line ${index}`,
  columns: [column('T', 'Torque about the shear centre', 'torque', 'N·m'), column('V', 'Vertical shear', 'force', 'N')],
  rows: [
    ['B01', 'Cruise, steady', '23', '2150', '3900'],
    ['B02', 'Cruise, gust up', '23', '4980', '8100'],
    ['B03', 'Cruise, gust down', '23', '-3120', '-4300'],
    ['B04', 'Cruise, gust up, cold', '-55', '5040', '8150'],
    ['B05', 'Flap 15, steady', '23', '4260', '5600'],
    ['B06', 'Flap 15, gust up', '23', '6740', '9200'],
    ['B07', 'Flap 15, gust down', '23', '-2480', '-2900'],
    ['B08', 'Flap 15, hot day', '71', '6610', '9050'],
    ['B09', 'Flap 25, steady', '23', '6180', '7100'],
    ['B10', 'Flap 25, gust up', '23', '8350', '10400'],
    ['B11', 'Flap 25, gust up, hot day', '71', '8240', '10300'],
    ['B12', 'Flap 25, sideslip 12°', '23', '7480', '9700'],
    ['B13', 'Flap 40, steady at placard speed', '23', '8120', '8300'],
    ['B14', 'Flap 40, gust up', '23', '9860', '11800'],
    ['B15', 'Flap 40, gust up, hot day', '71', '9720', '11650'],
    ['B16', 'Flap 40, gust up, cold', '-40', '9910', '11850'],
    ['B17', 'Flap 40, gust down', '23', '1240', '-1900'],
    ['B18', 'Flap 40, sideslip 12°', '23', '8790', '12600'],
    ['B19', 'Flap 40, go-around', '23', '9340', '12900'],
    ['B20', 'Flap 40, asymmetric drive', '23', '10250', '9400'],
    ['B21', 'Flap 40, carriage jammed', '23', '10480', '7600'],
    ['B22', 'Landing 2.0 g, flap 40', '23', '5230', '14200'],
    ['B23', 'Landing, one wheel, flap 40', '23', '4870', '13100'],
    ['B24', 'Braked roll', '23', '640', '6200'],
    ['B25', 'Ground gust from astern', '23', '-6820', '-5400'],
    ['B26', 'Ground gust from astern, hot', '71', '-6700', '-5300'],
    ['B27', 'Taxi bump, flap 40', '23', '2310', '9900'],
    ['B28', 'Jacking', '23', '0', '4400'],
  ],
}

/** QW19-LDS-020 issue 3, group SKIN: imposed rate of twist, its change along the span, and the axial force of flap bending. */
export const SKIN: LoadTable = {
  document: 'QW19-LDS-020 issue 3, group SKIN', temperatureUnit: '°C', source: index => `QW19-FEM-061 issue 4, station table 12 line ${index}`,
  columns: [column('rate', 'Rate of twist', 'rateOfTwist', '°/m'), column('gradient', 'Change of the rate of twist', 'rateGradient', '°/m²'), column('axial', 'Axial force', 'force', 'N')],
  rows: [
    ['S01', 'Cruise, gust up', '23', '0.64', '0.41', '9800'],
    ['S02', 'Flap 15, gust up', '23', '1.12', '0.8', '12400'],
    ['S03', 'Flap 25, steady', '23', '1.38', '0.97', '13100'],
    ['S04', 'Flap 25, gust up', '23', '1.74', '1.22', '16900'],
    ['S05', 'Flap 40, steady', '23', '1.91', '1.36', '17600'],
    ['S06', 'Flap 40, gust up', '23', '2.48', '1.78', '21900'],
    ['S07', 'Flap 40, gust up, hot day', '71', '2.45', '1.76', '21500'],
    ['S08', 'Flap 40, gust up, cold', '-40', '2.5', '1.79', '22100'],
    ['S09', 'Flap 40, sideslip', '23', '2.31', '1.95', '20400'],
    ['S10', 'Flap 40, outboard carriage jammed', '23', '2.93', '2.24', '18300'],
    ['S11', 'Ground gust from astern', '23', '-1.27', '-0.9', '0'],
    ['S12', 'Retraction at placard speed', '23', '1.55', '1.08', '14800'],
  ],
}

/** QW19-LDS-041 issue 1, group BRACKET: force at the actuator pad. */
export const BRACKET: LoadTable = {
  document: 'QW19-LDS-041 issue 1, group BRACKET', temperatureUnit: '°F', source: index => `QW19-LDS-041 issue 1, table 3 line ${index}`,
  columns: [column('Vx', 'Force along x', 'force', 'lbf'), column('Vy', 'Force along y', 'force', 'lbf')],
  rows: [
    ['K01', 'Door closing, power assist', '73', '46', '-338'],
    ['K02', 'Door closing, manual, two crew', '73', '30', '-264'],
    ['K03', 'Door held open, gust 65 kt from ahead', '73', '118', '-612'],
    ['K04', 'Door held open, gust 65 kt from astern', '73', '-141', '387'],
    ['K05', 'Door held open, gust 65 kt, hot ramp', '160', '116', '-604'],
    ['K06', 'Door held open, gust 65 kt, cold ramp', '-40', '117', '-606'],
    ['K07', 'Actuator stall at end stop', '73', '0', '-628'],
    ['K08', 'Actuator stall at end stop, hot ramp', '160', '0', '-600'],
    ['K09', 'Step load by handler', '73', '0', '-300'],
  ],
}

/** QW19-LDS-041 issue 1, group SILL: seal drag per carrier. */
export const SILL: LoadTable = {
  document: 'QW19-LDS-041 issue 1, group SILL', temperatureUnit: '°F', source: index => `QW19-LDS-041 issue 1, table 5 line ${index}`,
  columns: [column('T', 'Torque per carrier', 'torque', 'lbf·in')],
  rows: [
    ['L01', 'Door closing, seal drag', '73', '9.6'],
    ['L02', 'Door closing, seal drag, cold', '-40', '14.3'],
    ['L03', 'Door closed, cabin pressure', '73', '7.7'],
    ['L04', 'Seal iced, door opened by power', '14', '15.9'],
    ['L05', 'Handler kneeling on the sill lip', '73', '12.6'],
    ['L06', 'Hot ramp, seal swollen', '160', '11.7'],
  ],
}

/** QL8-LDS-012 issue 1, group RAIL: couples of the three roller pairs. */
export const ROLLERS: LoadTable = {
  document: 'QL8-LDS-012 issue 1, group RAIL', temperatureUnit: '°C', source: index => `QL8-LDS-012 issue 1, table 2 line ${index}`,
  columns: [column('P1', 'Torque at P1', 'torque', 'N·m'), column('P2', 'Torque at P2', 'torque', 'N·m'), column('P3', 'Torque at P3', 'torque', 'N·m')],
  rows: [
    ['R01', 'Platform level, pallet centred', '20', '172', '194', '172'],
    ['R02', 'Platform level, pallet 0.4 m off centre', '20', '243', '261', '167'],
    ['R03', 'Raise with 1° tilt', '20', '264', '282', '194'],
    ['R04', 'Raise with 1° tilt, pallet off centre', '20', '318', '336', '207'],
    ['R05', 'Emergency stop while lowering', '20', '330', '292', '254'],
    ['R06', 'Emergency stop, pallet off centre', '20', '366', '312', '267'],
    ['R07', 'Wind 18 m/s at full height', '20', '-154', '-175', '-154'],
    ['R08', 'Wind 18 m/s, pallet off centre, cold', '-20', '-189', '-215', '-144'],
  ],
}

/** QL8-LDS-012 issue 1, group LATCH: torque of the whole shaft, both levers together. */
export const LATCH: LoadTable = {
  document: 'QL8-LDS-012 issue 1, group LATCH', temperatureUnit: '°C', source: index => `QL8-LDS-012 issue 1, table 4 line ${index}`,
  columns: [column('T', 'Torque of the whole shaft', 'torque', 'N·m')],
  rows: [
    ['L01', 'Latch against pallet stop, 0.3 m/s', '20', '148'],
    ['L02', 'Latch against pallet stop, 0.5 m/s', '20', '179.8'],
    ['L03', 'Latch by handle, operator', '20', '96'],
    ['L04', 'Latch frozen, handle with 0.6 m bar', '-20', '171'],
  ],
}
