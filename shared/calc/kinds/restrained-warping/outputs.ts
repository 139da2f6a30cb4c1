/** Everything a text may be tied to: `Gamma`, `B_max@L04`, `sigma:a@L04`, `R:0@L04`. Values are in engine units. */
import type { Output } from '#shared/calc/types'
import type { WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import { factorOutputs, marginOutputs, materialOutputs, output } from '#shared/calc/parts/output'
import { shownUnits, type ShownUnits } from '#shared/calc/parts/shown-units'
import { settled } from '#shared/calc/kinds/restrained-warping/settled'
import { sub } from '#shared/calc/parts/tex'
import type { UnitOf } from '#shared/units/units'

/** Above this many values by wall and case, those by wall are given for the deciding cases only. */
const MOST_VALUES = 2000

export const bimomentUnit = (s: WarpingSolution): UnitOf<'bimoment'> => (s.model.units === 'SI' ? 'N·mm²' : 'lbf·in²')
export const torqueUnit = (s: WarpingSolution): UnitOf<'torque'> => (s.model.units === 'SI' ? 'N·m' : 'lbf·in')

export function restrainedWarpingOutputs(s: WarpingSolution): Output[] {
  const u = shownUnits(s.model)
  const few = s.cases.length * s.groups.length <= MOST_VALUES
  return [
    ...sectionOutputs(s, u), ...factorOutputs(s.model.factors), ...materialOutputs(s.section.model.materials),
    ...s.cases.flatMap(c => [...caseOutputs(s, c, u), ...(few || c.model.id === s.governing?.caseId ? wallOutputs(s, c, u) : [])]), ...marginOutputs(s.margins, s.governing),
  ]
}

function sectionOutputs(s: WarpingSolution, u: ShownUnits): Output[] {
  const { properties: p, fibres } = s.run
  const S = fibres.reduce((high, fibre) => Math.max(high, Math.abs(fibre.S)), 0)
  return [
    ...output('length', 'L', 'Length of the bar', s.model.length.value, 'length', s.model.length.unit, '§3.3'),
    ...output('twist_allowed', '\\varphi_{a}', 'Twist allowed', s.model.twistAllowed?.value, 'angle', s.model.twistAllowed?.unit ?? '°', '§7.8'),
    ...output('J', 'J', 'Torsion constant', s.section.J, 'inertia', u.inertia, '§1.9, §1.10', { primary: true }),
    ...output('GJ', 'GJ', 'Torsional stiffness', s.section.GJ, 'torsionalStiffness', u.stiffness, '§1.9'),
    ...output('A', 'A', 'Area', p.A, 'area', u.area, '§3.1'),
    ...output('x_S', 'x_S', 'Shear centre, x', s.section.sectorial?.shearCentre.x, 'length', u.length, '§3.1'),
    ...output('y_S', 'y_S', 'Shear centre, y', s.section.sectorial?.shearCentre.y, 'length', u.length, '§3.1'),
    ...output('Gamma', '\\Gamma', 'Warping constant', p.gamma, 'warping', u.warping, '§3.1', { primary: true }),
    ...output('Gamma_primary', '\\Gamma_1', 'Warping constant of the mid-line', p.gammaPrimary, 'warping', u.warping, '§3.1'),
    ...output('Gamma_secondary', '\\Gamma_2', 'Warping constant across the thickness', p.gammaSecondary, 'warping', u.warping, '§3.1'),
    ...output('omega_max', '\\omega_{max}', 'Largest sectorial coordinate', p.omegaMax, 'sectorial', u.area, '§3.1'),
    ...Object.entries(p.omegaAt).flatMap(([node, omega]) => output(`omega:${node}`, `\\omega_{${sub(node)}}`, `Sectorial coordinate, node ${node}`, settled(omega, p.omegaMax), 'sectorial', u.area, '§3.1')),
    ...output('S_max', 'S_{\\omega,max}', 'Largest statical moment of the sectorial coordinate', S, 'inertia', u.inertia, '§3.3'),
    ...output('k', 'k', 'Decay parameter', s.k, 'decay', s.model.units === 'SI' ? '1/mm' : '1/in', '§3.6'),
    ...output('characteristic', '1/k', 'Characteristic length', 1 / s.k, 'length', u.length, '§3.6'),
    ...output('kL', 'kL', 'Decay parameter times length', s.kL, 'number', '', '§3.6', { primary: true }),
  ]
}

function caseOutputs(s: WarpingSolution, c: WarpingCase, u: ShownUnits): Output[] {
  const [id, torque, bimoment] = [c.model.id, torqueUnit(s), bimomentUnit(s)]
  const of = `, case ${id}${c.model.level === 'ultimate' ? ', given at ultimate' : ''}`
  const extra = { caseId: id }
  const first = { ...extra, primary: s.cases.length === 1 }
  const { phi, rate, B, T } = c.peaks
  const most = (measure: 'sigma' | 'tau' | 'mises') => c.stress.reduce((high, one) => Math.max(high, one[measure].value), 0)
  return [
    ...output(`twist_max@${id}`, '\\varphi_{max}', `Largest twist${of}`, Math.abs(phi.phi), 'angle', '°', '§3.3', first),
    ...output(`z_twist@${id}`, 'z', `Station of the largest twist${of}`, phi.z, 'length', u.length, '§3.3', extra),
    ...output(`theta_max@${id}`, '\\theta\'_{max}', `Largest rate of twist${of}`, Math.abs(rate.rate), 'rateOfTwist', u.rate, '§3.3', extra),
    ...output(`B_max@${id}`, 'B_{max}', `Largest bimoment${of}`, Math.abs(B.B), 'bimoment', bimoment, '§3.3', first),
    ...output(`z_B@${id}`, 'z', `Station of the largest bimoment${of}`, B.z, 'length', u.length, '§3.3', extra),
    ...output(`T_max@${id}`, 'T_{max}', `Largest torque${of}`, Math.abs(T.T), 'torque', torque, '§3.3', extra),
    ...output(`sigma_max@${id}`, '\\sigma_{max}', `Largest normal stress${of}`, most('sigma'), 'stress', u.stress, '§3.3', first),
    ...output(`tau_max@${id}`, '\\tau_{max}', `Largest shear stress${of}`, most('tau'), 'stress', u.stress, '§3.3', first),
    ...output(`sigma_vm@${id}`, '\\sigma_{vm}', `Largest equivalent stress${of}`, most('mises'), 'stress', u.stress, '§7.4', extra),
    ...output(`sigma_axial@${id}`, '\\bar\\sigma', `Mean stress of the axial force${of}`, c.model.axial === 0 ? null : c.axialStress, 'stress', u.stress, '§7.4', extra),
    ...output(`GJ_eff@${id}`, 'GJ_{eff}', `Torsional stiffness under the compression at ultimate${of}`, c.compression > 0 && c.compression < 1 ? c.GJ : null, 'torsionalStiffness', u.stiffness, '§7.7', extra),
    ...output(`wagner@${id}`, 'r_W', `Wagner ratio at limit${of}`, c.wagnerLimit?.ratio, 'number', '', '§7.7', extra),
    ...output(`wagner_ultimate@${id}`, 'r_W', `Wagner ratio at ultimate${of}`, c.wagnerUltimate?.ratio, 'number', '', '§7.7', extra),
    ...c.response.reactions.flatMap(one => reactionOutputs(s, c, one, of)),
  ]
}

function reactionOutputs(s: WarpingSolution, c: WarpingCase, one: WarpingCase['response']['reactions'][number], of: string): Output[] {
  const support = s.model.supports.findIndex(({ z }) => s.cut.nodeAt(z) === one.node)
  const held = s.model.supports[support]
  const [key, extra] = [`${support + 1}@${c.model.id}`, { caseId: c.model.id }]
  return [
    ...output(`R:${key}`, `R_{${support + 1}}`, `Torque of support ${support + 1}${of}`, held?.twist === 'free' ? null : settled(one.torque, c.peaks.T.T), 'torque', torqueUnit(s), '§3.5', extra),
    ...output(`RB:${key}`, `R_{B,${support + 1}}`, `Bimoment of support ${support + 1}${of}`, held?.warping === 'free' ? null : settled(one.bimoment, c.peaks.B.B), 'bimoment', bimomentUnit(s), '§3.5', extra),
  ]
}

function wallOutputs(s: WarpingSolution, c: WarpingCase, u: ShownUnits): Output[] {
  const id = c.model.id
  return [
    ...s.groups.flatMap(({ id: group, wall, place }, i) => {
      const [key, extra, stress] = [group.replace(' ', '-'), { caseId: id, ...(wall === undefined ? {} : { wall }) }, c.stress[i]]
      return [
        ...output(`sigma:${key}@${id}`, `\\sigma_{${sub(key)}}`, `Largest normal stress, ${place}, case ${id}`, stress?.sigma.value, 'stress', u.stress, '§3.3', extra),
        ...output(`tau:${key}@${id}`, `\\tau_{${sub(key)}}`, `Largest shear stress, ${place}, case ${id}`, stress?.tau.value, 'stress', u.stress, '§3.3', extra),
        ...output(`vm:${key}@${id}`, `\\sigma_{vm,${sub(key)}}`, `Largest equivalent stress, ${place}, case ${id}`, stress?.mises.value, 'stress', u.stress, '§7.4', extra),
      ]
    }),
    ...s.corners.flatMap(({ node, place }, i) => output(`tau_corner:${node}@${id}`, `\\tau_{c,${sub(node)}}`, `Largest shear stress, ${place}, case ${id}`, c.corner[i], 'stress', u.stress, '§1.10', { caseId: id })),
  ]
}
