/** Reference rows of §1.9, §1.10, §6, §7 and §8: stiffness, stress, corners, large twist, margins. */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { OpenSection } from '#shared/torsion/section'
import type { OpenTorsion } from '#shared/torsion/open-section'
import { given } from './engine'
import { abs, rel, row } from './row'
import { bentAngle, channel, doublySymmetricI, machinedAngle, machinedTee, strip30x3, taperedStrip, twoMaterials } from './sections'

const thin = 'thin-wall theory, algebra'
const junction = 'El Darwish & Johnston 1965, coefficients from memory; boundary elements agree to 0.3 %'
const cornerElements = 'boundary elements, extrapolated (methods reference §1.10)'
const definition = 'definition, algebra'
const tubeStress = 62.1092460846421

const torsion = (engine: Engine, section: OpenSection): OpenTorsion => given(engine.torsionOfOpenSection(section))
/** Without end correction and junction, as the thin-wall rows are. */
function uncorrected(engine: Engine, section: OpenSection): OpenTorsion {
  const whole = torsion(engine, section)
  return { ...whole, GJ: whole.plainGJ, perWall: whole.perWall.map(wall => ({ ...wall, GJ: wall.plainGJ, share: wall.plainGJ / whole.plainGJ })) }
}
const plainJ = (engine: Engine, section: OpenSection): number => torsion(engine, section).plainGJ / 26_900
const J = (engine: Engine, section: OpenSection): number => torsion(engine, section).J ?? Number.NaN
const response = (engine: Engine) => given(engine.respondToTorque(uncorrected(engine, twoMaterials), engine.toEngine(20, 'N·m')))
const wallOf = <W extends { id: string }>(walls: readonly W[], id: string): W => {
  const wall = walls.find(one => one.id === id)
  if (!wall) throw new Error(`No wall ${id}`)
  return wall
}
const twist20 = 'walls 40×2, 60×3 (G 26 900), 40×2.5 (G 43 000 MPa), T 20 N·m'

const stiffness: ReferenceRow[] = [
  row('C-38', 'channel J, centre-line', 'b 40, h 100, tf 4, tw 3 mm', 2606.66666666667, 'mm⁴', rel(1e-12), thin, e => plainJ(e, channel)),
  row('C-39', 'ΣGJ, two materials', twist20, 26_353_666.6666667, 'N·mm²', rel(1e-12), thin, e => torsion(e, twoMaterials).plainGJ),
  row('C-40', 'rate of twist', twist20, 0.000758907678880864, 'rad/mm', rel(1e-12), thin, e => response(e).rate),
  row('§1.9', 'stress in the 40×2 wall', twist20, 40.8292, 'MPa', rel(2e-6), thin, e => wallOf(response(e).perWall, 'w0').tau),
  row('§1.9', 'stress in the 60×3 wall', twist20, 61.2438, 'MPa', rel(2e-6), thin, e => wallOf(response(e).perWall, 'w1').tau),
  row('C-41', 'stress in the 40×2.5 wall, the peak', twist20, 81.5825754796929, 'MPa', rel(1e-12), thin, e => response(e).tauMax),
  row('C-42', 'torque share of the 60×3 wall', twist20, 0.551194647171172, '', rel(1e-12), thin, e => wallOf(response(e).perWall, 'w1').torque / 20_000),
  row('C-43', 'one wall with two free ends', 'L 30, t 3 mm', 252.983280340336, 'mm⁴', rel(2e-7), 'exact series of Saint-Venant', e => J(e, strip30x3)),
  row('C-44', 'machined angle J', 'legs 10 outside, t 1, fillet 0.5, sharp outer corner', 6.34623047007496, 'mm⁴', rel(1e-9), junction, e => J(e, machinedAngle)),
  row('C-46', 'machined tee J', 'flange 14×1, stem to 10 overall ×1, fillets 0.5', 8.01181666666667, 'mm⁴', rel(1e-9), junction, e => J(e, machinedTee)),
  row('§1.10', 'slit tube J', 'R 50, t 2 mm', 837.758, 'mm⁴', rel(1e-6), thin, e => e.wallStiffness({ G: 1, thickness: [2, 2], developed: 100 * Math.PI, effective: 100 * Math.PI, ends: [], junctions: false }).plainGJ),
  row('C-120', 'J of a tapering wall', 'L 40, t 2 → 3 mm', 216.666666666667, 'mm⁴', rel(1e-12), 'L/12 (t₁+t₂)(t₁²+t₂²), algebra', e => plainJ(e, taperedStrip)),
  row('C-92', 'stress from an imposed rate of twist', 'θ′ 4e-5 rad/mm, t 3 mm, G 26 900 MPa', 3.228, 'MPa', rel(1e-12), 'τ = G t θ′', e => e.faceStress(26_900, 3, 4e-5)),
  row('§6', 'torque from an imposed rate of twist', 'channel C-38, θ′ 4e-5 rad/mm', 2804.773333, 'N·mm', rel(2e-10), 'T = GJ θ′', e => given(e.respondToRate(uncorrected(e, channel), 4e-5)).torque),
]

/** The table as printed, against which a slip in copying would show. */
const table: readonly (readonly [number, number])[] = [
  [0.05, 2.6856], [0.1, 2.1745], [0.125, 2.0402], [0.15, 1.941], [0.2, 1.8036], [0.25, 1.7131],
  [0.3, 1.6498], [0.5, 1.526], [0.75, 1.4893], [1, 1.5011], [1.5, 1.5807], [2, 1.6908],
]
const corners: ReferenceRow[] = [
  ...table.map(([ratio, K]) => row('§1.10', 'machined corner factor', `equal walls, right angle, r/t ${ratio}`, K, '', rel(1e-12), cornerElements, e => e.machinedFactor(ratio) ?? Number.NaN)),
  row('C-47', 'machined corner factor of the angle C-44', 'r/t 0.5', 1.52603, '', rel(1e-3), cornerElements, (e) => {
    const factor = e.cornerFactor(machinedAngle, '1')
    return factor.ok ? factor.K : Number.NaN
  }),
  ...([[0.25, 1.710], [0.5, 1.524], [1, 1.501]] as const).map(([ratio, K]) =>
    row('§1.10', 'machined corner factor', `r/t ${ratio}`, K, '', rel(2e-3), 'finite elements on an exactly mapped outline, extrapolated', e => e.machinedFactor(ratio) ?? Number.NaN)),
  row('C-49', 'bend factor', 'ri/t 0.5', 1.32047845325367, '', rel(1e-12), 'exact for a long circular strip', e => e.bendFactor(0.5, 1) ?? Number.NaN),
  row('C-49', 'bend factor of a section', 'bent angle, ri/t 0.5', 1.32047845325367, '', rel(1e-12), 'exact for a long circular strip', e => given(e.cornerFactor(bentAngle, '1')).K),
  row('§1.10', 'strip factor of an arc wall', 'mid-line radius 1, t 1 mm', 1.32047845325367, '', rel(1e-12), 'exact for a long circular strip', e => given(e.stripFactor({ radius: 1, t: 1 })).K),
]

const strip = { b: 60, t: 2, E: 71_000, G: 26_900 }
const stripEffect = (engine: Engine) => given(engine.wagner(engine.stripAsWagner(strip, 0.002)))
const largeTwist: ReferenceRow[] = [
  row('C-98', 'large-twist ratio of a strip', '60×2, θ′ 0.002 rad/mm, E 71 000, G 26 900 MPa', 0.285055762081784, '', rel(1e-10), 'E b⁴θ′²/(120 G t²)', e => stripEffect(e).ratio),
  row('§7.7', 'edge stress of that strip', 'as C-98', 85.2, 'MPa', rel(1e-10), 'E b²θ′²/12', e => stripEffect(e).edgeStress),
  row('§7.7', 'axis stress of that strip', 'as C-98', -42.6, 'MPa', rel(1e-10), '−E b²θ′²/24', e => stripEffect(e).axisStress),
  row('§7.7', 'rate of twist at 2 %', 'strip 60×2', 5.2976e-4, 'rad/mm', rel(1e-5), 'algebra', e => e.stripRateLimit(strip)),
  row('C-99', 'I-section In', 'flanges 60×5, web 120×4', 2_540_160_000, 'mm⁶', rel(1e-10), '∫ρ⁴dA − (∫ρ²dA)²/A, Gauss integration', e => given(e.sectorialProperties(doublySymmetricI)).In),
  row('§3.6', 'channel In', 'C-38', 1.605346157e9, 'mm⁶', rel(1e-9), 'Gauss integration', e => given(e.sectorialProperties(channel)).In),
  row('C-119', 'large-twist ratio of the channel', 'C-38, T 10 N·m', 0.016530413244257, '', rel(1e-9), 'E In θ′²/(2GJ)', (e) => {
    const plain = uncorrected(e, channel)
    const { In, Ips, A, rhoMax } = given(e.sectorialProperties(channel))
    return given(e.wagner({ E: 71_000, GJ: plain.GJ, In, Ips, A, rhoMax, rate: given(e.respondToTorque(plain, 10_000)).rate })).ratio
  }),
]

const ms = (engine: Engine, allowable: number, applied: number): number => {
  const reserve = given(engine.reserveFactor(allowable, applied))
  return reserve.ms ?? Number.NaN
}
const action = (engine: Engine, special: number, specialAtLimit: boolean) =>
  engine.factorAction(tubeStress, 'limit', { safety: 1.5, special: engine.specialFactor({ fitting: special }).value, specialAtLimit }) as { limit: number, ultimate: number }
const yieldOf = (engine: Engine): number => engine.shearAllowables({ Fsu: 317, Fsy: null, Fty: 469 }, 1).yield ?? Number.NaN
const points = [{ temperature: 20, factor: 1 }, { temperature: 120, factor: 0.8 }]
const caseB = (engine: Engine): number =>
  ms(engine, 317 * given(engine.knockDownAt(points, 70)).factor, action(engine, 1, false).ultimate * 820 / 900)

const margins: ReferenceRow[] = [
  row('C-116', 'ultimate margin with a fitting', 'τ 62.1092 MPa at limit, 1.5 × 1.15, Fsu 317', 1.95878838541352, '', rel(1e-10), definition, e => ms(e, 317, action(e, 1.15, true).ultimate)),
  row('§7.3', 'yield margin, special factor not at limit', 'τ 62.1092 MPa, Fty 469', 3.35969349686, '', rel(1e-11), definition, e => ms(e, yieldOf(e), action(e, 1.15, false).limit)),
  row('§7.3', 'yield margin, special factor at limit', 'τ 62.1092 MPa, Fty 469', 2.79103782335, '', rel(1e-11), definition, e => ms(e, yieldOf(e), action(e, 1.15, true).limit)),
  row('§8', 'margin of case A', '900 N·m, 1.5, Fsu 317', 2.40260664323, '', rel(1e-11), definition, e => ms(e, 317, action(e, 1, false).ultimate)),
  row('C-117', 'margin of case B, which governs', '820 N·m, knock-down 0.90 between two points, Fsu 317', 2.36111144025938, '', rel(1e-10), definition, caseB),
  row('§7.2', 'shear yield from tension yield', 'Fty 1000 MPa', 577.35, 'MPa', rel(1e-6), 'von Mises', e => e.shearYieldFromTension(1000)),
  row('C-97', 'margin shown', 'MS 0.1999', 0.19, '', abs(1e-15), 'rule of §10', e => Number(e.showMargin(0.1999))),
  row('C-96', 'margin shown', 'MS −0.0001', -0.01, '', abs(1e-15), 'rule of §10', e => Number(e.showMargin(-0.0001).replace('\u2212', '-'))),
]

export const torsionRows: readonly ReferenceRow[] = [...stiffness, ...corners, ...largeTwist, ...margins]
