/**
 * Sections and cases computed by an independent reference program (thin-wall
 * mid-line with bends), given to six significant figures, margins in full.
 */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { OpenSection } from '#shared/torsion/section'
import { given } from './engine'
import { rel, row } from './row'
import { hat, inchAngle, lippedChannel, rail } from './sections'

const source = 'independent reference program'
/** Half a unit of the sixth figure. */
const six = rel(5e-6)
const torsion = (engine: Engine, section: OpenSection) => given(engine.torsionOfOpenSection(section))
const properties = (engine: Engine, section: OpenSection) => given(engine.sectorialProperties(section))
const J = (engine: Engine, section: OpenSection): number => torsion(engine, section).J ?? Number.NaN
const bendFactorOf = (engine: Engine, section: OpenSection): number => given(engine.cornerFactor(section, '1')).K
const ms = (engine: Engine, allowable: number, applied: number): number => given(engine.reserveFactor(allowable, applied)).ms ?? Number.NaN

const hatInputs = 'hat, 1.6 mm sheet, brims 15, webs 30 deep leaning 6, crown 28, inside radius 3.2 mm'
const followed = (engine: Engine, degreesPerMetre: number) => given(engine.respondToRate(torsion(engine, hat), engine.toEngine(degreesPerMetre, '°/m')))
const hatCorner = (engine: Engine, degreesPerMetre: number): number => followed(engine, degreesPerMetre).tauMax * bendFactorOf(engine, hat)
const hatRows: ReferenceRow[] = [
  row('hat', 'J before the end correction', hatInputs, 156.916, 'mm⁴', six, source, e => torsion(e, hat).plainGJ / 27_600),
  row('hat', 'J', hatInputs, 155.539, 'mm⁴', six, source, e => J(e, hat)),
  row('hat', 'A', hatInputs, 183.886, 'mm²', six, source, e => properties(e, hat).A),
  row('hat', 'centroid y', hatInputs, 14.739, 'mm', six, source, e => properties(e, hat).centroid.y),
  row('hat', 'shear centre y', hatInputs, 38.4475, 'mm', six, source, e => properties(e, hat).shearCentre.y),
  row('hat', 'Γ', hatInputs, 2_753_560, 'mm⁶', six, source, e => properties(e, hat).gamma),
  row('hat', 'ω max', hatInputs, 325.663, 'mm²', six, source, e => properties(e, hat).omegaMax),
  row('hat', 'developed length', hatInputs, 114.929, 'mm', six, source, e => torsion(e, hat).developed),
  row('hat', 'bend factor', hatInputs, 1.08288, '', six, source, e => bendFactorOf(e, hat)),
  row('hat', 'torque at 2.45 °/m', hatInputs, 183.566, 'N·mm', six, source, e => followed(e, 2.45).torque),
  row('hat', 'torque at 2.93 °/m', hatInputs, 219.53, 'N·mm', rel(2.5e-5), source, e => followed(e, 2.93).torque),
  row('hat', 'face stress at 2.93 °/m', hatInputs, 2.25826, 'MPa', six, source, e => followed(e, 2.93).tauMax),
  row('hat', 'stress in the bend at 2.45 °/m', hatInputs, 2.04481, 'MPa', six, source, e => hatCorner(e, 2.45)),
  row('hat', 'stress in the bend at 2.93 °/m', hatInputs, 2.44542, 'MPa', six, source, e => hatCorner(e, 2.93)),
  row('hat', 'GJ over that of the flap box', `${hatInputs}, box 9.1e9 N·mm²`, 0.000471746, '', six, source, e => torsion(e, hat).GJ / 9.1e9),
  row('hat', 'ultimate margin in shear', '2.93 °/m, factor 1.5, Fsu 269 MPa', 72.33425850455178, '', rel(1e-6), source, e => ms(e, 269, 1.5 * hatCorner(e, 2.93))),
  row('hat', 'yield margin in shear', '2.93 °/m, Fty 324 MPa', 75.49450999916112, '', rel(1e-6), source, e => ms(e, e.shearYieldFromTension(324), hatCorner(e, 2.93))),
]

const lipInputs = 'lipped channel, 2.5 mm sheet, web 80, flanges 40, lips 16, inside radius 5 mm'
const sheet = lippedChannel(2.5)
const turned = (engine: Engine, torque: number, section = sheet) => given(engine.respondToTorque(torsion(engine, section), engine.toEngine(torque, 'lbf·in')))
const twistMargin = (engine: Engine, torque: number, section = sheet): number => ms(engine, engine.toEngine(1.5, '°'), 410 * turned(engine, torque, section).rate)
const lipCorner = (engine: Engine): number => turned(engine, 15.9).tauMax * bendFactorOf(engine, sheet)
const lipRows: ReferenceRow[] = [
  row('lipped channel', 'J before the end correction', lipInputs, 944.114, 'mm⁴', six, source, e => torsion(e, sheet).plainGJ / 26_200),
  row('lipped channel', 'J', lipInputs, 935.908, 'mm⁴', six, source, e => J(e, sheet)),
  row('lipped channel', 'shear centre x', lipInputs, -21.895, 'mm', six, source, e => properties(e, sheet).shearCentre.x),
  row('lipped channel', 'Γ', lipInputs, 196_413_000, 'mm⁶', six, source, e => properties(e, sheet).gamma),
  row('lipped channel', 'bend factor', lipInputs, 1.08288, '', six, source, e => bendFactorOf(e, sheet)),
  row('lipped channel', 'torque of 15.9 lbf·in', '', 1796.46, 'N·mm', six, source, e => turned(e, 15.9).torque),
  row('lipped channel', 'rate of twist', '15.9 lbf·in', 7.32627e-5, 'rad/mm', six, source, e => turned(e, 15.9).rate),
  row('lipped channel', 'twist over 410 mm', '15.9 lbf·in', 0.0300377, 'rad', six, source, e => 410 * turned(e, 15.9).rate),
  row('lipped channel', 'twist over 410 mm', '15.9 lbf·in', 1.72103, '°', six, source, e => e.fromEngine(410 * turned(e, 15.9).rate, '°')),
  row('lipped channel', 'twist over 410 mm', '14.3 lbf·in', 1.54785, '°', six, source, e => e.fromEngine(410 * turned(e, 14.3).rate, '°')),
  row('lipped channel', 'stress in the bend', '15.9 lbf·in', 5.19642, 'MPa', six, source, lipCorner),
  row('lipped channel', 'large-twist ratio', '15.9 lbf·in', 0.00892741, '', rel(2e-5), `${source}, bends in chords`, (e) => {
    const { In, Ips, A, rhoMax } = properties(e, sheet)
    return given(e.wagner({ E: 68_300, GJ: torsion(e, sheet).GJ, In, Ips, A, rhoMax, rate: turned(e, 15.9).rate })).ratio
  }),
  row('lipped channel', 'twist margin', '15.9 lbf·in, 1.50° over 410 mm', -0.12843086349701216, '', rel(1e-6), source, e => twistMargin(e, 15.9)),
  row('lipped channel', 'twist margin', '14.3 lbf·in, 1.50° over 410 mm', -0.030912638433740813, '', rel(5e-6), source, e => twistMargin(e, 14.3)),
  row('lipped channel', 'twist margin', '12.6 lbf·in, 1.50° over 410 mm', 0.09983724368234181, '', rel(2e-6), source, e => twistMargin(e, 12.6)),
  row('lipped channel', 'torque at 1.50° over 410 mm', lipInputs, 1565.74, 'N·mm', six, source, e => given(e.respondToRate(torsion(e, sheet), e.toEngine(1.5, '°') / 410)).torque),
  row('lipped channel', 'ultimate margin in shear', '15.9 lbf·in, factor 1.5, Fsu 186 MPa', 22.862579865524808, '', rel(1e-6), source, e => ms(e, 186, 1.5 * lipCorner(e))),
  row('lipped channel', 'yield margin in shear', '15.9 lbf·in, Fty 241 MPa', 25.776396169755206, '', rel(1e-6), source, e => ms(e, e.shearYieldFromTension(241), lipCorner(e))),
  row('lipped channel', 'J of 3.0 mm sheet, walls and inside radius held', lipInputs, 1610.55, 'mm⁴', six, source, e => J(e, lippedChannel(3))),
  row('lipped channel', 'twist margin of 2.8 mm sheet, walls and inside radius held', '15.9 lbf·in', 0.2214486360233039, '', rel(1e-6), source, e => twistMargin(e, 15.9, lippedChannel(2.8))),
  row('lipped channel', 'twist margin of 3.0 mm sheet, walls and inside radius held', '15.9 lbf·in', 0.49983303172781723, '', rel(1e-6), source, e => twistMargin(e, 15.9, lippedChannel(3))),
  row('lipped channel', 'kL over 410 mm', lipInputs, 0.554314, '', six, source, e => 410 / (e.characteristicLength(68_300, properties(e, sheet).gamma, torsion(e, sheet).GJ) ?? Number.NaN)),
]

const railInputs = 'channel rail, flanges 60×6, web 140×5 mm, sharp mid-line'
const railRows: ReferenceRow[] = [
  row('rail', 'J', railInputs, 14_473.3, 'mm⁴', six, source, e => torsion(e, rail).plainGJ / 80_800),
  row('rail', 'Γ', railInputs, 1_835_550_000, 'mm⁶', six, source, e => properties(e, rail).gamma),
  row('rail', 'shear centre x', railInputs, -22.6573, 'mm', six, source, e => properties(e, rail).shearCentre.x),
  row('rail', 'ω at the tip', railInputs, 2613.99, 'mm²', six, source, e => properties(e, rail).omegaMax),
  row('rail', 'ω at the corner', railInputs, 1586.01, 'mm²', six, source, e => Math.abs(properties(e, rail).omegaAt['1'] ?? Number.NaN)),
  row('rail', 'A', railInputs, 1420, 'mm²', six, source, e => properties(e, rail).A),
  row('rail', 'characteristic length', railInputs, 574.12, 'mm', rel(1e-5), source, e => e.characteristicLength(210_000, properties(e, rail).gamma, torsion(e, rail).plainGJ) ?? Number.NaN),
]

const angleInputs = 'machined angle, outside 2.00 × 1.55 in, t 0.250, fillet 0.190 in'
const inch4 = (engine: Engine, value: number): number => engine.fromEngine(value / 26_900, 'in⁴')
const angleRows: ReferenceRow[] = [
  row('inch angle', 'J', angleInputs, 0.0178184, 'in⁴', six, source, e => inch4(e, torsion(e, inchAngle).GJ)),
  row('inch angle', 'J before corrections', angleInputs, 0.0171875, 'in⁴', six, source, e => inch4(e, torsion(e, inchAngle).plainGJ)),
  row('inch angle', 'junction bulge', angleInputs, 0.00186138, 'in⁴', six, source, e => inch4(e, torsion(e, inchAngle).bulgeTerm)),
  row('inch angle', 'three ends', angleInputs, -0.00123047, 'in⁴', six, source, e => inch4(e, torsion(e, inchAngle).endTerm)),
  row('inch angle', 'share of the corrections', angleInputs, 0.17352, '', rel(3e-5), source, e => torsion(e, inchAngle).correctionShare),
  row('inch angle', 'corner factor by chords of the table', 'r/t 0.76', 1.48977, '', rel(5e-6), source, e => given(e.cornerFactor(inchAngle, '1')).K),
]

export const programRows: readonly ReferenceRow[] = [...hatRows, ...lipRows, ...railRows, ...angleRows]
