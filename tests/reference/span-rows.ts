/** Reference rows of bars along a span (§5.1, §5.2), imposed twist (§6) and combined stress (§7.4). */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { Segment } from '#shared/torsion/span/segment'
import type { SpanCase, SpanSupport } from '#shared/torsion/span/span-bar'
import { given } from './engine'
import { abs, rel, row } from './row'

const G = 79_000
const shaft = (radius: number) => ({ along: 'uniform', GJ: G * Math.PI / 2 * radius ** 4 } as const)
const solve = (e: Engine, segments: readonly Segment[], supports: readonly SpanSupport[], load: Partial<SpanCase>) => {
  const bar = given(e.spanBar(segments, supports))
  const response = bar.respond({ torques: [], distributed: [], ...load })
  if ('ok' in response) throw new Error(response.reason)
  return { bar, response }
}
const rigid = (node: number): SpanSupport => ({ node, stiffness: 'rigid' })

const stepped: Segment[] = [{ length: 400, stiffness: shaft(15) }, { length: 500, stiffness: shaft(12) }, { length: 300, stiffness: shaft(10) }]
const steps = { torques: [{ node: 1, T: 120_000 }, { node: 2, T: -50_000 }, { node: 3, T: 80_000 }] }
const twoEnds: Segment[] = [{ length: 400, stiffness: shaft(15) }, { length: 300, stiffness: shaft(10) }]
const middle = { torques: [{ node: 1, T: 250_000 }] }
const taper = (d1: number, d2: number): Segment[] => [{ length: 500, stiffness: { along: 'tapering circle', G, d1, d2 } }]
const linear: Segment[] = [{ length: 500, stiffness: { along: 'linear', GJ1: 1e9, GJ2: 3e9 } }]

const spans: ReferenceRow[] = [
  row('C-86', 'twist at the step of a shaft held at both ends', 'Ø30×400 + Ø20×300, G 79 000 MPa, T 250 N·m', 0.012599574928315633, 'rad', rel(1e-10), 'compatibility', e => solve(e, twoEnds, [rigid(0), rigid(2)], middle).response.nodes[1]?.phi ?? Number.NaN),
  row('C-87', 'reaction at its Ø30 end', 'as C-86', 197882.73615635178, 'N·mm', rel(1e-10), 'compatibility', e => -(solve(e, twoEnds, [rigid(0), rigid(2)], middle).response.reactions[0]?.torque ?? Number.NaN)),
  row('§5.2', 'reaction at its Ø20 end', 'as C-86', 52_117.264, 'N·mm', rel(1e-8), 'compatibility', e => -(solve(e, twoEnds, [rigid(0), rigid(2)], middle).response.reactions[1]?.torque ?? Number.NaN)),
  row('§5.2', 'stress in its Ø30 part', 'as C-86', 37.3262407, 'MPa', rel(1e-8), 'algebra', e => (solve(e, twoEnds, [rigid(0), rigid(2)], middle).response.segments[0]?.T ?? Number.NaN) / given(e.torsionOfSolid({ shape: 'circle', outerRadius: 15, innerRadius: 0 })).WT),
  row('C-88', 'end twist of a stepped cantilever', 'R 15/12/10 over 400/500/300 mm; +120, −50, +80 N·m', 0.034720475337194655, 'rad', rel(1e-10), 'T/GJ integration', e => solve(e, stepped, [rigid(0)], steps).response.nodes[3]?.phi ?? Number.NaN),
  row('§5.1', 'torque in its first segment', 'as C-88', 150_000, 'N·mm', rel(1e-12), 'equilibrium', e => solve(e, stepped, [rigid(0)], steps).response.segments[0]?.T ?? Number.NaN),
  row('§5.1', 'torque in its second segment', 'as C-88', 30_000, 'N·mm', rel(1e-12), 'equilibrium', e => solve(e, stepped, [rigid(0)], steps).response.segments[1]?.T ?? Number.NaN),
  row('§5.1', 'end twist of a tapering circle', 'd 40 → 20 mm, L 500 mm, T 100 N·m', 32 * 1e5 * 500 / (3 * Math.PI * G * 20) * (1 / 8000 - 1 / 64_000), 'rad', rel(1e-12), 'closed form, algebra', e => solve(e, taper(40, 20), [rigid(0)], { torques: [{ node: 1, T: 1e5 }] }).response.nodes[1]?.phi ?? Number.NaN),
  row('§5.1', 'end twist of a bar whose GJ is linear', 'GJ 1e9 → 3e9 N·mm², L 500 mm, T 100 N·m', 1e5 * 500 * Math.log(3) / 2e9, 'rad', rel(1e-12), 'logarithm, algebra', e => solve(e, linear, [rigid(0)], { torques: [{ node: 1, T: 1e5 }] }).response.nodes[1]?.phi ?? Number.NaN),
  row('§5.1', 'end twist of a cantilever under a uniform torque', 'Ø30×400, m 50 N·mm/mm', 50 * 400 ** 2 / (2 * G * Math.PI / 2 * 15 ** 4), 'rad', rel(1e-12), 'm L²/2GJ', e => solve(e, [stepped[0]!], [rigid(0)], { distributed: [{ segment: 0, m1: 50, m2: 50 }] }).response.nodes[1]?.phi ?? Number.NaN),
  row('§5.1', 'end twist of a cantilever under a triangular torque', 'Ø30×400, m 0 → 60 N·mm/mm', 60 * 400 ** 2 / (3 * G * Math.PI / 2 * 15 ** 4), 'rad', rel(1e-12), 'm L²/3GJ', e => solve(e, [stepped[0]!], [rigid(0)], { distributed: [{ segment: 0, m1: 0, m2: 60 }] }).response.nodes[1]?.phi ?? Number.NaN),
  row('§5.1', 'largest torque of a cantilever where the torque applied along it changes sense', 'L 400 mm, m 40 → −60 N·mm/mm: zero at 160 mm', -60 * 240 / 2, 'N·mm', rel(1e-12), 'area of the triangle beyond, algebra', (e) => {
    const { bar, response } = solve(e, [stepped[0]!], [rigid(0)], { distributed: [{ segment: 0, m1: 40, m2: -60 }] })
    return bar.turns(response).reduce((most, at) => (Math.abs(at.T) > Math.abs(most) ? at.T : most), 0)
  }),
  row('§5.2', 'twist of a bar on a spring', 'Ø30×400, spring 1e6 N·mm/rad, T 100 N·m', 1e5 / 1e6 + 1e5 * 400 / (G * Math.PI / 2 * 15 ** 4), 'rad', rel(1e-12), 'springs in series', e => solve(e, [stepped[0]!], [{ node: 0, stiffness: 1e6 }], { torques: [{ node: 1, T: 1e5 }] }).response.nodes[1]?.phi ?? Number.NaN),
  row('§5.2', 'share of a uniform bar, torque at a third', 'T_A = T b/L', 2 / 3, '', rel(1e-12), 'compatibility', e => -(solve(e, [{ length: 100, stiffness: shaft(9) }, { length: 200, stiffness: shaft(9) }], [rigid(0), rigid(2)], { torques: [{ node: 1, T: 1 }] }).response.reactions[0]?.torque ?? Number.NaN)),
]

const follow = { GJ: 26_900 * 2606.6666666666665, shearPerRate: 26_900 * 4, warping: { EG: 71_000 * 182857142.857143, E: 71_000, omega: 1238.0952380952383 } }
const imposed = { rate: 4e-5, gradient: 2e-8, offset: 15, fibre: 50, E: 71_000 }
const following = (e: Engine) => given(e.followTwist(follow, imposed))
const imposedRows: ReferenceRow[] = [
  row('§6', 'torque of a part that follows', 'channel C-38, θ′ 4e-5 rad/mm', 2804.773333, 'N·mm', rel(2e-10), 'T = GJ θ′', e => following(e).torque),
  row('§6', 'shear of that part', 'flange 4 mm, θ′ 4e-5 rad/mm', 4.304, 'MPa', rel(1e-12), 'τ = G t θ′', e => following(e).tau),
  row('§6', 'bimoment from a change of rate', 'φ″ 2e-8 rad/mm²', -71_000 * 182857142.857143 * 2e-8, 'N·mm²', rel(1e-12), 'B = −EΓ φ″', e => following(e).bimoment),
  row('§6', 'warping stress from a change of rate', 'φ″ 2e-8 rad/mm², ω 1238.1 mm²', -71_000 * 1238.0952380952383 * 2e-8, 'MPa', rel(1e-12), 'σ = −E ω φ″', e => following(e).sigmaWarping),
  row('§6', 'bending stress of an offset attachment', 'e 15 mm, c 50 mm, φ″ 2e-8 rad/mm²', 71_000 * 15 * 2e-8 * 50, 'MPa', rel(1e-12), 'σ = E e φ″ c', e => following(e).sigmaBending),
  row('§6', 'torque share of a part turned with its structure', 'GJ 1 : 19', 0.05, '', rel(1e-12), 'shares as GJ', e => given(e.shareTwist(1e6, 19e6)).share),
]

const margin = (reserve: { ok: boolean, ms?: number | null }) => ('ms' in reserve && reserve.ms !== null && reserve.ms !== undefined ? reserve.ms : Number.NaN)
const combined: ReferenceRow[] = [
  row('C-93', 'margin by the circle rule', 'Rs 0.6, Rn 0.5', 0.28036879932896, '', rel(1e-12), 'algebra', e => margin(e.circleRule(0.5, 0.6))),
  row('C-94', 'margin of a panel, Rc + Rs² = 1', 'Rc 0.4, Rs 0.5', 0.354065922853802, '', rel(1e-12), 'algebra', e => margin(e.compressionWithShear(0.4, 0.5))),
  row('C-95', 'equivalent stress of von Mises', 'σ 120, τ 90 MPa', 196.72315572906, 'MPa', rel(1e-12), 'von Mises', e => e.vonMises(120, 90)),
  row('§7.4', 'the circle rule by the general one', 'Rs 0.6, Rn 0.5, exponents 2, 2', 0.28036879932896, '', rel(1e-12), 'algebra', e => margin(e.powerRule(0.5, 0.6, 2, 2))),
  row('§7.4', 'Rc + Rs² by the general rule', 'Rc 0.4, Rs 0.5, exponents 1, 2', 0.354065922853802, '', rel(1e-11), 'algebra', e => margin(e.powerRule(0.4, 0.5, 1, 2))),
  row('§7.4', 'bending with shear', 'Rb 0.3, Rs 0.4', 1, '', rel(1e-12), 'R_b² + R_s² = 1', e => margin(e.bendingWithShear(0.3, 0.4))),
  row('§7.4', 'margin on the varying load alone', 'steady 0.6, varying 0.4, exponents 2, 2', 1, '', rel(1e-12), '0.6² + (2·0.4)² = 1', e => margin(e.varyingOnly(0.6, 0.4, 2, 2))),
  row('§7.4', 'normal stress at one fibre', '+80 − 30 + 10 MPa', 60, 'MPa', rel(1e-12), 'sum with signs', e => e.atOneFibre([80, -30, 10], { sv: 0, omega: 0, direct: 0 }).sigma),
  row('§7.4', 'shear stress at one fibre', '12, −5, 3 MPa', 20, 'MPa', abs(1e-12), 'sum of magnitudes at the worse face', e => e.atOneFibre([], { sv: 12, omega: -5, direct: 3 }).tau),
]

export const spanRows: readonly ReferenceRow[] = [...spans, ...imposedRows, ...combined]
