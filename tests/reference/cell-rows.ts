/** Reference rows of closed sections (§2.1 to §2.4) and of direct shear in thin walls (§5.3, §5.4). */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { WallSection } from '#shared/torsion/cells/wall-graph'
import { given } from './engine'
import { abs, rel, row } from './row'
import { channel } from './sections'

const bredt = 'Bredt–Batho, separate linear solution'
const exact = 'exact, algebra'
const elements = 'boundary elements of a square tube b/t = 20 (methods reference §2.3)'

const node = (id: string, x: number, y: number) => ({ id, x, y })
const wall = (id: string, from: string, to: string, t: number, G = 26_900) => ({ id, from, to, t, G })
export const singleBox: WallSection = {
  nodes: [node('1', 0, 0), node('2', 120, 0), node('3', 120, 60), node('4', 0, 60)],
  walls: [wall('bottom', '1', '2', 2), wall('right', '2', '3', 3), wall('top', '3', '4', 2), wall('left', '4', '1', 3)],
}
const twoCellNodes = [node('1', 0, 0), node('2', 100, 0), node('3', 240, 0), node('4', 240, 80), node('5', 100, 80), node('6', 0, 80)]
const twoCellWalls = (webG = 26_900) => [wall('b1', '1', '2', 2), wall('b2', '2', '3', 2), wall('right', '3', '4', 1.5), wall('t2', '4', '5', 2), wall('t1', '5', '6', 2), wall('left', '6', '1', 2), wall('web', '2', '5', 3, webG)]
export const twoCells: WallSection = { nodes: twoCellNodes, walls: twoCellWalls() }
export const twoCellsWithFins: WallSection = {
  nodes: [...twoCellNodes, node('7', 290, 0), node('8', 0, 110)],
  walls: [...twoCellWalls(79_000), wall('fin1', '3', '7', 4), wall('fin2', '6', '8', 3, 79_000)],
}
export const threeCells: WallSection = {
  nodes: [0, 1, 2, 3].flatMap(i => [node(`b${i}`, 50 * i, 0), node(`t${i}`, 50 * i, 50)]),
  walls: [0, 1, 2, 3].flatMap(i => [wall(`w${i}`, `b${i}`, `t${i}`, 1), ...(i < 3 ? [wall(`b${i}`, `b${i}`, `b${i + 1}`, 1), wall(`t${i}`, `t${i}`, `t${i + 1}`, 1)] : [])]),
}
/** Two half circles. */
export const ring = (radius: number, t: number): WallSection => ({
  nodes: [node('1', radius, 0), node('2', -radius, 0)],
  walls: [{ ...wall('upper', '1', '2', t), arc: { radius, sweep: Math.PI } }, { ...wall('lower', '2', '1', t), arc: { radius, sweep: Math.PI } }],
})
export const squareTube: WallSection = {
  nodes: [node('1', 0, 0), node('2', 19, 0), node('3', 19, 19), node('4', 0, 19)],
  walls: [wall('a', '1', '2', 1), wall('b', '2', '3', 1), wall('c', '3', '4', 1), wall('d', '4', '1', 1)],
}
const unequalWebs: WallSection = { nodes: singleBox.nodes, walls: [wall('bottom', '1', '2', 2), wall('right', '2', '3', 1.5), wall('top', '3', '4', 2), wall('left', '4', '1', 3)] }

const torsion = (e: Engine, section: WallSection) => given(e.torsionOfCells(section))
const response = (e: Engine, section: WallSection, torque: number) => given(e.respondOfCells(torsion(e, section), e.toEngine(torque, 'N·m')))
const at = (e: Engine, section: WallSection, id: string) => torsion(e, section).walls.findIndex(one => one.id === id)
const flow = (section: WallSection, id: string, torque: number) => (e: Engine) => response(e, section, torque).q[at(e, section, id)] ?? Number.NaN
const mean = (section: WallSection, id: string, torque: number) => (e: Engine) => response(e, section, torque).mean[at(e, section, id)] ?? Number.NaN
const J = (section: WallSection, G = 26_900) => (e: Engine) => torsion(e, section).GJ / G
const shear = (e: Engine, section: WallSection) => given(e.shearFlow(section))
const channelShear = (id: string, part: number) => (e: Engine) => {
  const { walls } = shear(e, channel)
  return 10_000 * Math.abs(walls.find(one => one.id === id)?.perY[part] ?? Number.NaN)
}
const web = (e: Engine) => shear(e, channel).walls.reduce((a, b) => (Math.abs(b.perY[4] ?? 0) > Math.abs(a.perY[4] ?? 0) ? b : a)).id
const flange = (e: Engine) => shear(e, channel).walls.find(one => one.id !== web(e))?.id ?? ''

const cells: ReferenceRow[] = [
  row('C-50', 'J of a single box', 'mid-line 120×60, long walls 2, short walls 3 mm', 1_296_000, 'mm⁴', rel(1e-12), 'Bredt, algebra', J(singleBox)),
  row('C-51', 'shear flow of that box', 'T 1000 N·m', 69.44444444444444, 'N/mm', rel(1e-12), 'Bredt, algebra', flow(singleBox, 'top', 1000)),
  row('§2.1', 'mean stress in its covers', 'T 1000 N·m', 34.722222222222, 'MPa', rel(1e-11), 'Bredt, algebra', mean(singleBox, 'top', 1000)),
  row('§2.1', 'mean stress in its webs', 'T 1000 N·m', 23.148148148148, 'MPa', rel(1e-11), 'Bredt, algebra', mean(singleBox, 'left', 1000)),
  row('C-52', 'J of a two-cell box', '100×80 and 140×80; left 2, web 3, right 1.5, covers 2 mm', 4423831.891223733, 'mm⁴', rel(1e-10), bredt, J(twoCells)),
  row('C-53', 'flow of its first cell', 'T 5000 N·m', 129.42596566523605, 'N/mm', rel(1e-10), bredt, flow(twoCells, 'left', 5000)),
  row('C-54', 'flow of its second cell', 'T 5000 N·m', 130.76716738197425, 'N/mm', rel(1e-10), bredt, flow(twoCells, 'right', 5000)),
  row('§2.2', 'flow of its shared web, upwards', 'T 5000 N·m', -1.341201717, 'N/mm', rel(1e-9), bredt, flow(twoCells, 'web', 5000)),
  row('C-55', 'largest mean stress, right web', 'T 5000 N·m', 87.17811158798283, 'MPa', rel(1e-10), bredt, mean(twoCells, 'right', 5000)),
  row('§2.2', 'mean stress in the second cell’s covers', 'T 5000 N·m', 65.384, 'MPa', rel(1e-5), bredt, mean(twoCells, 't2', 5000)),
  row('C-56', 'torque share of the first cell', '', 0.41416309012875535, '', rel(1e-10), bredt, e => torsion(e, twoCells).cells.find(cell => cell.walls.includes('left'))?.share ?? Number.NaN),
  row('§2.2', 'GJ over G with the strips of the walls', 'two-cell box', 4_426_135, 'mm⁴', rel(1e-7), 'thin-wall part 2303 mm⁴ added', e => torsion(e, twoCells).GJWithOwn / 26_900),
  row('C-57', 'GJ over 26 900 with mixed moduli and fins', 'web G 79 000; fins 50×4 (26 900) and 30×3 (79 000 MPa)', 4425721.082970866, 'mm⁴', rel(1e-10), bredt, J(twoCellsWithFins)),
  row('C-58', 'J of three equal cells in a row', '50×50, t 1 mm', 571428.5714285715, 'mm⁴', rel(1e-12), 'exact rational 4 000 000/7', J(threeCells)),
  row('C-59', 'J by Bredt over the exact tube, less one', 't/Rm 0.2', -0.00990099009900991, '', abs(1e-12), exact, e => J(ring(10, 2))(e) / given(e.torsionOfSolid({ shape: 'circle', outerRadius: 11, innerRadius: 9 })).J - 1),
  row('C-60', 'mean stress by Bredt over the exact outer stress', 't/Rm 0.2', 0.9181818181818181, '', rel(1e-12), exact, (e) => {
    const tube = given(e.torsionOfSolid({ shape: 'circle', outerRadius: 11, innerRadius: 9 }))
    return (response(e, ring(10, 2), 1).mean[0] ?? Number.NaN) / e.respondOfSolid(tube, 26_900, 1000).tauMax
  }),
  row('§2.1', 'face stress of a thin tube over the exact outer stress', 't/Rm 0.02', 1 + 0.0001 / 1.01, '', abs(2e-6), 'exact: (1 + η²)(1 + η)/(1 + η) to the second order, η = t/2Rm', (e) => {
    const tube = given(e.torsionOfSolid({ shape: 'circle', outerRadius: 101, innerRadius: 99 }))
    return (response(e, ring(100, 2), 1).face[0] ?? Number.NaN) / e.respondOfSolid(tube, 26_900, 1000).tauMax
  }),
  row('§1.10', 'J of a closed thin tube', 'R 50, t 2 mm', 1_570_796, 'mm⁴', rel(3e-7), 'Bredt', J(ring(50, 2))),
  row('C-115', 'χ of a square tube', 'b 20, t 1 mm', 0.10526315789473684, '', rel(1e-12), exact, e => torsion(e, squareTube).walls[0]?.chi ?? Number.NaN),
  row('§2.1', '1 + χ on the flats of that tube', 'b/t 20', 1.101, '', rel(5e-3), 'boundary elements, flats', e => (torsion(e, squareTube).walls[0]?.facePerRate ?? Number.NaN) / (torsion(e, squareTube).walls[0]?.meanPerRate ?? Number.NaN)),
  row('§2.2', 'stress in a fin', 'two cells with fins, T 5000 N·m', 4 * 5e6 / 4425721.082970866, 'MPa', rel(1e-10), 'G t θ′', e => response(e, twoCellsWithFins, 5000).face[at(e, twoCellsWithFins, 'fin1')] ?? Number.NaN),
]

const warping = (section: WallSection) => (e: Engine) => given(e.cellWarping(section, torsion(e, section))).largest
const uniformBox: WallSection = { nodes: singleBox.nodes, walls: singleBox.walls.map(one => ({ ...one, t: 2 })) }
const planeBox: WallSection = { nodes: singleBox.nodes, walls: singleBox.walls.map((one, i) => ({ ...one, t: i % 2 ? 2 : 4 })) }
const warped: ReferenceRow[] = [
  row('§3.8', 'warping at the corners of a box of one thickness, per rate of twist', '120×60, t 2 mm', 120 * 60 * 60 / (4 * 180), 'mm²', rel(1e-10), 'ab(a − b)/4(a + b), from dw/ds = q/(Gtθ′) − p', warping(uniformBox)),
  row('§3.8', 'warping where p·t is the same in every wall', '120×60, long walls 4, short walls 2 mm', 0, 'mm²', abs(1e-9), 'it keeps plane', warping(planeBox)),
]

const K = (radius: number, make: 'machined' | 'bent') => (e: Engine) => given(e.cellCornerFactor(radius, 1, make)).K
const corners: ReferenceRow[] = [
  ...([[0.125, 2.4], [0.25, 1.88], [0.5, 1.46], [1, 1.15]] as const).map(([r, value]) => row('§2.3', 'machined corner in a cell, K', `r/t ${r}`, value, '', rel(1e-12), elements, K(r, 'machined'))),
  ...([[0.25, 2.49], [0.5, 1.82], [1, 1.44], [2, 1.23]] as const).map(([r, value]) => row('§2.3', 'bent corner in a cell, K by the formula', `ri/t ${r}`, value, '', abs(5.1e-3), 'exact for a long arc', K(r, 'bent'))),
]

const directShear: ReferenceRow[] = [
  row('C-64', 'shear centre of a channel by its shear flow', 'from the web', 15.238095238095237, 'mm', rel(1e-10), '3b²tf/(6b tf + h tw)', (e) => {
    const x = shear(e, channel).shearCentre.x
    return Math.abs(x - Math.min(...channel.nodes.map(n => n.x)))
  }),
  row('C-90', 'flow at mid-height of a channel web', 'Vy 10 kN', 111.9047619047619, 'N/mm', rel(1e-10), 'VQ/I', e => channelShear(web(e), 4)(e)),
  row('§5.4', 'flow at the corner of that channel', 'Vy 10 kN', 76.1904762, 'N/mm', rel(1e-8), 'VQ/I', e => channelShear(web(e), 0)(e)),
  row('§5.4', 'stress at mid-height', 'Vy 10 kN', 37.302, 'MPa', rel(1e-4), 'VQ/(I t)', e => channelShear(web(e), 4)(e) / 3),
  row('§5.3', 'flange force of that channel times its depth', 'Vy 10 kN', 152_380.952381, 'N·mm', rel(1e-9), 'flange couple 1523.80952 N × 100 mm', e => channelShear(flange(e), 4)(e) * 40 * 100),
  row('C-89', 'torque of a load in the web plane', 'V 10 kN', 152380.95238095237, 'N·mm', rel(1e-10), 'T = V e', (e) => {
    const { shearCentre } = shear(e, channel)
    const x = shearCentre.x < 0 ? 0 : Math.max(...channel.nodes.map(n => n.x))
    return Math.abs(e.torqueAbout(shearCentre, [{ Vx: 0, Vy: 10_000, at: { x, y: 50 } }]))
  }),
  row('C-91', 'shear centre of a box with unequal webs', '120×60, left 3, right 1.5, covers 2 mm; from the left web', 45.6140350877193, 'mm', rel(1e-9), 'closed-cell shear flow, zero twist; 2600/57', e => shear(e, unequalWebs).shearCentre.x),
]

export const cellRows: readonly ReferenceRow[] = [...cells, ...warped, ...corners, ...directShear]
