/** Reference rows of restrained warping: the bar of §3.4 to §3.6 by the general solver, and stresses at fibres. */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { BarCase, Restraint, Support } from '#shared/torsion/warping/warping-bar'
import { given } from './engine'
import { rel, row } from './row'
import { channel } from './sections'

const closedForm = 'closed form (Vlasov); collocation of the differential equation agrees'
const collocation = 'three-segment collocation, 1e-10'

/** Channel of flanges 40×4 and web 100×3: GJ and EΓ from the section itself, without end and junction terms. */
const stiffness = (e: Engine) => {
  const torsion = given(e.torsionOfOpenSection(channel))
  const { gamma } = given(e.sectorialProperties(channel))
  return { GJ: torsion.plainGJ, EG: 71_000 * gamma }
}
interface Setting { readonly lengths: readonly number[], readonly ends: readonly [Restraint, Restraint, Restraint, Restraint] }
const builtIn = ['fixed', 'fixed'] as const
const fork = ['fixed', 'free'] as const
const free = ['free', 'free'] as const
const noLoad: BarCase = { torques: [], distributed: [], bimoments: [] }

function solve(e: Engine, { lengths, ends }: Setting, load: Partial<BarCase>) {
  const supports: Support[] = [{ node: 0, twist: ends[0], warping: ends[1] }, { node: lengths.length, twist: ends[2], warping: ends[3] }]
  const bar = given(e.warpingBar(lengths.map(length => ({ length, ...stiffness(e) })), supports))
  const response = bar.respond({ ...noLoad, ...load })
  if ('ok' in response) throw new Error(response.reason)
  return { bar, response }
}
const uniform = (members: number, m: number) => ({ distributed: Array.from({ length: members }, (_, member) => ({ member, m })) })
const at = (node: number, T: number) => ({ torques: [{ node, T }] })
const twist = (setting: Setting, load: Partial<BarCase>, node: number) => (e: Engine) => solve(e, setting, load).response.nodes[node]?.phi ?? Number.NaN
const rate = (setting: Setting, load: Partial<BarCase>, node: number) => (e: Engine) => solve(e, setting, load).response.nodes[node]?.rate ?? Number.NaN
const bimoment = (setting: Setting, load: Partial<BarCase>, member: number, end: 1 | 2) => (e: Engine) => {
  const ends = solve(e, setting, load).response.members[member]
  return (end === 1 ? ends?.B1 : ends?.B2) ?? Number.NaN
}
const torque = (setting: Setting, load: Partial<BarCase>, member: number) => (e: Engine) => solve(e, setting, load).response.members[member]?.T ?? Number.NaN

const cantilever: Setting = { lengths: [1200], ends: [...builtIn, ...free] }
const heldBoth: Setting = { lengths: [1200], ends: [...builtIn, 'free', 'fixed'] }
const forks = (a: number): Setting => ({ lengths: [a, 1200 - a], ends: [...fork, ...fork] })
const built = (a: number): Setting => ({ lengths: [a, 1200 - a], ends: [...builtIn, ...builtIn] })
const three: Setting = { lengths: [300, 400, 500], ends: [...builtIn, ...builtIn] }
const twoTorques = { torques: [{ node: 1, T: 6000 }, { node: 2, T: 4000 }] }

// The same numbers by the closed forms, written out here and nowhere in the engine.
const [GJ, EG] = [26_900 * 2606.6666666666665, 71_000 * 182857142.857143]
const k = Math.sqrt(GJ / EG)
const u = k * 1200
const h = u / 2
const [T, m] = [10_000, 12]

const bars: ReferenceRow[] = [
  row('C-77', 'tip twist of a cantilever, root warping fixed', 'channel C-38, L 1200 mm, T 10 N·m', 0.110233124484291, 'rad', rel(1e-10), closedForm, twist(cantilever, at(1, T), 1)),
  row('C-78', 'its root bimoment', 'as C-77', -4270526.79991118, 'N·mm²', rel(1e-10), closedForm, bimoment(cantilever, at(1, T), 0, 1)),
  row('§3.6', 'its rate of twist at the tip', 'as C-77', 1.25139747874e-4, 'rad/mm', rel(1e-10), closedForm, rate(cantilever, at(1, T), 1)),
  row('§3.6', 'twist without restraint', 'as C-77', 0.171136823890701, 'rad', rel(1e-10), 'T L/GJ', twist({ lengths: [1200], ends: [...fork, ...free] }, at(1, T), 1)),
  row('§3.6', 'kL of that bar', 'as C-77', 2.78878475730, '', rel(1e-10), 'algebra', e => solve(e, cantilever, at(1, T)).bar.u[0] ?? Number.NaN),
  row('C-80', 'relative twist, both ends warping-fixed', 'as C-77', 0.0626251857913076, 'rad', rel(1e-10), closedForm, twist(heldBoth, at(1, T), 1)),
  row('§3.4', 'end bimoment, both ends warping-fixed', 'as C-77', -T / k * Math.tanh(h), 'N·mm²', rel(1e-10), closedForm, bimoment(heldBoth, at(1, T), 0, 1)),
  row('C-81', 'tip twist of a cantilever under a uniform torque', 'm 12 N·mm/mm, L 1200 mm', 0.0633212975724176, 'rad', rel(1e-9), closedForm, twist(cantilever, uniform(1, m), 1)),
  row('§3.4', 'its root bimoment', 'm 12 N·mm/mm', -m / k ** 2 * ((1 + u * Math.sinh(u)) / Math.cosh(u) - 1), 'N·mm²', rel(1e-9), closedForm, bimoment(cantilever, uniform(1, m), 0, 1)),
  row('C-82', 'mid twist between forks under a uniform torque', 'm 12 N·mm/mm, L 1200 mm', 0.0139230834027308, 'rad', rel(1e-9), closedForm, twist(forks(600), uniform(2, m), 1)),
  row('§3.4', 'its mid bimoment', 'm 12 N·mm/mm', m / k ** 2 * (1 - 1 / Math.cosh(h)), 'N·mm²', rel(1e-9), closedForm, bimoment(forks(600), uniform(2, m), 0, 2)),
  row('C-83', 'mid twist between built-in ends under a uniform torque', 'm 12 N·mm/mm, L 1200 mm', 0.00418025853920932, 'rad', rel(1e-9), closedForm, twist(built(600), uniform(2, m), 1)),
  row('§3.4', 'its end bimoment', 'm 12 N·mm/mm', -m / k ** 2 * (h / Math.tanh(h) - 1), 'N·mm²', rel(1e-9), closedForm, bimoment(built(600), uniform(2, m), 0, 1)),
  row('§3.4', 'its mid bimoment between built-in ends', 'm 12 N·mm/mm', m / k ** 2 * (1 - h / Math.sinh(h)), 'N·mm²', rel(1e-9), closedForm, bimoment(built(600), uniform(2, m), 0, 2)),
  row('C-84', 'twist at the load between forks', 'T 10 N·m at 0.3 L', 0.0114224882649487, 'rad', rel(1e-9), closedForm, twist(forks(360), at(1, T), 1)),
  row('§3.4', 'bimoment at that load', 'T 10 N·m at 0.3 L', T / k * Math.sinh(0.3 * u) * Math.sinh(0.7 * u) / Math.sinh(u), 'N·mm²', rel(1e-9), closedForm, bimoment(forks(360), at(1, T), 0, 2)),
  row('C-85', 'mid twist between built-in ends, torque at the middle', 'T 10 N·m', 0.00580591463779071, 'rad', rel(1e-9), closedForm, twist(built(600), at(1, T), 1)),
  row('§3.4', 'bimoment at its ends', 'T 10 N·m', -T / (2 * k) * Math.tanh(h / 2), 'N·mm²', rel(1e-9), closedForm, bimoment(built(600), at(1, T), 0, 1)),
  row('§3.4', 'mid twist between forks, torque at the middle', 'T 10 N·m', T / (2 * GJ * k) * (h - Math.tanh(h)), 'rad', rel(1e-9), closedForm, twist(forks(600), at(1, T), 1)),
  row('C-111', 'twist at 300 mm between built-in ends', '+6 N·m at 300, +4 N·m at 700, L 1200 mm', 0.00250310903526533, 'rad', rel(1e-8), collocation, twist(three, twoTorques, 1)),
  row('C-112', 'twist at 700 mm', 'as C-111', 0.00359505975396862, 'rad', rel(1e-8), collocation, twist(three, twoTorques, 2)),
  row('C-113', 'torque at the first end', 'as C-111', 6543.41323809937, 'N·mm', rel(1e-8), collocation, torque(three, twoTorques, 0)),
  row('C-114', 'bimoment at the first end', 'as C-111', -1337531.88881856, 'N·mm²', rel(1e-8), collocation, bimoment(three, twoTorques, 0, 1)),
  row('§3.5', 'torque at the second end', 'as C-111', -3456.58676190, 'N·mm', rel(1e-8), collocation, torque(three, twoTorques, 2)),
  row('§3.5', 'bimoment at the second end', 'as C-111', -885436.00310, 'N·mm²', rel(1e-8), collocation, bimoment(three, twoTorques, 2, 2)),
  row('§3.6', 'tip twist of a short cantilever: warping alone', 'channel C-38, L 20 mm', 10_000 * 8000 / (3 * EG) * (1 - 2 / 5 * (k * 20) ** 2), 'rad', rel(2e-6), 'T L³/3EΓ with its next term, the limit kL → 0', twist({ lengths: [20], ends: [...builtIn, ...free] }, at(1, T), 1)),
  row('§3.6', 'tip twist of a long cantilever: twist alone but for 1/k', 'channel C-38, L 20 m', T / GJ * (20_000 - 1 / k), 'rad', rel(1e-10), 'the limit kL → ∞', twist({ lengths: [20_000], ends: [...builtIn, ...free] }, at(1, T), 1)),
  row('§3.3', 'bimoment of an eccentric axial force, far end built in', 'P ω 1e6 N·mm², L 1200 mm', 1e6 / Math.cosh(u), 'N·mm²', rel(1e-9), 'B(z) = P ω cosh(k z)/cosh(u), algebra', bimoment({ lengths: [1200], ends: [...builtIn, ...free] }, { bimoments: [{ node: 1, B: 1e6 }] }, 0, 1)),
]

const run = (e: Engine) => given(e.sectorialRun(channel))
const worst = (e: Engine, state: { B: number, Tw: number, rate: number }) => {
  const found = e.worstStresses(e.fibreStresses(run(e), state))
  if (!found) throw new Error('no stress')
  return found
}
const stresses: ReferenceRow[] = [
  row('C-79', 'warping stress at the flange tip, root', 'as C-77', 28.9150252077319, 'MPa', rel(1e-9), closedForm, e => Math.abs(worst(e, { B: bimoment(cantilever, at(1, T), 0, 1)(e), Tw: 0, rate: 0 }).sigma.sigma)),
  row('§3.6', 'warping stress at the corner, root', 'as C-77', 17.7938616620, 'MPa', rel(1e-9), closedForm, (e) => {
    const B = bimoment(cantilever, at(1, T), 0, 1)(e)
    const corner = e.fibreStresses(run(e), { B, Tw: 0, rate: 0 }).filter(one => Math.abs(one.fibre.at.x) < 1e-9 && Math.abs(one.fibre.at.y) < 1e-9)
    return Math.abs(corner[0]?.sigma ?? Number.NaN)
  }),
  row('§3.6', 'shear stress at the faces of a flange, tip', 'as C-77', 13.4650368713, 'MPa', rel(1e-9), closedForm, e => worst(e, { B: 0, Tw: 0, rate: rate(cantilever, at(1, T), 1)(e) }).tau.tauSv),
  row('§3.6', 'largest shear stress of warping, root', 'T 10 N·m', 0.838294, 'MPa', rel(1e-6), 'T S_ω/(Γ t)', e => worst(e, { B: 0, Tw: T, rate: 0 }).tauOmega.tauOmega),
  row('§3.6', 'largest statical moment of ω', 'channel C-38', 61315.1927438, 'mm⁴', rel(1e-10), 'algebra', e => run(e).fibres.reduce((high, fibre) => Math.max(high, Math.abs(fibre.S)), 0)),
]

export const warpingRows: readonly ReferenceRow[] = [...bars, ...stresses]
