/** Reference rows of §3.1, §3.2, §3.6 and §3.7: shear centre, warping constant, sectorial coordinate. */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { OpenSection } from '#shared/torsion/section'
import { given } from './engine'
import { rel, row } from './row'
import { branched, channel, doublySymmetricI, machinedAngle, machinedTee, openArc, slitTube, unequalI, zed } from './sections'

const closed = 'closed form (Vlasov; Timoshenko & Gere), verified numerically'
const graphCode = 'independent graph program; moments of the unit shear flows give the same centre to 1e-14'
const of = (engine: Engine, section: OpenSection) => given(engine.sectorialProperties(section))
const omega = (engine: Engine, section: OpenSection, node: string): number => Math.abs(of(engine, section).omegaAt[node] ?? Number.NaN)
const channelInputs = 'b 40, h 100, tf 4, tw 3 mm'

const closedForms: ReferenceRow[] = [
  row('C-64', 'channel shear centre from the web', channelInputs, 15.2380952380952, 'mm', rel(1e-12), closed, e => -of(e, channel).shearCentre.x),
  row('C-65', 'channel Γ', channelInputs, 182_857_142.857143, 'mm⁶', rel(1e-10), closed, e => of(e, channel).gamma),
  row('C-66', 'channel ω at the flange tip', channelInputs, 1238.09523809524, 'mm²', rel(1e-10), closed, e => of(e, channel).omegaMax),
  row('§3.2', 'channel ω at the corner', channelInputs, 761.9047619, 'mm²', rel(1e-10), closed, e => omega(e, channel, '1')),
  row('C-67', 'I-section Γ', 'b 60, h 120, tf 5, tw 4 mm', 648_000_000, 'mm⁶', rel(1e-12), closed, e => of(e, doublySymmetricI).gamma),
  row('C-68', 'unequal I-section Γ', 'flanges 80×6 and 50×4, h 150, tw 4 mm', 806_270_996.640538, 'mm⁶', rel(1e-10), closed, e => of(e, unequalI).gamma),
  row('C-69', 'unequal I-section shear centre from the 80×6 flange', 'as C-68', 20.996640537514, 'mm', rel(1e-10), closed, e => of(e, unequalI).shearCentre.y),
  row('C-70', 'Z-section Γ', 'b 35, h 80, tf 3, tw 2.5 mm', 84_495_121.9512195, 'mm⁶', rel(1e-10), closed, e => of(e, zed).gamma),
  row('C-71', 'slit tube shear centre from its centre', 'R 50, t 2 mm', 100, 'mm', rel(1e-12), closed, e => -of(e, slitTube).shearCentre.x),
  row('C-72', 'slit tube Γ', 'R 50, t 2 mm', 5_065_300_316.15044, 'mm⁶', rel(1e-10), closed, e => of(e, slitTube).gamma),
  row('§3.2', 'arc shear centre from its centre', 'half angle 60°, R 40, t 1.5 mm', 44.60241942782794, 'mm', rel(1e-10), closed, e => of(e, openArc).shearCentre.x),
  row('§3.2', 'arc Γ', 'half angle 60°, R 40, t 1.5 mm', 297_104.4626176179, 'mm⁶', rel(1e-10), closed, e => of(e, openArc).gamma),
  row('§3.1', 'secondary Γ of an angle', 'mid-line legs 9.5, t 1 mm', 47.63194444444444, 'mm⁶', rel(1e-12), 't³(b₁³ + b₂³)/36 (Timoshenko; Bleich, from memory)', e => of(e, machinedAngle).gamma),
  row('§3.1', 'secondary Γ of a tee', 'flange 14×1, stem 9.5×1 mm', 42.87152777777778, 'mm⁶', rel(1e-12), 'b³t³/144 + h³t³/36 (Timoshenko; Bleich, from memory)', e => of(e, machinedTee).gamma),
  row('C-76', 'characteristic length', 'C-38, E 71 000, G 26 900 MPa', 430.294950823973, 'mm', rel(1e-10), 'Vlasov', e =>
    e.characteristicLength(71_000, of(e, channel).gamma, given(e.torsionOfOpenSection(channel)).plainGJ) ?? Number.NaN),
]

const nodeOmegas = [885.56907, -510.49337, 413.9404, -259.28886, -1240.3973, -818.63796, 1430.45583]
const example = 'nodes and walls of §3.7'
const branches: ReferenceRow[] = [
  row('§3.7', 'branched section A', example, 334, 'mm²', rel(1e-12), graphCode, e => of(e, branched).A),
  row('§3.7', 'branched section centroid x', example, 16.8263473, 'mm', rel(1e-8), graphCode, e => of(e, branched).centroid.x),
  row('§3.7', 'branched section centroid y', example, 30.2964072, 'mm', rel(1e-8), graphCode, e => of(e, branched).centroid.y),
  row('§3.7', 'branched section Ixx', example, 249_832.65569, 'mm⁴', rel(1e-10), graphCode, e => of(e, branched).Ixx),
  row('§3.7', 'branched section Iyy', example, 103_369.26148, 'mm⁴', rel(1e-10), graphCode, e => of(e, branched).Iyy),
  row('§3.7', 'branched section Ixy', example, 62_804.19162, 'mm⁴', rel(1e-10), graphCode, e => of(e, branched).Ixy),
  row('C-73', 'branched section shear centre x', example, -15.4072294969334, 'mm', rel(1e-10), graphCode, e => of(e, branched).shearCentre.x),
  row('C-74', 'branched section shear centre y', example, 46.5354148567611, 'mm', rel(1e-10), graphCode, e => of(e, branched).shearCentre.y),
  row('C-75', 'branched section Γ', example, 88_387_988.9204388, 'mm⁶', rel(1e-10), graphCode, e => of(e, branched).gamma),
  row('§3.7', 'branched section J', example, 375.333333, 'mm⁴', rel(1e-8), graphCode, e => given(e.torsionOfOpenSection(branched)).plainGJ / 26_900),
  // The sign of ω depends on the walk, so magnitudes are compared; the property tests hold the signs together.
  ...nodeOmegas.map((value, node) => row('§3.7', `branched section ω at node ${node}`, example, Math.abs(value), 'mm²', rel(1e-7), graphCode, e => omega(e, branched, String(node)))),
]

export const sectorialRows: readonly ReferenceRow[] = [...closedForms, ...branches]
