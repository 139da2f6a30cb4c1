/** Reference rows of the solids: §1.1 to §1.8 and the fully plastic torques of §7.5. */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { Solid } from '#shared/torsion/solids/solid'
import { given } from './engine'
import { abs, rel, row } from './row'

const saintVenant = 'exact, Saint-Venant'
const series = 'exact series, summed to 30 digits (Saint-Venant; Timoshenko & Goodier)'
const elements = 'boundary elements on three meshes, extrapolated, order 2.00'
const collocation = 'collocation with corner functions, residual 1e-13'
const heap = 'sand heap (Nádai), algebra'
const literature = 'Saint-Venant, to three digits, from memory'

const solved = (e: Engine, solid: Solid) => given(e.torsionOfSolid(solid))
const J = (solid: Solid) => (e: Engine) => solved(e, solid).J
const A = (solid: Solid) => (e: Engine) => solved(e, solid).A
/** Stress at the peak for a torque in N·m. */
const tau = (solid: Solid, torque: number) => (e: Engine) => e.respondOfSolid(solved(e, solid), 1, e.toEngine(torque, 'N·m')).tauMax
const second = (solid: Solid, torque: number) => (e: Engine) => {
  const { secondary, J: constant } = solved(e, solid)
  return e.toEngine(torque, 'N·m') * (secondary[0]?.perRate ?? Number.NaN) / constant
}
const perRate = (solid: Solid) => (e: Engine) => solved(e, solid).peak.perRate
const secondPerRate = (solid: Solid) => (e: Engine) => solved(e, solid).secondary[0]?.perRate ?? Number.NaN
/** τ·size³/T */
const perTorque = (solid: Solid, size = 1) => (e: Engine) => size ** 3 / solved(e, solid).WT
const plastic = (solid: Solid) => (e: Engine) => solved(e, solid).plastic ?? Number.NaN
const plasticRatio = (solid: Solid) => (e: Engine) => (solved(e, solid).plastic ?? Number.NaN) / solved(e, solid).WT
const remembered = (solid: Solid, of: 'J' | 'peak') => (e: Engine) => solved(e, solid).remembered.find(one => one.of === of)?.value ?? Number.NaN

const circle: Solid = { shape: 'circle', outerRadius: 18, innerRadius: 0 }
const tube: Solid = { shape: 'circle', outerRadius: 25, innerRadius: 20 }
const ellipse: Solid = { shape: 'ellipse', semiMajor: 30, semiMinor: 18, ratio: 0 }
const hollow: Solid = { shape: 'ellipse', semiMajor: 30, semiMinor: 18, ratio: 0.6 }
const bar: Solid = { shape: 'rectangle', width: 50, height: 20 }
const triangle: Solid = { shape: 'equilateral triangle', side: 40 }
const isosceles = (leg: number): Solid => ({ shape: 'right isosceles triangle', leg })
const sector = (degrees: number, radius = 1): Solid => ({ shape: 'sector', radius, angle: degrees * Math.PI / 180 })
const half: Solid = { shape: 'semicircle', radius: 1 }
const flat = (depth: number, radius = 1): Solid => ({ shape: 'segment', radius, depth })
const polygon = (shape: 'pentagon' | 'hexagon' | 'octagon', flats = 1): Solid => ({ shape, flats })
const square: Solid = { shape: 'rectangle', width: 1, height: 1 }

const rounds: ReferenceRow[] = [
  row('C-01', 'J of a solid circle', 'R 18 mm', 164895.91520162107, 'mm⁴', rel(1e-12), 'exact', J(circle)),
  row('C-02', 'peak shear of a solid circle', 'R 18 mm, T 400 N·m', 43.66390756979296, 'MPa', rel(1e-12), 'exact', tau(circle, 400)),
  row('C-03', 'J of a circular tube', 'Ro 25, Ri 20 mm', 362264.902867073, 'mm⁴', rel(1e-12), 'exact', J(tube)),
  row('C-04', 'peak shear of a circular tube', 'Ro 25, Ri 20 mm, T 900 N·m', 62.10924608464209, 'MPa', rel(1e-12), 'exact', tau(tube, 900)),
  row('§1.1', 'shear at the inner surface of that tube', 'Ro 25, Ri 20 mm, T 900 N·m', 62.10924608464209 * 0.8, 'MPa', rel(1e-12), 'τ is proportional to the radius', second(tube, 900)),
  row('C-05', 'J of an ellipse', 'semi-axes 30, 18 mm', 404156.65490593394, 'mm⁴', rel(1e-12), saintVenant, J(ellipse)),
  row('C-06', 'peak shear of an ellipse, ends of the minor axis', 'semi-axes 30, 18 mm, T 500 N·m', 32.74793067734472, 'MPa', rel(1e-12), saintVenant, tau(ellipse, 500)),
  row('§1.2', 'shear at the ends of its major axis', 'semi-axes 30, 18 mm, T 500 N·m', 32.74793067734472 * 0.6, 'MPa', rel(1e-12), 'τ is as b to a, Saint-Venant', second(ellipse, 500)),
  row('C-07', 'J of a similar hollow ellipse', 'semi-axes 30, 18 mm, ratio 0.6', 351777.9524301249, 'mm⁴', rel(1e-12), saintVenant, J(hollow)),
  row('§1.2', 'peak shear of that hollow ellipse', 'ratio 0.6, T 500 N·m', 32.74793067734472 / (1 - 0.6 ** 4), 'MPa', rel(1e-12), '2T/(π a b² (1 − κ⁴))', tau(hollow, 500)),
  row('§1.2', 'area of that hollow ellipse', 'ratio 0.6', Math.PI * 30 * 18 * 0.64, 'mm²', rel(1e-12), 'algebra', A(hollow)),
  row('§1.1', 'area of that tube', 'Ro 25, Ri 20 mm', Math.PI * 225, 'mm²', rel(1e-12), 'algebra', A(tube)),
]

const table: readonly (readonly [number, number, number, number])[] = [
  [1, 0.1405770150, 0.2081652599, 0.6753144833], [1.2, 0.1661189101, 0.2189335450, 0.7059242415], [1.5, 0.1957607089, 0.2309691269, 0.7280203735],
  [2, 0.2286816771, 0.2458783420, 0.7394320054], [2.5, 0.2493650747, 0.2575899416, 0.7418246583], [3, 0.2633169310, 0.2672080462, 0.7423229308],
  [4, 0.2808129583, 0.2816656658, 0.7424480920], [5, 0.2913167542, 0.2915002044, 0.7424535011], [10, 0.3123250375, 0.3123251138, 0.7424537454],
]
const strip = (n: number): Solid => ({ shape: 'rectangle', width: n, height: 1 })
const exactBeta: readonly (readonly [string, number, number])[] = [['C-08', 1, 0.1405770149551537], ['C-10', 1.5, 0.19576070887554403], ['C-12', 2, 0.22868167711957077], ['C-14', 2.5, 0.2493650747081864], ['C-16', 10, 0.3123250374572054]]
const exactAlpha: readonly (readonly [string, number, number])[] = [['C-09', 1, 0.20816525993250443], ['C-11', 1.5, 0.2309691268855193], ['C-13', 2, 0.2458783420234275], ['C-15', 2.5, 0.2575899415570535], ['C-17', 10, 0.31232511376086625]]
const rectangles: ReferenceRow[] = [
  ...exactBeta.map(([id, n, beta]) => row(id, 'β of a rectangle, J = β a b³', `a/b ${n}`, beta, '', abs(1e-12), series, e => solved(e, strip(n)).J / n)),
  ...exactAlpha.map(([id, n, alpha]) => row(id, 'α of a rectangle, τ = T/(α a b²)', `a/b ${n}`, alpha, '', abs(1e-12), series, e => solved(e, strip(n)).WT / n)),
  ...table.flatMap(([n, beta, alpha, P]) => [
    row('§1.3', 'β of a rectangle, printed', `a/b ${n}`, beta, '', abs(6e-11), series, e => solved(e, strip(n)).J / n),
    row('§1.3', 'α of a rectangle, printed', `a/b ${n}`, alpha, '', abs(6e-11), series, e => solved(e, strip(n)).WT / n),
    row('§1.3', 'P of a rectangle, middle of the short sides', `a/b ${n}`, P, '', abs(6e-11), series, secondPerRate(strip(n))),
  ]),
  row('C-18', 'J of a rectangle', '50×20 mm', 99746.02988327456, 'mm⁴', rel(1e-10), series, J(bar)),
  row('C-19', 'peak shear of a rectangle, middle of the long sides', '50×20 mm, T 400 N·m', 77.6427832511861, 'MPa', rel(1e-10), series, tau(bar, 400)),
  row('C-20', 'shear at the middle of the short sides', '50×20 mm, T 400 N·m', 59.49707746234868, 'MPa', rel(1e-9), series, second(bar, 400)),
  row('§1.3', 'J of a long strip', '1000×1 mm', 1000 / 3 * (1 - 0.630248876 / 1000), 'mm⁴', rel(1e-11), 'limit of the series', J(strip(1000))),
  row('§1.3', 'area of a rectangle', '50×20 mm', 1000, 'mm²', rel(1e-12), 'algebra', A(bar)),
  row('§1.3', 'handbook J of a square', 'a/b 1', 1 / 3 - 0.21 * 11 / 12, 'mm⁴', rel(1e-12), 'Young & Budynas, from memory', remembered(square, 'J')),
  row('§1.3', 'handbook peak of a square, J·3(1 + Σc)/(a b²)', 'a/b 1', 0.1405770149551537 * 3 * (1 + 0.6095 + 0.8865 - 1.8023 + 0.91), 'mm', rel(1e-9), 'Young & Budynas, from memory', remembered(square, 'peak')),
]

const triangles: ReferenceRow[] = [
  row('C-21', 'J of an equilateral triangle', 'side 40 mm', 55425.62584220408, 'mm⁴', rel(1e-12), saintVenant, J(triangle)),
  row('C-22', 'peak shear of an equilateral triangle', 'side 40 mm, T 100 N·m', 31.25, 'MPa', rel(1e-12), saintVenant, tau(triangle, 100)),
  row('§1.4', 'area of that triangle', 'side 40 mm', 400 * Math.sqrt(3), 'mm²', rel(1e-12), 'algebra', A(triangle)),
  row('C-23', 'J/a⁴ of a right isosceles triangle', 'legs 1', 0.0260896517, '', abs(2e-10), 'exact double series', J(isosceles(1))),
  row('C-24', 'τ·a³/T of a right isosceles triangle', 'legs 1, middle of the hypotenuse', 17.6, '', rel(5e-4), `${elements}; the handbook says 18.02, from memory`, perTorque(isosceles(1))),
  row('§1.5', 'J of a right isosceles triangle', 'legs 30 mm', 21132.617877, 'mm⁴', rel(1e-9), 'exact double series', J(isosceles(30))),
  row('§1.5', 'peak shear of that triangle', 'legs 30 mm, T 60 N·m', 39.1111, 'MPa', rel(2e-5), elements, tau(isosceles(30), 60)),
  row('§1.5', 'handbook peak of that triangle', 'legs 30 mm, over 60 N·m / J', 40.0444 * 21132.617877 / 60_000, 'mm', rel(2e-6), 'handbook, from memory', remembered(isosceles(30), 'peak')),
  row('§1.5', 'area of that triangle', 'legs 30 mm', 450, 'mm²', rel(1e-12), 'algebra', A(isosceles(30))),
]

const sectorTable: readonly (readonly [number, number, number, number | null])[] = [
  [30, 0.00677390725, 0.2865706619, 0.3237863562], [45, 0.01812331867, 0.3793014587, 0.4173506526], [60, 0.03490920609, 0.4521538853, 0.4898401485], [90, 0.08232757529, 0.5587287997, 0.5979010950],
  [120, 0.14421217525, 0.6324352511, 0.6794763902], [180, 0.29755678206, 0.7267604553, 0.8488263632], [270, 0.57248282567, 0.8046514279, null], [360, 0.87805568517, 0.8488263632, null],
]
const sectors: ReferenceRow[] = [
  ...([['C-27', 60, 0.034909206094642285], ['C-28', 90, 0.08232757529299568], ['C-29', 270, 0.5724828256679597], ['C-30', 360, 0.8780556851717263]] as const).map(([id, angle, value]) =>
    row(id, 'J/R⁴ of a sector', `${angle}°`, value, '', abs(1e-11), series, J(sector(angle)))),
  ...sectorTable.flatMap(([angle, constant, arc, edge]) => [
    row('§1.6', 'J/R⁴ of a sector, printed', `${angle}°`, constant, '', abs(6e-12), series, J(sector(angle))),
    row('§1.6', 'shear at the middle of the arc over Gθ′R', `${angle}°`, arc, '', abs(1e-9), series, edge === null ? perRate(sector(angle)) : secondPerRate(sector(angle))),
    ...(edge === null ? [] : [row('§1.6', 'largest shear on the straight edges over Gθ′R', `${angle}°`, edge, '', abs(1e-9), series, perRate(sector(angle)))]),
  ]),
  row('C-108', 'peak shear of a quarter circle', 'R 20 mm, T 50 N·m', 45.39040327861967, 'MPa', rel(1e-9), series, tau(sector(90, 20), 50)),
  row('§1.6', 'J of a quarter circle', 'R 20 mm', 13172.412046879, 'mm⁴', rel(1e-11), series, J(sector(90, 20))),
  row('§1.6', 'area of a quarter circle', 'R 20 mm', 100 * Math.PI, 'mm²', rel(1e-12), 'algebra', A(sector(90, 20))),
  row('C-25', 'J/R⁴ of a semicircle', 'R 1', 0.2975567820597338, '', abs(1e-12), 'exact closed form', J(half)),
  row('C-26', 'peak shear of a semicircle over Gθ′R', 'R 1, middle of the diameter', 0.8488263631567752, '', abs(1e-12), 'exact', perRate(half)),
  row('§1.6', 'τ·R³/T of a semicircle', 'R 1', 2.852652, '', rel(6e-7), 'boundary elements; the closed form gives 2.8526534', perTorque(half)),
  row('§1.6', 'shear at the middle of the arc of a semicircle', 'R 1', 0.7267604553, '', abs(1e-9), series, secondPerRate(half)),
  row('§1.6', 'area of a semicircle', 'R 1', Math.PI / 2, '', rel(1e-12), 'algebra', A(half)),
]

const segmentValues: readonly (readonly [number, number, number])[] = [
  [0.05, 1.5475088, 1.154953], [0.1, 1.5041841, 1.190542], [0.2, 1.3850684, 1.210258], [0.3, 1.2415368, 1.199877], [0.4, 1.0872959, 1.173101], [0.5, 0.9314565, 1.135308],
  [0.6, 0.7804741, 1.089284], [0.8, 0.5100863, 0.978619], [1, 0.2975568, 0.848826],
]
const segments: ReferenceRow[] = [
  row('C-31', 'J/R⁴ of a circle with one flat', 'depth/R 0.2', 1.3850684, '', rel(2e-6), elements, J(flat(0.2))),
  row('C-32', 'J/R⁴ of a circle with one flat', 'depth/R 0.5', 0.9314565, '', rel(2e-6), elements, J(flat(0.5))),
  row('C-33', 'peak shear of a circle with one flat over Gθ′R', 'depth/R 0.5, middle of the flat', 1.135308, '', rel(2e-5), elements, perRate(flat(0.5))),
  ...segmentValues.flatMap(([s, constant, peak]) => [
    row('§1.7', 'J/R⁴ of a circle with one flat, table', `depth/R ${s}`, constant, '', rel(2e-7), elements, J(flat(s))),
    row('§1.7', 'peak over Gθ′R of a circle with one flat, table', `depth/R ${s}`, peak, '', rel(1e-6), elements, perRate(flat(s))),
  ]),
  row('C-109', 'peak shear of a D-shaft', 'R 12, depth 2.4 mm, T 80 N·m', 40.45319444, 'MPa', rel(2e-4), elements, tau(flat(2.4, 12), 80)),
  row('§1.7', 'J of that shaft', 'R 12, depth 2.4 mm', 28720.78, 'mm⁴', rel(2e-6), elements, J(flat(2.4, 12))),
  row('§1.7', 'J between two computed depths', 'depth/R 0.7', Math.PI / 2 - 1.6384 * 0.7 ** 1.5 - 2.6904 * 0.49 + 4.4522 * 0.7 ** 2.5 - 1.3965 * 0.343, '', rel(5e-4), 'fit to fourteen depths, within 0.05 %', J(flat(0.7))),
  row('§1.7', 'peak between two computed depths', 'depth/R 0.7', 1 + 0.9022 * Math.sqrt(0.7) - 0.9076 * 0.7 - 0.1196 * 0.7 ** 1.5 - 0.0262 * 0.49, '', rel(3e-4), 'fit to fourteen depths, within 0.02 %', perRate(flat(0.7))),
  row('§1.7', 'area of half a circle by its flat', 'depth/R 1', Math.PI / 2, '', rel(1e-12), 'algebra', A(flat(1))),
]

const polygonTable: readonly (readonly ['pentagon' | 'hexagon' | 'octagon', number, number, number, number, number])[] = [
  ['pentagon', 0.12324827713, 0.636963983793, 5.16813640, 0.13570936, 0.90817817], ['hexagon', 0.11505099440, 0.613038471314, 5.32840654, 0.13284945, 0.86602540], ['octagon', 0.10749933517, 0.584313746706, 5.43551033, 0.12976318, 0.82842712],
]
const polygonRows: ReferenceRow[] = [
  row('C-34', 'J/d⁴ of a hexagon', 'd across flats', 0.11505099440459, '', abs(1e-12), collocation, J(polygon('hexagon'))),
  row('C-35', 'τ·d³/T of a hexagon', 'middle of the sides', 5.328406542574684, '', rel(1e-10), collocation, perTorque(polygon('hexagon'))),
  row('C-36', 'J/d⁴ of an octagon', 'd across flats', 0.10749933516512, '', abs(1e-11), collocation, J(polygon('octagon'))),
  row('C-37', 'τ·d³/T of an octagon', 'middle of the sides', 5.435510329470807, '', rel(1e-9), collocation, perTorque(polygon('octagon'))),
  ...polygonTable.flatMap(([shape, constant, peak, modulus, perArea, area]) => [
    row('§1.8', `J/d⁴ of a ${shape}`, 'd twice the apothem', constant, '', abs(6e-12), collocation, J(polygon(shape))),
    row('§1.8', `peak over Gθ′d of a ${shape}`, 'middle of the sides', peak, '', abs(1e-12), collocation, perRate(polygon(shape))),
    row('§1.8', `τ·d³/T of a ${shape}, printed`, 'middle of the sides', modulus, '', shape === 'pentagon' ? abs(1e-6) : abs(6e-9), shape === 'pentagon' ? `${collocation}; the printed digits are 1.2e-7 off its own J and peak` : collocation, perTorque(polygon(shape))),
    row('§1.8', `J/(A d²) of a ${shape}`, 'd twice the apothem', perArea, '', abs(6e-9), collocation, e => J(polygon(shape))(e) / A(polygon(shape))(e)),
    row('§1.8', `A/d² of a ${shape}`, 'd twice the apothem', area, '', abs(1.1e-8), 'algebra', A(polygon(shape))),
  ]),
  row('§1.8', 'J of a hexagon on its side s', 's 1', 1.035458950, '', rel(1e-9), collocation, J(polygon('hexagon', Math.sqrt(3)))),
  row('§1.8', 'J/(A d²) of a hexagon, older', 'd across flats', 0.133, '', abs(5e-4), literature, e => J(polygon('hexagon'))(e) / A(polygon('hexagon'))(e)),
  row('§1.8', 'J/(A d²) of an octagon, older', 'd across flats', 0.130, '', abs(5e-4), literature, e => J(polygon('octagon'))(e) / A(polygon('octagon'))(e)),
  row('C-110', 'peak shear of a hexagon', 'd 24 mm, T 150 N·m', 57.81691126925651, 'MPa', rel(1e-9), collocation, tau(polygon('hexagon', 24), 150)),
  row('§1.8', 'J of that hexagon', 'd 24 mm', 38171.1587195773, 'mm⁴', rel(1e-11), collocation, J(polygon('hexagon', 24))),
  row('§1.8', 'J of an octagon', 'd 24 mm', 35665.6994237, 'mm⁴', rel(1e-10), collocation, J(polygon('octagon', 24))),
  row('§1.8', 'peak shear of that octagon', 'd 24 mm, T 150 N·m', 58.9790617347, 'MPa', rel(1e-10), collocation, tau(polygon('octagon', 24), 150)),
]

const plastics: ReferenceRow[] = [
  row('C-100', 'plastic over first-yield torque of a circle', 'R 18 mm', 4 / 3, '', rel(1e-12), heap, plasticRatio(circle)),
  row('C-101', 'plastic torque over τy of a rectangle', '2×1', 0.8333333333333334, '', rel(1e-12), heap, plastic(strip(2))),
  row('§7.5', 'plastic over first-yield torque of a square', 'a/b 1', 1.60129, '', rel(4e-6), heap, plasticRatio(square)),
  row('§7.5', 'plastic over first-yield torque of a rectangle', 'a/b 2', 1.69460, '', rel(4e-6), heap, plasticRatio(strip(2))),
  row('§7.5', 'plastic torque over τy of an equilateral triangle', 'side 40 mm', 64_000 / 12, 'mm³', rel(1e-12), heap, plastic(triangle)),
  row('§7.5', 'plastic torque over τy of a hexagon', 'd 1', 0.288675, '', abs(6e-7), heap, plastic(polygon('hexagon'))),
  row('§7.5', 'plastic torque over τy of a right isosceles triangle', 'legs 1', 0.0976311, '', abs(6e-8), heap, plastic(isosceles(1))),
  row('§7.5', 'plastic torque over τy of a tube', 'Ro 25, Ri 20 mm', 2 / 3 * Math.PI * (25 ** 3 - 20 ** 3), 'mm³', rel(1e-12), heap, plastic(tube)),
]

export const solidRows: readonly ReferenceRow[] = [...rounds, ...rectangles, ...triangles, ...sectors, ...segments, ...polygonRows, ...plastics]
