/**
 * Load cases of the invented loads documents, as their tables give them. All at
 * limit level. Values are typed text: what is stored is what was typed.
 */

export interface DemoCase { id: string, title: string, source: string, value: string, temperature: string }

const cases = (source: string, rows: [id: string, title: string, value: string, temperature: string][]): DemoCase[] =>
  rows.map(([id, title, value, temperature], index) => ({ id, title, value, temperature, source: `${source} line ${index + 1}` }))

/** QW19-LDS-020 issue 3, group SKIN: rate of twist in °/m, temperature in °C. */
export const SKIN_CASES = cases('QW19-LDS-020 issue 3, station table 12', [
  ['S01', 'Cruise, gust up', '0.64', '23'],
  ['S02', 'Flap 15, gust up', '1.12', '23'],
  ['S03', 'Flap 25, steady', '1.38', '23'],
  ['S04', 'Flap 25, gust up', '1.74', '23'],
  ['S05', 'Flap 40, steady', '1.91', '23'],
  ['S06', 'Flap 40, gust up', '2.48', '23'],
  ['S07', 'Flap 40, gust up, hot day', '2.45', '71'],
  ['S08', 'Flap 40, gust up, cold', '2.50', '-40'],
  ['S09', 'Flap 40, sideslip', '2.31', '23'],
  ['S10', 'Flap 40, outboard carriage jammed', '2.93', '23'],
  ['S11', 'Ground gust from astern', '-1.27', '23'],
  ['S12', 'Retraction at placard speed', '1.55', '23'],
])

/** QW19-SYS-031: torque of the position sensor's link, N·m, °C. Issue 3 belongs to the larger sensor. */
export const SENSOR_CASES = {
  A: cases('QW19-SYS-031 issue 2, table 4', [
    ['W01', 'Link moving, new bearings', '0.041', '23'],
    ['W02', 'Link stiff, hot soak', '0.088', '71'],
    ['W03', 'Link iced, flap driven', '0.113', '-40'],
    ['W04', 'Link iced, flap driven back', '-0.102', '-40'],
  ]),
  B: cases('QW19-SYS-031 issue 3, table 4', [
    ['W01', 'Link moving, new bearings', '0.068', '23'],
    ['W02', 'Link stiff, hot soak', '0.156', '71'],
    ['W03', 'Link iced, flap driven', '0.202', '-40'],
    ['W04', 'Link iced, flap driven back', '-0.187', '-40'],
  ]),
}

/** QW19-LDS-041 issue 1, table 3: torque left to the angle, lbf·in, °F. */
export const BRACKET_CASES = cases('QW19-LDS-041 issue 1, table 3', [
  ['K01', 'Door closing, power assist', '-618', '73'],
  ['K02', 'Door closing, manual, two crew', '-483', '73'],
  ['K03', 'Door held open, gust 65 kt from ahead', '-1119', '73'],
  ['K04', 'Door held open, gust 65 kt from astern', '708', '73'],
  ['K05', 'Door held open, gust 65 kt, hot ramp', '-1104', '160'],
  ['K06', 'Door held open, gust 65 kt, cold ramp', '-1108', '-40'],
  ['K07', 'Actuator stall at end stop', '-1148', '73'],
  ['K08', 'Actuator stall at end stop, hot ramp', '-1097', '160'],
  ['K09', 'Step load by handler', '-549', '73'],
])

/** QW19-LDS-041 issue 1, table 5: seal drag per carrier, lbf·in, °F. */
export const SILL_CASES = cases('QW19-LDS-041 issue 1, table 5', [
  ['L01', 'Door closing, seal drag', '9.6', '73'],
  ['L02', 'Door closing, seal drag, cold', '14.3', '-40'],
  ['L03', 'Door closed, cabin pressure', '7.7', '73'],
  ['L04', 'Seal iced, door opened by power', '15.9', '14'],
  ['L05', 'Handler kneeling on the sill lip', '12.6', '73'],
  ['L06', 'Hot ramp, seal swollen', '11.7', '160'],
])

/** QL8-LDS-012 issue 1, table 2: torque carried to the nearer cleat, N·m, °C. */
export const RAIL_CASES = cases('QL8-LDS-012 issue 1, table 2', [
  ['R01', 'Platform level, pallet centred', '28.0', '20'],
  ['R02', 'Platform level, pallet 0.4 m off centre', '35.0', '20'],
  ['R03', 'Raise with 1° tilt', '38.5', '20'],
  ['R04', 'Raise with 1° tilt, pallet off centre', '44.8', '20'],
  ['R05', 'Emergency stop while lowering', '45.6', '20'],
  ['R06', 'Emergency stop, pallet off centre', '49.2', '20'],
  ['R07', 'Wind 18 m/s at full height', '-25.1', '20'],
  ['R08', 'Wind 18 m/s, pallet off centre, cold', '-28.5', '-20'],
])

/** QL8-LDS-012 issue 1, table 4: torque of the pair of latch guides, N·m, °C. */
export const LATCH_CASES = cases('QL8-LDS-012 issue 1, table 4', [
  ['G01', 'Latch against pallet stop, 0.3 m/s', '148', '20'],
  ['G02', 'Latch against pallet stop, 0.5 m/s', '180', '20'],
  ['G03', 'Latch by handle, operator', '96', '20'],
  ['G04', 'Latch frozen, handle with 0.6 m bar', '171', '-20'],
])
