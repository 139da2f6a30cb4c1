/**
 * Records of the invented maker's material data. Values are of handbook level
 * and are marked as demonstration data: none may be used for a real part.
 */
import type { MaterialInput } from '#shared/calc/parts/material-fields'
import type { UnitId } from '#shared/units/units'

type Strength = { text: string, unit: UnitId }
const mpa = (text: string): Strength => ({ text, unit: 'MPa' })
const gpa = (text: string): Strength => ({ text, unit: 'GPa' })
const celsius = (text: string): Strength => ({ text, unit: '°C' })

const knockdown = (...points: [temperature: string, factor: string][]): MaterialInput['knockdown'] =>
  points.map(([temperature, factor]) => ({ temperature: celsius(temperature), factor }))

/** QM-101 issue 2: aluminium alloy 2024-T3, bare sheet. */
export const QM_101: MaterialInput = {
  id: 'QM-101', name: 'Aluminium alloy 2024-T3', specification: 'QMS-A-2024S', form: 'bare sheet', thicknessRange: '0.8 to 3.2 mm', family: 'aluminium',
  basis: 'B', loadPath: 'redundant', source: 'QM-MD-101 table 1, demonstration data', edition: 'issue 2',
  E: gpa('72.4'), G: gpa('27.6'), nu: { text: '0.33', unit: '' }, Ftu: mpa('441'), Fty: mpa('324'), Fsu: mpa('269'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('100'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['71', '0.97'], ['100', '0.93']), knockdownSource: 'QM-MD-101 table 3',
}

/** QM-102 issue 1: aluminium alloy 7075-T6, bare sheet. */
export const QM_102: MaterialInput = {
  id: 'QM-102', name: 'Aluminium alloy 7075-T6', specification: 'QMS-A-7075S', form: 'bare sheet', thicknessRange: '1.0 to 4.0 mm', family: 'aluminium',
  basis: 'B', loadPath: 'redundant', source: 'QM-MD-102 table 1, demonstration data', edition: 'issue 1',
  E: gpa('71.0'), G: gpa('26.9'), nu: { text: '0.33', unit: '' }, Ftu: mpa('538'), Fty: mpa('469'), Fsu: mpa('317'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('100'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['71', '0.95'], ['100', '0.88']), knockdownSource: 'QM-MD-102 table 2',
}

/** QM-103 issue 1: aluminium alloy 7050-T7451, plate. */
export const QM_103: MaterialInput = {
  id: 'QM-103', name: 'Aluminium alloy 7050-T7451', specification: 'QMS-A-7050P', form: 'plate', thicknessRange: '25 to 50 mm', family: 'aluminium',
  basis: 'A', loadPath: 'single', source: 'QM-MD-103 table 1, lowest of L and LT, demonstration data', edition: 'issue 1',
  E: gpa('71.0'), G: gpa('26.9'), nu: { text: '0.33', unit: '' }, Ftu: mpa('510'), Fty: mpa('441'), Fsu: mpa('296'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('100'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['71', '0.96'], ['100', '0.91']), knockdownSource: 'QM-MD-103 table 2',
}

/** QM-104 issue 2: alloy steel 4130 normalised, seamless tube. */
export const QM_104: MaterialInput = {
  id: 'QM-104', name: 'Alloy steel 4130 normalised', specification: 'QMS-S-4130T', form: 'seamless tube', thicknessRange: 'wall 0.9 to 4.8 mm', family: 'other',
  basis: 'A', loadPath: 'single', source: 'QM-MD-104 issue 2 table 1, demonstration data', edition: 'issue 2',
  E: gpa('200'), G: gpa('75.8'), nu: { text: '0.32', unit: '' }, Ftu: mpa('655'), Fty: mpa('517'), Fsu: mpa('393'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('150'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['90', '0.98'], ['150', '0.96']), knockdownSource: 'QM-MD-104 table 2',
}

/** QM-105 issue 1: stainless steel 17-4PH H1025, round bar. */
export const QM_105: MaterialInput = {
  id: 'QM-105', name: 'Stainless steel 17-4PH H1025', specification: 'QMS-S-174B', form: 'round bar', thicknessRange: 'to 75 mm diameter', family: 'other',
  basis: 'A', loadPath: 'single', source: 'QM-MD-105 table 1, demonstration data', edition: 'issue 1',
  E: gpa('197'), G: gpa('77.2'), nu: { text: '0.27', unit: '' }, Ftu: mpa('1069'), Fty: mpa('1000'), Fsu: mpa('655'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('150'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['90', '0.97'], ['150', '0.93']), knockdownSource: 'QM-MD-105 table 2',
}

/** QM-106 issue 2: structural steel S355J2. No shear ultimate is published. */
export const QM_106: MaterialInput = {
  id: 'QM-106', name: 'Structural steel S355J2', specification: 'EN 10025-2', form: 'hot-rolled plate and pressed sections', thicknessRange: 'to 16 mm', family: 'other',
  basis: 'S', loadPath: 'redundant', source: 'QM-MD-106 table 1, demonstration data', edition: 'issue 2',
  E: gpa('210'), G: gpa('80.8'), nu: { text: '0.30', unit: '' }, Ftu: mpa('470'), Fty: mpa('355'), Fsu: null, Fsy: null,
  temperatureFrom: celsius('-30'), temperatureTo: celsius('80'),
  knockdown: knockdown(['-30', '1.00'], ['23', '1.00'], ['80', '1.00']), knockdownSource: 'QM-MD-106 table 1',
}

/** QM-107 issue 1: aluminium alloy 6061-T6, sheet. */
export const QM_107: MaterialInput = {
  id: 'QM-107', name: 'Aluminium alloy 6061-T6', specification: 'QMS-A-6061S', form: 'sheet', thicknessRange: '0.6 to 6.3 mm', family: 'aluminium',
  basis: 'A', loadPath: 'single', source: 'QM-MD-107 table 1, demonstration data', edition: 'issue 1',
  E: gpa('68.3'), G: gpa('26.2'), nu: { text: '0.33', unit: '' }, Ftu: mpa('290'), Fty: mpa('241'), Fsu: mpa('186'), Fsy: null,
  temperatureFrom: celsius('-55'), temperatureTo: celsius('100'),
  knockdown: knockdown(['-55', '1.00'], ['23', '1.00'], ['71', '0.96'], ['100', '0.92']), knockdownSource: 'QM-MD-107 table 2',
}

/** QM-108 issue 1: carbon steel C45 cold drawn, bar. */
export const QM_108: MaterialInput = {
  id: 'QM-108', name: 'Carbon steel C45 cold drawn', specification: 'EN ISO 683-1', form: 'bar', thicknessRange: 'to 80 mm', family: 'other',
  basis: 'S', loadPath: 'redundant', source: 'QM-MD-108 table 1, demonstration data', edition: 'issue 1',
  E: gpa('205'), G: gpa('80.0'), nu: { text: '0.29', unit: '' }, Ftu: mpa('625'), Fty: mpa('530'), Fsu: mpa('375'), Fsy: null,
  temperatureFrom: celsius('-30'), temperatureTo: celsius('80'),
  knockdown: knockdown(['-30', '1.00'], ['23', '1.00'], ['80', '1.00']), knockdownSource: 'QM-MD-108 table 1',
}
