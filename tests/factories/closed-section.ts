/** Closed sections as they are stored: invented parts, and the worked boxes of the methods reference. */
import type { ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'
import { blankBar } from '#shared/calc/parts/bar-fields'
import type { WallInput } from '#shared/calc/parts/wall-fields'
import type { UnitId } from '#shared/units/units'
import { quantity } from './open-section'
import { materialInputs } from './records'

type Corner = readonly [node: string, x: string, y: string]
const mm = (text: string) => quantity(text, 'mm')

/** A wall from node to node at given places. */
export const straight = (id: string, from: string, to: Corner, t: string, unit: UnitId = 'mm', name = ''): WallInput =>
  ({ id, name, from, to: to[0], end: { by: 'point', x: quantity(to[1], unit), y: quantity(to[2], unit) }, t: quantity(t, unit), material: 'QM-31' })

const arc = (id: string, from: string, to: string, radius: string, direction: string, t: string, unit: UnitId): WallInput =>
  ({ id, name: '', from, to, end: { by: 'arc', radius: quantity(radius, unit), sweep: quantity('180', '°'), direction: quantity(direction, '°') }, t: quantity(t, unit), material: 'QM-31' })

const bent = (nodes: readonly string[], radius: string): ClosedSectionInputs['junctions'] => nodes.map(node => ({ node, radius: mm(radius), make: 'bent' }))

/** §2.1: mid-line 120 × 60, long walls 2, short walls 3 mm, 1000 N·m. */
export function boxInputs(): ClosedSectionInputs {
  const material = materialInputs()
  return {
    units: 'SI', start: { x: mm('0'), y: mm('0') },
    walls: [straight('a', '1', ['2', '120', '0'], '2', 'mm', 'lower cover'), straight('b', '2', ['3', '120', '60'], '3'), straight('c', '3', ['4', '0', '60'], '2', 'mm', 'upper cover'), straight('d', '4', ['1', '0', '0'], '3')],
    junctions: bent(['1', '2', '3', '4'], '4'), joints: [], diaphragmSpacing: mm('120'), diaphragmAtLoad: mm('0'), root: 'free', ...blankBar('SI', material),
    loading: { by: 'torque', torque: quantity('1000', 'N·m'), level: 'limit', temperature: null, source: 'EX-L-40 page 2' },
    length: mm('900'), twistAllowed: quantity('3', '°'), twistOrigin: 'EX-R-1',
  }
}

/** §2.2: cells 100 × 80 and 140 × 80, webs 2, 3, 1.5, covers 2 mm, with the cases of a loads document. */
export function twoCellInputs(): ClosedSectionInputs {
  return {
    ...boxInputs(),
    walls: [
      straight('a', '1', ['2', '100', '0'], '2'), straight('b', '2', ['3', '240', '0'], '2'), straight('c', '3', ['4', '240', '80'], '1.5', 'mm', 'right web'),
      straight('d', '4', ['5', '100', '80'], '2'), straight('e', '5', ['6', '0', '80'], '2'), straight('f', '6', ['1', '0', '0'], '2', 'mm', 'left web'), straight('g', '2', ['5', '100', '80'], '3', 'mm', 'shared web'),
    ],
    junctions: bent(['1', '3', '4', '6'], '5'), joints: [{ wall: 'b', pitch: mm('25') }], diaphragmSpacing: mm('200'), diaphragmAtLoad: mm('10'), root: 'built in',
    materials: [{ ...materialInputs(), temperatureFrom: quantity('-55', '°C'), temperatureTo: quantity('150', '°C'), knockdown: [{ temperature: quantity('20', '°C'), factor: '1' }, { temperature: quantity('150', '°C'), factor: '0.8' }], knockdownSource: 'EX-M-3' }],
    loading: {
      by: 'cases', cases: [
        { id: 'L01', title: 'Gust', source: 'EX-L-41', level: 'limit', temperature: null, torque: quantity('5000', 'N·m') },
        { id: 'L02', title: 'Gust down', source: 'EX-L-41', level: 'limit', temperature: null, torque: quantity('-4200', 'N·m') },
        { id: 'L03', title: 'Hot landing', source: 'EX-L-41', level: 'ultimate', temperature: quantity('100', '°C'), torque: quantity('6100', 'N·m') },
      ],
    },
  }
}

/** A round tube in two half shells, typed in inches: mean radius 1.5, wall 1/16. */
export function inchTubeInputs(): ClosedSectionInputs {
  return {
    ...boxInputs(), units: 'US', start: { x: quantity('1.5', 'in'), y: quantity('0', 'in') },
    walls: [arc('a', '1', '2', '1.5', '90', '1/16', 'in'), arc('b', '2', '1', '1.5', '-90', '1/16', 'in')], junctions: [], joints: [], diaphragmSpacing: null, diaphragmAtLoad: null, root: 'built in',
    loading: { by: 'torque', torque: quantity('12', 'kip·in'), level: 'limit', temperature: null, source: 'EX-L-44' }, length: quantity('20', 'in'), twistAllowed: null, twistOrigin: '',
  }
}

/** The box with a lip below it and an imposed rate of twist. */
export function finnedBoxInputs(): ClosedSectionInputs {
  const box = boxInputs()
  return {
    ...box, walls: [...box.walls, straight('fin', '1', ['5', '0', '-25'], '2', 'mm', 'lip')], root: 'unknown',
    loading: { by: 'rate', cases: [{ id: 'R1', title: 'Wing twist', source: 'EX-L-45', level: 'limit', temperature: null, rate: quantity('2e-5', 'rad/mm') }] },
  }
}

/** Cells in a row: n of 50 × 50 mm, which makes 3n + 1 walls. */
export function cellRowInputs(n: number): ClosedSectionInputs {
  const at = (i: number, y: '0' | '50'): Corner => [`${y === '0' ? 'l' : 'u'}${i}`, String(50 * i), y]
  const walls: WallInput[] = [straight('w0', 'l0', at(0, '50'), '1')]
  for (let i = 0; i < n; i += 1) {
    walls.push(straight(`b${i + 1}`, `l${i}`, at(i + 1, '0'), '1'), straight(`t${i + 1}`, `u${i}`, at(i + 1, '50'), '1'), straight(`w${i + 1}`, `l${i + 1}`, at(i + 1, '50'), '1'))
  }
  return { ...boxInputs(), walls, junctions: [], twistAllowed: null }
}
