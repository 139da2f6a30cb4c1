/** Reference rows of §10: conversions, exact by definition (1 in = 25.4 mm, 1 lb = 0.45359237 kg, g = 9.80665 m/s²). */
import type { ReferenceRow } from './row'
import type { UnitId } from '#shared/units/units'
import { rel, row } from './row'

const exact = 'exact definition'
/** [id, typed unit, engine unit, engine value of one] */
const factors: readonly (readonly [string, UnitId, UnitId, number])[] = [
  ['§10', 'lbf', 'N', 4.4482216152605],
  ['C-102', 'lbf·in', 'N·mm', 112.984829027617],
  ['§10', 'lbf·ft', 'N·mm', 1355.8179483314],
  ['§10', 'kip·in', 'N·mm', 112_984.8290276167],
  ['§10', 'psi', 'MPa', 0.006894757293168361],
  ['C-103', 'ksi', 'MPa', 6.89475729316836],
  ['§10', 'Msi', 'MPa', 6894.757293168361],
  ['§10', 'in²', 'mm²', 645.16],
  ['C-104', 'in⁴', 'mm⁴', 416_231.4256],
  ['§10', 'in⁶', 'mm⁶', 268_535_866.540096],
  ['§10', 'lbf/in', 'N/mm', 0.1751268352464764],
  ['§10', 'lbf·in²', 'N·mm²', 2869.814657301463],
  ['§10', '°', 'rad', Math.PI / 180],
  ['§10', '°/ft', 'rad/mm', 0.05726145839876409e-3],
  ['§10', 'lb/in³', 'kg/m³', 27_679.904710203],
  ['§10', 'cm⁴', 'mm⁴', 1e4],
  ['§10', 'm⁴', 'mm⁴', 1e12],
  ['§10', 'cm⁶', 'mm⁶', 1e6],
  ['§10', 'GPa', 'MPa', 1000],
  ['§10', 'N·m', 'N·mm', 1000],
]

export const unitRows: readonly ReferenceRow[] = [
  ...factors.map(([id, unit, engine, value]) => row(id, `1 ${unit} in ${engine}`, '', value, engine, rel(5e-15), exact, e => e.toEngine(1, unit))),
  row('§10', '212 °F in °C', '', 100, '°C', rel(1e-14), exact, e => e.toEngine(212, '°F')),
  row('§10', 'a rise of 18 °F in °C', '', 10, '°C', rel(1e-14), exact, e => e.intervalToEngine(18, '°F')),
]
