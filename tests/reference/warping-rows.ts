/** Reference rows of restrained warping: the bar of §3.4 to §3.6 by the general solver, and stresses at fibres. */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { BarCase, Restraint, Support } from '#shared/torsion/warping/warping-bar'
import { given } from './engine'
import { rel, row } from './row'
import { channel } from './sections'
import type { OpenSection } from '#shared/torsion/section'

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
const equalAngle: OpenSection = { nodes: [{ id: '1', x: 30, y: 0 }, { id: '2', x: 0, y: 0 }, { id: '3', x: 0, y: 30 }], walls: [{ id: 'a', from: '1', to: '2', t: 3, G: 26_900 }, { id: 'b', from: '2', to: '3', t: 3, G: 26_900 }], junctions: [] }
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
/** State at z of the bar. */
const within = (setting: Setting, load: Partial<BarCase>, z: number, what: 'phi' | 'rate' | 'B' | 'Tw' | 'Tsv') => (e: Engine) => {
  const { bar, response } = solve(e, setting, load)
  const at = bar.stateAt(response, z)
  return 'ok' in at ? Number.NaN : at[what]
}
const peak = (setting: Setting, load: Partial<BarCase>, what: 'phi' | 'rate' | 'B', of: 'value' | 'z') => (e: Engine) => {
  const { bar, response } = solve(e, setting, load)
  const at = bar.peaks(response)[what]
  return of === 'z' ? at.z : at[what]
}
const single = (ends: Setting['ends'], length = 1200): Setting => ({ lengths: [length], ends })
const growing: Partial<BarCase> = { distributed: [{ member: 0, m: 0, mEnd: 12 }] }
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

/** Closed forms of §3.4 along the bar, between nodes. */
const cantileverTwist = (z: number, L: number) => T / (GJ * k) * (k * z - (Math.sinh(k * L) - Math.sinh(k * (L - z))) / Math.cosh(k * L))
const growingTwist = (z: number) => m / GJ * (z * 1200 / 6 - z ** 3 / 7200 - (z / 1200 - Math.sinh(k * z) / Math.sinh(u)) / k ** 2)
const growingPeak = Math.acosh(Math.sinh(u) / u) / k
const alongBar: ReferenceRow[] = [
  row('§3.4', 'twist of a cantilever at 500 mm', 'channel C-38, L 1200 mm, T 10 N·m', cantileverTwist(500, 1200), 'rad', rel(1e-10), closedForm, within(cantilever, at(1, T), 500, 'phi')),
  row('§3.4', 'bimoment of a cantilever at 500 mm', 'as above', -T / k * Math.sinh(k * 700) / Math.cosh(u), 'N·mm²', rel(1e-10), closedForm, within(cantilever, at(1, T), 500, 'B')),
  row('§3.4', 'torque that warping carries at 500 mm', 'as above', T * Math.cosh(k * 700) / Math.cosh(u), 'N·mm', rel(1e-10), closedForm, within(cantilever, at(1, T), 500, 'Tw')),
  row('§3.4', 'torque that twist carries at 500 mm', 'as above', T * (1 - Math.cosh(k * 700) / Math.cosh(u)), 'N·mm', rel(1e-10), closedForm, within(cantilever, at(1, T), 500, 'Tsv')),
  row('§3.4', 'twist of a stocky cantilever at 70 mm', 'channel C-38, L 150 mm, T 10 N·m, kL 0.35', cantileverTwist(70, 150), 'rad', rel(1e-9), closedForm, within(single([...builtIn, ...free], 150), at(1, T), 70, 'phi')),
  row('§3.4', 'rate of twist of a stocky cantilever at 70 mm', 'as above', T / GJ * (1 - Math.cosh(k * 80) / Math.cosh(k * 150)), 'rad/mm', rel(1e-9), closedForm, within(single([...builtIn, ...free], 150), at(1, T), 70, 'rate')),
  row('§3.4', 'rate of twist at 300 mm, both ends warping-fixed', 'channel C-38, L 1200 mm, T 10 N·m', T / GJ * (1 - Math.cosh(k * 300) / Math.cosh(h)), 'rad/mm', rel(1e-10), closedForm, within(heldBoth, at(1, T), 300, 'rate')),
  row('§3.4', 'twist between forks at 150 mm', 'T 10 N·m at 0.3 L', T / (GJ * k) * (k * 840 * 150 / 1200 - Math.sinh(k * 840) * Math.sinh(k * 150) / Math.sinh(u)), 'rad', rel(1e-9), closedForm, within(forks(360), at(1, T), 150, 'phi')),
  row('§3.4', 'twist between forks at 250 mm under a uniform torque', 'm 12 N·mm/mm, L 1200 mm', m / (GJ * k * k) * (k * k * 250 * 950 / 2 - 1 + Math.cosh(k * 350) / Math.cosh(h)), 'rad', rel(1e-9), closedForm, within(single([...fork, ...fork]), uniform(1, m), 250, 'phi')),
  row('§3.4', 'largest twist between forks under a uniform torque', 'm 12 N·mm/mm, L 1200 mm', 0.0139230834027308, 'rad', rel(1e-9), 'C-82; found along the bar', peak(single([...fork, ...fork]), uniform(1, m), 'phi', 'value')),
  row('§3.3', 'twist between forks at 800 mm under a torque that grows along the bar', 'm 0 to 12 N·mm/mm, L 1200 mm', growingTwist(800), 'rad', rel(1e-9), 'integrated by hand from §3.3', within(single([...fork, ...fork]), growing, 800, 'phi')),
  row('§3.3', 'largest bimoment under it', 'as above', m / k ** 2 * (growingPeak / 1200 - Math.sqrt((Math.sinh(u) / u) ** 2 - 1) / Math.sinh(u)), 'N·mm²', rel(1e-9), 'where cosh kz = sinh u/u', peak(single([...fork, ...fork]), growing, 'B', 'value')),
  row('§3.3', 'place of that bimoment', 'as above', growingPeak, 'mm', rel(1e-7), 'cosh kz = sinh u/u', peak(single([...fork, ...fork]), growing, 'B', 'z')),
  row('§3.3', 'fixed-end bimoment of a short bar under a torque that grows', 'channel C-38, L 20 mm, m 0 to 12 N·mm/mm, far end', -12 * 400 / 20, 'N·mm²', rel(1e-3), 'the limit kL → 0: w L²/20 of a beam under a triangular load (common practice)', bimoment(single([...builtIn, ...builtIn], 20), growing, 0, 2)),
]

/** Second moment of the channel about its shear centre, written out: web, and two flanges. */
const e0 = 3 * 1600 * 4 / (6 * 40 * 4 + 300)
const channelIps = 3 * 1e6 / 12 + 300 * e0 ** 2 + 2 * (4 * ((40 + e0) ** 3 - e0 ** 3) / 3 + 160 * 2500)
const compressed = (e: Engine) => given(e.compressedStiffness({ GJ: given(e.torsionOfOpenSection(channel)).plainGJ, Ips: given(e.sectorialProperties(channel)).Ips, compression: 20 }))
const compression: ReferenceRow[] = [
  row('§7.7', 'stiffness under 20 MPa of compression', 'channel C-38', GJ - 20 * channelIps, 'N·mm²', rel(1e-10), 'GJ − σ I_ps, algebra', e => compressed(e).GJ),
  row('§7.7', 'what 20 MPa of compression take off GJ', 'channel C-38', 20 * channelIps / GJ, '', rel(1e-10), 'σ I_ps/GJ, algebra', e => compressed(e).ratio),
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

/** Stresses through the whole chain: section, bar, run, fibres. */
const along = (section: OpenSection, setting: Setting, load: Partial<BarCase>) => (e: Engine) => {
  const { bar, response } = solve(e, setting, load)
  const { fibres, properties: { gamma } } = given(e.sectorialRun(section))
  const [peaks] = e.stressPeaks([{ fibres, normal: 400, shear: 250 }])({ run: bar.run(response), ends: response.members, gamma, axial: 0 })
  if (!peaks) throw new Error('no stress')
  return peaks
}
const tipTau = 13.4650368713
const chain: ReferenceRow[] = [
  row('C-79', 'largest warping stress of the bar', 'as C-77', 28.9150252077319, 'MPa', rel(1e-9), closedForm, e => along(channel, cantilever, at(1, T))(e).sigma.value),
  row('§7.4', 'largest shear stress of the bar', 'as C-77', tipTau + T / Math.cosh(u) * 61315.1927438 / (182857142.857143 * 4), 'MPa', rel(1e-9), 'free tip: τ of twist and τ of the flow at the same fibre', e => along(channel, cantilever, at(1, T))(e).tau.value),
  row('§7.4', 'largest equivalent stress of the bar', 'as C-77', 28.9150252077319, 'MPa', rel(1e-9), 'built-in end, flange tip: no shear there', e => along(channel, cantilever, at(1, T))(e).mises.value),
  row('§7.4', 'largest of the circle rule of the bar', 'as C-77, F_n 400, F_s 250 MPa', 28.9150252077319 / 400, '', rel(1e-9), 'built-in end, flange tip: no shear there', e => along(channel, cantilever, at(1, T))(e).circle.value),
  row('§3.3', 'shear stress on the right face of a flange', 'φ′ 1e-4 rad/mm, T_ω 10 N·m', 26_900 * 4 * 1e-4, 'MPa', rel(1e-9), 'free edge: G t φ′ alone', e => e.fibreStresses(run(e), { B: 0, Tw: T, rate: 1e-4 }).reduce((low, one) => (Math.abs(one.fibre.S) < Math.abs(low.fibre.S) ? one : low)).right),
  row('§3.1', 'stress at the toe of a clamped angle', 'angle 30 × 30 × 3 mid-line, B 1e6 N·mm²', 9e6 / (9 * 900), 'MPa', rel(1e-9), 'B (b t/2)/Γ with Γ = t³b³/18 (Timoshenko, Bleich; from memory)', e => Math.abs(given(e.sectorialRun(equalAngle)).fibres.map(fibre => e.fibreStress(fibre, given(e.sectorialProperties(equalAngle)).gamma, { B: 1e6, Tw: 0, rate: 0 }).sigma).reduce((a, b) => Math.max(Math.abs(a), Math.abs(b)), 0))),
]

export const warpingRows: readonly ReferenceRow[] = [...bars, ...alongBar, ...compression, ...stresses, ...chain]
