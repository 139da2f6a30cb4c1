/** Reference rows of §4 and of every shape whose exact torsion is known: the outline solver is asked from the outline alone. */
import type { Outline } from '#shared/torsion/outline/outline'
import type { OutlineTorsion } from '#shared/torsion/outline/outline-torsion'
import type { FirstMethod } from '#shared/torsion/outline/agreement'
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import { given } from './engine'
import { abs, rel, row } from './row'
import * as shapes from './outlines'

/** One solution per outline and engine: many rows ask the same. */
const solved = new WeakMap<Engine, Map<Outline, OutlineTorsion>>()
function solve(engine: Engine, outline: Outline): OutlineTorsion {
  const known = solved.get(engine) ?? new Map<Outline, OutlineTorsion>()
  solved.set(engine, known)
  const solution = known.get(outline) ?? given(engine.outlineTorsion(outline))
  known.set(outline, solution)
  return solution
}
function peaks(engine: Engine, outline: Outline) {
  const { shear } = solve(engine, outline)
  if (!shear.bounded) throw new Error('The greatest shear is unbounded')
  return shear.peaks
}
const J = (outline: Outline) => (e: Engine): number => solve(e, outline).J.value
const tau = (outline: Outline) => (e: Engine): number => peaks(e, outline).estimate.value
const stress = (outline: Outline, torque: number) => (e: Engine): number => torque * peaks(e, outline).estimate.value / solve(e, outline).J.value
/** Greatest shear on an edge among the three that are told. */
const tauOn = (outline: Outline, edge: string) => (e: Engine): number => {
  const { first, next } = peaks(e, outline)
  return [first, ...next].find(peak => peak.edge === edge)?.tau ?? Number.NaN
}
const gamma = (outline: Outline) => (e: Engine): number => solve(e, outline).gamma?.value ?? Number.NaN

const exact = 'exact (Saint-Venant)'
const series = 'exact series, 30 digits'
const collocation = 'harmonic polynomials and corner functions by collocation, residual 1e-13'
const elements = 'boundary elements on the warping function, linear, extrapolated (order 2.00)'
const bracket = 'finite elements, rigorous two-sided bound: its middle, its half width'

const disc = shapes.disc(18)
const tube = shapes.tube(25, 20)
const ellipse = shapes.ellipse(30, 18, 24)
const hollow = shapes.hollowEllipse(30, 18, 0.6, 16)
const triangle = shapes.equilateral(40)
const isosceles = shapes.rightIsosceles(30)
const bar = shapes.rectangle(50, 20)
const round: ReferenceRow[] = [
  row('C-01', 'circle J by its outline', 'R 18 mm', 164_895.915201621, 'mm⁴', rel(1e-7), exact, J(disc)),
  row('C-02', 'circle τmax by its outline', 'R 18 mm, T 400 N·m', 43.663907569793, 'MPa', rel(1e-5), exact, stress(disc, 4e5)),
  row('C-03', 'tube J by its outline', 'Ro 25, Ri 20 mm', 362_264.902867073, 'mm⁴', rel(1e-7), exact, J(tube)),
  row('C-04', 'tube τmax by its outline', 'as C-03, T 900 N·m', 62.1092460846421, 'MPa', rel(1e-5), exact, stress(tube, 9e5)),
  row('§2.1', 'shear flow over G·θ′ round the hole of a tube', 'as C-03', 112.5, 'mm²', rel(1e-7), '(Ro² − Ri²)/2, exact', e => solve(e, tube).holePhi[0] ?? Number.NaN),
  row('C-05', 'ellipse J by its outline', 'semi-axes 30, 18 mm in 24 arcs', 404_156.654905934, 'mm⁴', rel(2e-4), exact, J(ellipse)),
  row('C-06', 'ellipse τmax by its outline', 'as C-05, T 500 N·m', 32.7479306773447, 'MPa', rel(5e-3), exact, stress(ellipse, 5e5)),
  row('§1.2', 'ellipse Γ', 'as C-05', 4_564_592.80834937, 'mm⁶', rel(1e-3), '((a² − b²)/(a² + b²))²·πa³b³/24, from the exact warping', gamma(ellipse)),
  row('C-07', 'similar hollow ellipse J by its outline', 'as C-05, ratio 0.6, 16 arcs each', 351_777.952430125, 'mm⁴', rel(5e-4), exact, J(hollow)),
]
const ratios: readonly (readonly [string, number, number, number])[] = [
  ['C-08/09', 1, 0.140577014955154, 0.208165259932504], ['C-10/11', 1.5, 0.195760708875544, 0.230969126885519], ['C-12/13', 2, 0.228681677119571, 0.245878342023428],
  ['C-14/15', 2.5, 0.249365074708186, 0.257589941557054], ['C-16/17', 10, 0.312325037457205, 0.312325113760866],
]
const straight: ReferenceRow[] = [
  ...ratios.flatMap(([id, n, beta, alpha]) => {
    const outline = shapes.rectangle(n, 1)
    return [
      row(id, 'rectangle J by its outline', `${n} × 1 mm`, beta * n, 'mm⁴', rel(5e-5), series, J(outline)),
      row(id, 'rectangle τmax/(Gθ′) by its outline', `${n} × 1 mm`, beta / alpha, 'mm', rel(1e-3), series, tau(outline)),
    ]
  }),
  row('C-18', 'rectangle J by its outline', '50 × 20 mm', 99_746.0298832746, 'mm⁴', rel(5e-5), series, J(bar)),
  row('C-19', 'rectangle τmax by its outline', '50 × 20 mm, T 400 N·m', 77.6427832511861, 'MPa', rel(1e-3), series, stress(bar, 4e5)),
  row('C-20', 'τ at mid short side by the outline', '50 × 20 mm, T 400 N·m', 59.4970774623487, 'MPa', rel(2e-3), series, e => 4e5 * tauOn(bar, 'short')(e) / solve(e, bar).J.value),
  row('§1.3', 'rectangle Γ', '50 × 20 mm', 3_640_599.49902718, 'mm⁶', rel(1e-4), 'series of the warping function, integrated term by term', gamma(bar)),
  row('C-21', 'equilateral triangle J by its outline', 'side 40 mm', 55_425.6258422041, 'mm⁴', rel(5e-5), exact, J(triangle)),
  row('C-22', 'equilateral triangle τmax by its outline', 'side 40 mm, T 100 N·m', 31.25, 'MPa', rel(1e-3), exact, stress(triangle, 1e5)),
  row('§1.4', 'equilateral triangle Γ', 'side 40 mm', 4096e6 * Math.sqrt(3) / 40_320, 'mm⁶', rel(1e-4), '√3·a⁶/40320, from the exact warping −Im z³/2h', gamma(triangle)),
  row('C-23', 'right isosceles triangle J by its outline', 'legs 30 mm', 0.0260896517 * 30 ** 4, 'mm⁴', rel(5e-5), 'exact double series', J(isosceles)),
  row('C-24', 'right isosceles triangle τmax by its outline', 'legs 30 mm, T 60 N·m', 39.1111, 'MPa', rel(1e-3), elements, stress(isosceles, 6e4)),
]

const sectors: readonly (readonly [number, number, number, number])[] = [
  [30, 0.00677390725, 0.2865706619, 0.3237863562], [45, 0.01812331867, 0.3793014587, 0.4173506526], [60, 0.03490920609, 0.4521538853, 0.4898401485],
  [90, 0.08232757529, 0.5587287997, 0.597901095], [120, 0.14421217525, 0.6324352511, 0.6794763902],
]
const semicircle = shapes.flatted(1, 1)
const sector90 = shapes.sector(90, 20)
const sector270 = shapes.sector(270)
const arcs: ReferenceRow[] = [
  ...sectors.flatMap(([degrees, constant, onArc, onEdge]) => {
    const outline = shapes.sector(degrees)
    return [
      row('§1.6', 'sector J by its outline', `${degrees}°, R 1 mm`, constant, 'mm⁴', rel(2e-4), series, J(outline)),
      row('§1.6', 'sector τ on the straight edge by its outline', `${degrees}°, R 1 mm`, onEdge, 'mm', rel(2e-3), series, tau(outline)),
      row('§1.6', 'sector τ at mid-arc by its outline', `${degrees}°, R 1 mm`, onArc, 'mm', rel(2e-3), series, tauOn(outline, 'arc')),
    ]
  }),
  row('C-29', 'sector J by its outline', '270°, R 1 mm', 0.57248282566796, 'mm⁴', rel(1e-4), series, J(sector270)),
  row('C-108', 'sector τmax by its outline', '90°, R 20 mm, T 50 N·m', 45.3904032786197, 'MPa', rel(2e-3), series, stress(sector90, 5e4)),
  row('C-25', 'semicircle J by its outline', 'R 1 mm', 0.297556782059734, 'mm⁴', rel(5e-5), exact, J(semicircle)),
  row('C-26', 'semicircle τmax by its outline', 'R 1 mm', 0.848826363156775, 'mm', rel(1e-3), exact, tau(semicircle)),
  row('C-105', 'semicircle shear centre from the diameter', 'R 1 mm', 0.509295817894065, 'mm', rel(2e-5), 'flexure solution at ν = 0 (Timoshenko & Goodier): 8/5π', e => -solve(e, semicircle).shearCentre.y),
]

const flats: readonly (readonly [number, number, number])[] = [
  [0.05, 1.5475088, 1.154953], [0.1, 1.5041841, 1.190542], [0.2, 1.3850684, 1.210258], [0.3, 1.2415368, 1.199877], [0.4, 1.0872959, 1.173101],
  [0.5, 0.9314565, 1.135308], [0.6, 0.7804741, 1.089284], [0.8, 0.5100863, 0.978619],
]
const shaft = shapes.flatted(12, 2.4)
const polygons: readonly (readonly [string, number, number, number])[] = [
  ['§1.8', 5, 0.12324827713, 0.636963983793], ['C-34/35', 6, 0.11505099440459, 0.613038471314], ['C-36/37', 8, 0.10749933516512, 0.584313746706],
]
const turned: ReferenceRow[] = [
  ...flats.flatMap(([depth, constant, onFlat]) => {
    const outline = shapes.flatted(1, depth)
    return [
      row('C-31…33', 'D-shaft J by its outline', `R 1, depth ${depth} mm`, constant, 'mm⁴', rel(5e-5), elements, J(outline)),
      row('C-31…33', 'D-shaft τmax by its outline', `R 1, depth ${depth} mm`, onFlat, 'mm', rel(1e-3), elements, tau(outline)),
    ]
  }),
  row('C-109', 'D-shaft τmax by its outline', 'R 12, depth 2.4 mm, T 80 N·m', 40.45319444, 'MPa', rel(1e-3), elements, stress(shaft, 8e4)),
  ...polygons.flatMap(([id, sides, constant, onSide]) => {
    const outline = shapes.regularPolygon(sides)
    return [
      row(id, 'regular polygon J by its outline', `${sides} sides, across flats 1 mm`, constant, 'mm⁴', rel(5e-5), collocation, J(outline)),
      row(id, 'regular polygon τmax by its outline', `${sides} sides, across flats 1 mm`, onSide, 'mm', rel(1e-3), collocation, tau(outline)),
    ]
  }),
]

const fillets: readonly (readonly [number, number])[] = [
  [0.05, 2.6856], [0.1, 2.1745], [0.125, 2.0402], [0.15, 1.941], [0.2, 1.8036], [0.25, 1.7131], [0.3, 1.6498], [0.5, 1.526], [0.75, 1.4893], [1, 1.5011], [1.5, 1.5807], [2, 1.6908],
]
const bends: readonly (readonly [number, number])[] = [[0.25, 1.5424], [0.5, 1.30848], [1, 1.1631], [1.5, 1.11], [2, 1.0829]]
const brackets: readonly (readonly [string, Outline, string, number, number])[] = [
  ['§1.10', shapes.machinedAngle(10, 1, 0.25), 'machined angle, fillet 0.25', 6.246027, 6.246162], ['C-118', shapes.machinedAngle(10, 1, 0.5), 'machined angle, fillet 0.5', 6.341923, 6.342068],
  ['§1.10', shapes.machinedAngle(10, 1, 1), 'machined angle, fillet 1', 6.67361, 6.673782], ['C-48', shapes.bentAngle(10, 1, 0.5), 'bent angle, inside 0.5', 5.98899, 5.989025],
  ['§4.3', shapes.machinedAngle(10, 1, 0), 'sharp angle', 6.19466, 6.19683],
]
const filleted = shapes.machinedAngle(10, 1, 0.5)
const bent = shapes.bentAngle(10, 1, 0.5)
const sharp = shapes.machinedAngle(10, 1, 0)
const tee = shapes.machinedTee(14, 1, 10, 0.5)
const rolled: ReferenceRow[] = [
  ...fillets.map(([ratio, factor]) => row('§1.10', 'shear in a machined fillet by the outline', `legs 10, t 1, fillet ${ratio} mm`, factor, 'mm', rel(1e-3), elements, tau(shapes.machinedAngle(10, 1, ratio)))),
  ...bends.map(([ratio, factor]) => row('§1.10', 'shear in a bend by the outline', `legs 10, t 1, inside radius ${ratio} mm`, factor, 'mm', rel(1e-3), elements, tau(shapes.bentAngle(10, 1, ratio)))),
  ...brackets.map(([id, outline, name, low, high]) => row(id, 'J by the outline', `${name}, legs 10, t 1 mm`, (low + high) / 2, 'mm⁴', abs(Math.max((high - low) / 2, 3e-4)), bracket, J(outline))),
  row('C-45', 'machined angle J by its outline', 'legs 10, t 1, fillet 0.5 mm', 6.342047, 'mm⁴', rel(5e-5), elements, J(filleted)),
  row('C-47', 'machined angle fillet shear by its outline', 'as C-45', 1.52603, 'mm', rel(1e-3), elements, tauOn(filleted, 'fillet')),
  row('C-48', 'bent angle J by its outline', 'legs 10, t 1, inside radius 0.5 mm', 5.989008, 'mm⁴', rel(5e-5), elements, J(bent)),
  row('C-46', 'tee J by its outline', 'flange 14 × 1, stem to 10 × 1, fillets 0.5 mm', 7.990392, 'mm⁴', rel(5e-5), elements, J(tee)),
  row('§4.3', 'sharp angle J by its outline', 'legs 10, t 1 mm', 6.19574, 'mm⁴', rel(5e-5), elements, J(sharp)),
]

const eccentric = shapes.tube(50, 30, 8)
const twoCell = shapes.twoCellBox
const closed: ReferenceRow[] = [
  row('C-106', 'eccentric tube J by its outline', 'R 50, hole r 30 offset 8 mm', 7_959_009, 'mm⁴', rel(2e-6), elements, J(eccentric)),
  row('C-52', 'two-cell box J by its outline', 'cells 100 × 80 and 140 × 80 mm', 4_456_951, 'mm⁴', rel(2e-4), elements, J(twoCell)),
  row('C-52', 'two-cell box J within a two-sided bound', 'as above', 4_457_367.56, 'mm⁴', abs(1), 'finite elements refined to 105,000 quadratic triangles: bound [4457366.99, 4457368.13]', J(twoCell)),
  row('C-91', 'shear centre of an unequal box by its outline', '120 × 60 mm, left wall 3, right 1.5, covers 2', 45.49, 'mm', abs(0.01), elements, e => solve(e, shapes.unequalBox).shearCentre.x),
]

/** The value at which a judgement turns, between one that holds and one that does not. */
function turningPoint(holds: (value: number) => boolean, from: number, to: number): number {
  let [low, high] = [from, to]
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2
    if (holds(middle)) low = middle
    else high = middle
  }
  return low
}
const wedge = (degrees: number): Outline => {
  const angle = degrees * Math.PI / 180
  return shapes.solid(shapes.v(0, 0), shapes.v(2, 0), shapes.v(2, 3), shapes.v(-4, 3), shapes.v(4 * Math.cos(angle), 4 * Math.sin(angle)))
}
const synthetic = 'algebra: 1 + h²/10 at h = 1, ½, ¼'
const expected = 'expected differences of §4.5, common practice'
const limit = (method: FirstMethod, quantity: 'J' | 'tau' | 'tau in a fillet' | 'gamma', verdict: 'caution' | 'stop') => (e: Engine): number =>
  turningPoint(part => e.judgeAgreement(method, quantity, 1 + part, 1).verdict === 'inside' || (verdict === 'stop' && e.judgeAgreement(method, quantity, 1 + part, 1).verdict !== 'stop'), 0, 0.9)
const judged: ReferenceRow[] = [
  row('§4.4', 'disc left out at a sharp re-entrant vertex', 'legs 10, t 1 mm', 0.5, 'mm', rel(1e-12), 't/2, common practice', e => e.reentrantVertices(given(e.checkOutline(sharp)))[0]?.excluded ?? Number.NaN),
  row('§4.2', 'order seen on three meshes', synthetic, 2, '–', rel(1e-12), 'algebra', e => e.estimateFromMeshes(1.1, 1.025, 1.00625).order ?? Number.NaN),
  row('§4.2', 'uncertainty seen on three meshes', synthetic, 0.00625, '–', rel(1e-9), 'algebra', e => e.estimateFromMeshes(1.1, 1.025, 1.00625).uncertainty),
  ...([['J', 0.002], ['tau', 0.01]] as const).map(([quantity, part]) => row('§4.2', `accepted uncertainty of ${quantity}`, 'turning point', part, '–', rel(1e-9), 'common practice', e =>
    turningPoint(u => e.judgeConvergence('J', { value: 1, onMeshes: [1, 1, 1], order: 2, uncertainty: u }, e.uncertaintyLimits[quantity]).verdict === 'inside', 0, 0.5))),
  row('§4.2', 'least order expected', 'turning point', 1.7, '–', rel(1e-9), 'common practice', e =>
    turningPoint(order => e.judgeConvergence('J', { value: 1, onMeshes: [1, 1, 1], order, uncertainty: 0 }, 1).verdict === 'information', 0, 5)),
  row('§4.4', 'interior angle that counts as re-entrant', 'turning point', 185, '°', rel(1e-6), 'common practice', e =>
    turningPoint(degrees => e.reentrantVertices(given(e.checkOutline(wedge(degrees)))).length === 0, 170, 200)),
  row('§4.5', 'J of an exact shape', 'turning point', 0.001, '–', rel(1e-6), expected, limit({ kind: 'exact shape' }, 'J', 'caution')),
  row('§4.5', 'τ of an exact shape', 'turning point', 0.005, '–', rel(1e-6), expected, limit({ kind: 'exact shape' }, 'tau', 'caution')),
  row('§4.5', 'J of a corrected open section', 'turning point', 0.005, '–', rel(1e-6), expected, limit({ kind: 'open, corrected' }, 'J', 'caution')),
  row('§4.5', 'τ on the flats of a corrected open section', 'turning point', 0.01, '–', rel(1e-6), expected, limit({ kind: 'open, corrected' }, 'tau', 'caution')),
  row('§4.5', 'τ in a fillet of a corrected open section', 'turning point', 0.03, '–', rel(1e-6), expected, limit({ kind: 'open, corrected' }, 'tau in a fillet', 'caution')),
  row('§4.5', 'J of a mid-line', 'turning point', 0.05, '–', rel(1e-6), expected, limit({ kind: 'open, mid-line only' }, 'J', 'caution')),
  row('§4.5', 'τ of a mid-line', 'turning point', 0.05, '–', rel(1e-6), expected, limit({ kind: 'open, mid-line only' }, 'tau', 'caution')),
  row('§4.5', 'J of a closed section', 'turning point', 0.03, '–', rel(1e-6), expected, limit({ kind: 'closed', chi: 0.05 }, 'J', 'caution')),
  row('§4.5', 'τ of a closed section', 'turning point', 0.02, '–', rel(1e-6), expected, limit({ kind: 'closed', chi: 0.05 }, 'tau', 'caution')),
  row('§4.5', 'J of a closed section that stops', 'turning point', 0.09, '–', rel(1e-6), expected, limit({ kind: 'closed', chi: 0.05 }, 'J', 'stop')),
  row('§4.5', 'Γ of a mid-line', 'turning point', 0.1, '–', rel(1e-6), 'amended §4.5, common practice', limit({ kind: 'open, mid-line only' }, 'gamma', 'caution')),
  row('§4.5', 'largest face factor in the table', 'turning point', 0.1, '–', rel(1e-6), expected, e => turningPoint(chi => e.judgeAgreement({ kind: 'closed', chi }, 'J', 1, 1).expected !== null, 0, 1)),
]

/** Quick to solve: the rows in which faults are looked for. */
export const quickOutlineRows: readonly ReferenceRow[] = [
  ...round.slice(0, 5), ...straight.slice(2, 4), ...straight.slice(10, 14), ...arcs.slice(9, 12), ...arcs.slice(-4), ...turned.slice(4, 6), ...rolled.slice(-4), ...closed.slice(0, 1),
]
/** Rows of what solutions are judged by; no outline is solved. */
export const judgementRows: readonly ReferenceRow[] = judged
export const outlineRows: readonly ReferenceRow[] = [...round, ...straight, ...arcs, ...turned, ...rolled, ...closed, ...judged]
