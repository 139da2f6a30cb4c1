/**
 * Inputs of open sections for tests: a strip, the hat and the lipped channel of the demonstration,
 * a machined angle, a channel and a bracket in US customary units. Each call makes a fresh object.
 */
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { WallInput } from '#shared/calc/parts/wall-fields'
import type { UnitId } from '#shared/units/units'

type Material = OpenSectionInputs['materials'][number]
type Corner = readonly [x: string, y: string]

export const quantity = (text: string, unit: UnitId) => ({ text, unit })
const mm = (text: string) => quantity(text, 'mm')

/** Record QM-101 issue 2 of the demonstration's material table. */
export function sheet2024(): Material {
  return {
    id: 'QM-101', name: 'Aluminium alloy 2024-T3', specification: 'QMS-A-2024S', form: 'bare sheet', thicknessRange: '0.8-3.2 mm', family: 'aluminium',
    basis: 'B', loadPath: 'redundant', source: 'QM-MD-101 table 1', edition: 'issue 2',
    E: quantity('72.4', 'GPa'), G: quantity('27.6', 'GPa'), nu: quantity('0.33', ''),
    Ftu: quantity('441', 'MPa'), Fty: quantity('324', 'MPa'), Fsu: quantity('269', 'MPa'), Fsy: null,
    temperatureFrom: null, temperatureTo: null,
    knockdown: [['-55', '1.00'], ['23', '1.00'], ['71', '0.97'], ['100', '0.93']].map(([T = '', factor = '']) => ({ temperature: quantity(T, '°C'), factor })),
    knockdownSource: 'QM-MD-101 table 3',
  }
}

/** Record QM-107 issue 1 of the demonstration's material table. */
export function sheet6061(): Material {
  return {
    ...sheet2024(), id: 'QM-107', name: 'Aluminium alloy 6061-T6', specification: 'QMS-A-6061S', form: 'sheet', thicknessRange: '0.6-6.3 mm',
    basis: 'A', loadPath: 'single', source: 'QM-MD-107 table 1', edition: 'issue 1',
    E: quantity('68.3', 'GPa'), G: quantity('26.2', 'GPa'), Ftu: quantity('290', 'MPa'), Fty: quantity('241', 'MPa'), Fsu: quantity('186', 'MPa'),
    knockdown: [['-55', '1.00'], ['23', '1.00'], ['71', '0.96'], ['100', '0.92']].map(([T = '', factor = '']) => ({ temperature: quantity(T, '°C'), factor })),
    knockdownSource: 'QM-MD-107 table 2',
  }
}

/** Walls a, b, c… along corner points; the nodes are 1, 2, 3… */
export function polyline(corners: readonly Corner[], names: readonly string[], t: string | readonly string[], material: string, unit: 'mm' | 'in' = 'mm'): Pick<OpenSectionInputs, 'start' | 'walls'> {
  const [first = ['0', '0'] as const, ...rest] = corners
  return {
    start: { x: quantity(first[0], unit), y: quantity(first[1], unit) },
    walls: rest.map(([x, y], i): WallInput => ({
      id: String.fromCharCode(97 + i), name: names[i] ?? '', from: String(i + 1), to: String(i + 2),
      end: { by: 'point', x: quantity(x, unit), y: quantity(y, unit) },
      t: quantity(typeof t === 'string' ? t : t[i] ?? '', unit), material,
    })),
  }
}

const plain = (): Pick<OpenSectionInputs, 'junctions' | 'length' | 'twistAllowed' | 'twistOrigin' | 'factors' | 'ends' | 'declarations'> => ({
  junctions: [], length: null, twistAllowed: null, twistOrigin: '',
  factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: '' },
  ends: 'free',
  declarations: { fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false },
})

const bends = (nodes: readonly string[], radius: string, unit: 'mm' | 'in' = 'mm'): OpenSectionInputs['junctions'] =>
  nodes.map(node => ({ node, radius: quantity(radius, unit), make: 'bent' }))

/** One flat wall, 60 × 2 mm, under 4 N·m over 300 mm; no guard fires. */
export function stripInputs(): OpenSectionInputs {
  return {
    units: 'SI', ...polyline([['0', '0'], ['60', '0']], ['strip'], '2', 'QM-107'), materials: [sheet6061()], ...plain(),
    loading: { by: 'torque', torque: quantity('1', 'N·m'), level: 'limit', temperature: quantity('23', '°C'), source: 'test load' },
    length: mm('300'), twistAllowed: quantity('5', '°'), twistOrigin: 'drawing note',
  }
}

/** The same, 8 mm thick: with b/t = 7.5 its slenderness needs an answer (G-02 of the methods reference asks below ten). */
export function thickStripInputs(): OpenSectionInputs {
  const inputs = stripInputs()
  return { ...inputs, walls: inputs.walls.map(wall => ({ ...wall, t: mm('8') })) }
}

/** The hat stiffener of the demonstration with its twelve imposed rates of twist. */
export function hatInputs(): OpenSectionInputs {
  const rates: [string, string, string][] = [
    ['S01', '0.64', '23'], ['S02', '1.12', '23'], ['S03', '1.38', '23'], ['S04', '1.74', '23'], ['S05', '1.91', '23'], ['S06', '2.48', '23'],
    ['S07', '2.45', '71'], ['S08', '2.5', '-40'], ['S09', '2.31', '23'], ['S10', '2.93', '23'], ['S11', '-1.27', '23'], ['S12', '1.55', '23'],
  ]
  return {
    units: 'SI',
    ...polyline([['-35', '0'], ['-20', '0'], ['-14', '30'], ['14', '30'], ['20', '0'], ['35', '0']], ['left brim', 'left web', 'crown', 'right web', 'right brim'], '1.6', 'QM-101'),
    materials: [sheet2024()], ...plain(), junctions: bends(['2', '3', '4', '5'], '3.2'),
    loading: {
      by: 'rate',
      cases: rates.map(([id, rate, T], i) => ({ id, title: `Case ${id}`, source: `QW19-FEM-061 issue 4, station table 12 line ${i + 1}`, level: 'limit', rate: quantity(rate, '°/m'), temperature: quantity(T, '°C') })),
    },
  }
}

/** The lipped channel of the demonstration with its six torques in lbf·in; its twist margin is negative. */
export function lippedChannelInputs(t = '2.5'): OpenSectionInputs {
  const torques: [string, string, string][] = [['L01', '9.6', '73'], ['L02', '14.3', '-40'], ['L03', '7.7', '73'], ['L04', '15.9', '14'], ['L05', '12.6', '73'], ['L06', '11.7', '160']]
  return {
    units: 'SI',
    ...polyline([['40', '24'], ['40', '40'], ['0', '40'], ['0', '-40'], ['40', '-40'], ['40', '-24']], ['upper lip', 'upper flange', 'web', 'lower flange', 'lower lip'], t, 'QM-107'),
    materials: [sheet6061()], ...plain(), junctions: bends(['2', '3', '4', '5'], '5.0'),
    loading: {
      by: 'cases',
      cases: torques.map(([id, torque, T], i) => ({ id, title: `Case ${id}`, source: `QW19-LDS-041 issue 1, table 5 line ${i + 1}`, level: 'limit', torque: quantity(torque, 'lbf·in'), temperature: quantity(T, '°F') })),
    },
    length: mm('410'), twistAllowed: quantity('1.50', '°'), twistOrigin: 'QW19-SYS-044 issue 2, paragraph 5',
    declarations: { ...plain().declarations, builtIn: true },
  }
}

/** A machined angle, 40 × 40 × 4 mm outside with a 4 mm fillet. */
export function angleInputs(): OpenSectionInputs {
  return {
    units: 'SI', ...polyline([['38', '0'], ['0', '0'], ['0', '38']], ['lower leg', 'upper leg'], '4', 'QM-107'),
    materials: [sheet6061()], ...plain(), junctions: [{ node: '2', radius: mm('4'), make: 'machined' }],
    loading: { by: 'torque', torque: quantity('20', 'N·m'), level: 'limit', temperature: quantity('23', '°C'), source: 'test load' },
    length: mm('200'), twistAllowed: quantity('5', '°'), twistOrigin: 'drawing note',
  }
}

/** A channel with thicker flanges, 100 × 40 mm on the mid-line, flanges 4 mm, web 3 mm, fillets that no table covers. */
export function channelInputs(): OpenSectionInputs {
  return {
    units: 'SI', ...polyline([['40', '100'], ['0', '100'], ['0', '0'], ['40', '0']], ['upper flange', 'web', 'lower flange'], ['4', '3', '4'], 'QM-107'),
    materials: [sheet6061()], ...plain(), junctions: ['2', '3'].map(node => ({ node, radius: mm('4'), make: 'machined' as const })),
    loading: { by: 'torque', torque: quantity('10', 'N·m'), level: 'limit', temperature: null, source: 'test load' },
    length: mm('1200'),
  }
}

/** A machined angle bracket typed in inches, ksi and lbf·in, outside legs 2.00 × 1.55, 0.250 thick, fillet 0.190. */
export function bracketInputs(): OpenSectionInputs {
  const psi: Material = {
    ...sheet6061(), id: 'QM-103', name: 'Aluminium alloy 7050-T7451', form: 'plate', specification: 'QMS-A-7050P', source: 'QM-MD-103 table 1', thicknessRange: '25-50 mm',
    E: quantity('10.3', 'Msi'), G: quantity('3.90', 'Msi'), Ftu: quantity('74', 'ksi'), Fty: quantity('64', 'ksi'), Fsu: quantity('43', 'ksi'),
    knockdown: [['-55', '1.00'], ['23', '1.00'], ['71', '0.96'], ['100', '0.91']].map(([T = '', factor = '']) => ({ temperature: quantity(T, '°C'), factor })),
  }
  return {
    units: 'US', ...polyline([['1.875', '0'], ['0', '0'], ['0', '1.425']], ['base leg', 'upright leg'], '0.250', 'QM-103', 'in'),
    materials: [psi], ...plain(), junctions: [{ node: '2', radius: quantity('0.190', 'in'), make: 'machined' }],
    loading: { by: 'torque', torque: quantity('600', 'lbf·in'), level: 'limit', temperature: quantity('160', '°F'), source: 'test load' },
    length: quantity('2.40', 'in'), factors: { ...plain().factors, fitting: '1.15' },
    declarations: { ...plain().declarations, fitting: true },
  }
}

/** Material record of 2024 sheet without data that a test may want to add. */
export type { Material as MaterialRecord }
