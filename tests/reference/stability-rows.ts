/** Reference rows of wall stability (§2.5, §2.6). */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { PlateEdges } from '#shared/torsion/stability/ritz'
import { given } from './engine'
import { abs, rel, row } from './row'

const ritz = 'separate Ritz solution, 14×14 Legendre terms'
const tn3781 = 'NACA TN 3781 and stability handbooks, from memory'
const edges = (long: PlateEdges['long'], short: PlateEdges['short']): PlateEdges => ({ long, short })
const all = { SSSS: edges('supported', 'supported'), CCCC: edges('clamped', 'clamped'), 'long clamped': edges('clamped', 'supported'), 'short clamped': edges('supported', 'clamped') }
const table: readonly (readonly [number, number, number, number, number])[] = [
  [1, 9.3245, 14.642, 12.565, 12.565], [1.25, 7.7665, 12.347, 11.619, 9.318], [1.5, 7.07, 11.458, 10.782, 7.816], [2, 6.546, 10.248, 10.007, 6.71], [3, 5.8402, 9.534, 9.482, 5.927], [5, 5.5301, 9.185, 9.158, 5.568],
]
const panel = (sides: readonly [number, number], t: number, held: PlateEdges) => ({ length: sides[0], width: sides[1], t, E: 71_000, nu: 0.33, edges: held, radius: null })
const flat = (e: Engine, sides: readonly [number, number], t: number, held: PlateEdges) => given(e.panelBuckling(panel(sides, t, held)))
const tube = { radius: 40, t: 1, length: 300, E: 71_000, nu: 0.33 }

export const stabilityRows: readonly ReferenceRow[] = [
  row('C-61', 'critical shear stress by the published fit', '200×120×1.2 mm, E 71 000 MPa, ν 0.33', 44.43038722362244, 'MPa', rel(1e-10), tn3781, e => (flat(e, [200, 120], 1.2, all.SSSS).fit ?? Number.NaN) * e.plateStress(71_000, 0.33, 1.2, 120)),
  row('C-62', 'k_s of a square, simply supported', 'a/b 1', 9.3245, '', abs(2e-3), ritz, e => e.panelCoefficient(1, all.SSSS)),
  row('C-63', 'k_s of a square, clamped', 'a/b 1', 14.642, '', abs(5e-3), ritz, e => e.panelCoefficient(1, all.CCCC)),
  ...table.flatMap(([ratio, ...values]) => Object.entries(all).map(([name, held], i) =>
    row('§2.5', `k_s, ${name}`, `a/b ${ratio}`, values[i] ?? Number.NaN, '', rel(2e-3), ritz, e => e.panelCoefficient(ratio, held)))),
  row('§2.5', 'k_s of a square, simply supported', 'a/b 1', 9.34, '', rel(3e-3), 'Timoshenko & Gere, plate table, from memory', e => e.panelCoefficient(1, all.SSSS)),
  row('§2.5', 'k_s of a long strip, simply supported', 'a/b 50', 5.34, '', rel(1e-12), 'Southwell, infinite strip, from memory', e => e.panelCoefficient(50, all.SSSS)),
  row('§2.5', 'k_s of a long strip, clamped', 'a/b 50', 8.98, '', rel(1e-12), 'Southwell, infinite strip, from memory', e => e.panelCoefficient(50, all.CCCC)),
  row('§2.5', 'fit, all clamped', 'a/b 2', 8.98 + 5.6 / 4, '', rel(1e-12), tn3781, e => e.fittedCoefficient(2, all.CCCC)),
  row('§2.5', 'fit, long edges clamped', 'a/b 2', 8.98 + 5.61 / 4 - 1.99 / 8, '', rel(1e-12), tn3781, e => e.fittedCoefficient(2, all['long clamped'])),
  row('§2.5', 'fit, short edges clamped', 'a/b 2', 5.34 + 2.31 / 2 - 3.44 / 4 + 8.39 / 8, '', rel(1e-12), tn3781, e => e.fittedCoefficient(2, all['short clamped'])),
  row('§2.5', 'critical shear stress of a square panel', '100×100×1 mm, simply supported', 9.3245 * Math.PI ** 2 * 71_000 / (12 * (1 - 0.33 ** 2)) * 1e-4, 'MPa', rel(3e-4), ritz, e => flat(e, [100, 100], 1, all.SSSS).tau),
  row('C-107', 'torsional buckling of a cylinder', 'R 40, t 1, L 300 mm, E 71 000 MPa, ν 0.33', 129.73612684760548, 'MPa', rel(1e-10), 'NASA SP-8007 (1968), from memory', e => given(e.cylinderBuckling(tube)).tau),
  row('§2.6', 'torsional buckling of a long cylinder', 'R 40, t 1, L 20 000 mm', 0.67 * 71_000 / (3 * Math.SQRT2 * (1 - 0.33 ** 2) ** 0.75) / 40 ** 1.5, 'MPa', rel(1e-12), 'NASA SP-8007 (1968), from memory', e => given(e.cylinderBuckling({ ...tube, length: 20_000 })).tau),
  row('§2.6', 'curvature parameter of a panel', 'b 100, R 500, t 2 mm, ν 0.3', 10 * Math.sqrt(0.91), '', rel(1e-12), 'algebra', e => given(e.panelBuckling({ ...panel([200, 100], 2, all.SSSS), nu: 0.3, radius: 500 })).Z ?? Number.NaN),
]
