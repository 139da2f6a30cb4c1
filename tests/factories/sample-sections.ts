/** Inputs of open sections for tests that need a whole, credible calculation. All values are invented. */
import type { LoadingInput } from '#shared/calc/parts/loading-fields'
import type { MaterialInput } from '#shared/calc/parts/material-fields'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { UnitId } from '#shared/units/units'

const typed = (text: string, unit: UnitId) => ({ text, unit })

export const SHEET: MaterialInput = {
  id: 'AL-1', name: 'Aluminium alloy 2024-T3', specification: 'QMS-A-2024S', form: 'bare sheet', thicknessRange: '0.8 to 3.2 mm', family: 'aluminium',
  basis: 'B', loadPath: 'redundant', source: 'Invented material sheet 101, table 1', edition: 'issue 2',
  E: typed('72.4', 'GPa'), G: typed('27.6', 'GPa'), nu: typed('0.33', ''), Ftu: typed('441', 'MPa'), Fty: typed('324', 'MPa'), Fsu: typed('269', 'MPa'), Fsy: null,
  temperatureFrom: typed('-55', '°C'), temperatureTo: typed('100', '°C'),
  knockdown: [{ temperature: typed('-55', '°C'), factor: '1.00' }, { temperature: typed('100', '°C'), factor: '0.93' }], knockdownSource: 'Invented material sheet 101, table 3',
}

export const FOUR_CASES: LoadingInput = {
  by: 'cases',
  cases: [
    ['L01', 'Cable tension, cruise', '2.12'], ['L02', 'Cable jam at rib 8', '3.76'], ['L03', 'Cable jam, reversed', '-3.13'], ['L04', 'Rigging', '1.88'],
  ].map(([id = '', title = '', torque = '']) => ({ id, title, source: `Loads report 27, table 4, ${id}`, level: 'limit', torque: typed(torque, 'N·m'), temperature: typed('23', '°C') })),
}

type Corner = [x: string, y: string, name: string]

/** Walls along a line of corners; the first corner has no wall of its own. */
export function sectionAlong(corners: Corner[], t: string[], loading: LoadingInput, more: Partial<OpenSectionInputs> = {}): OpenSectionInputs {
  const [first = ['0', '0', ''], ...rest] = corners
  return {
    units: 'SI', start: { x: typed(first[0], 'mm'), y: typed(first[1], 'mm') },
    walls: rest.map(([x, y, name], i) => ({
      id: String.fromCharCode(97 + i), name, from: String(i + 1), to: String(i + 2),
      end: { by: 'point', x: typed(x, 'mm'), y: typed(y, 'mm') }, t: typed(t[i] ?? '1.6', 'mm'), material: SHEET.id,
    })),
    junctions: rest.slice(1).map((_, i) => ({ node: String(i + 2), radius: typed('3', 'mm'), make: 'bent' })),
    materials: [SHEET], loading, length: typed('180', 'mm'), twistAllowed: typed('4', '°'), twistOrigin: 'Rigging report 12, paragraph 3.4',
    factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: 'CS-25, paragraph 303' },
    ends: 'free', declarations: { fitting: false, repeated: true, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false },
    ...more,
  }
}

const HAT: Corner[] = [['-32', '0', ''], ['-12', '0', 'left foot'], ['-12', '28', 'left web'], ['12', '28', 'crown'], ['12', '0', 'right web'], ['32', '0', 'right foot']]

export const hatSection = (t = '2.5'): OpenSectionInputs => sectionAlong(HAT, Array<string>(5).fill(t), FOUR_CASES)
/** The same hat at one torque it does not carry. */
export const weakHat = (): OpenSectionInputs => sectionAlong(HAT, ['1.0', '1.0', '1.0', '1.0', '1.0'], { by: 'torque', torque: typed('9', 'N·m'), level: 'limit', temperature: typed('23', '°C'), source: 'Loads report 27, table 5' })
export const angleSection = (): OpenSectionInputs => sectionAlong([['0', '24', ''], ['0', '0', 'upright leg'], ['30', '0', 'lying leg']], ['2.5', '2.5'], FOUR_CASES, { length: typed('60', 'mm') })
