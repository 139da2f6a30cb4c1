/** Everything a text may be tied to, under keys that stay the same when the calculation is edited. Values are in engine units. */
import type { CaseSolution, Solution, WagnerState } from '#shared/calc/kinds/general-outline/solution'
import type { LoadLevel, Output } from '#shared/calc/types'
import { caseLabel, factorOutputs, marginOutputs, materialOutputs, output, type Extra } from '#shared/calc/parts/output'
import { SINGLE_CASE } from '#shared/calc/parts/parse-loading'
import { shownUnits, type ShownUnits } from '#shared/calc/parts/shown-units'
import { sub } from '#shared/calc/parts/tex'
import type { Dimension, UnitId, UnitOf } from '#shared/units/units'

export const modulusUnit = ({ model }: Solution): UnitOf<'firstMoment'> => (model.units === 'SI' ? 'mm³' : 'in³')
const flowUnit = ({ model }: Solution): UnitOf<'shearFlow'> => (model.units === 'SI' ? 'N/mm' : 'lbf/in')

export function generalOutlineOutputs(s: Solution): Output[] {
  const units = shownUnits(s.model)
  return [
    ...torsionOutputs(s, units), ...areaOutputs(s, units), ...peakOutputs(s, units), ...materialOutputs([s.model.material]),
    ...s.cases.flatMap(c => caseOutputs(s, c, units)), ...envelope(s, units), ...marginOutputs(s.margins, s.governing),
  ]
}

function torsionOutputs(s: Solution, u: ShownUnits): Output[] {
  const { J, gamma } = s.torsion
  return [
    ...output('J', 'J', 'Torsion constant', J.value, 'inertia', u.inertia, '§4.1', { primary: true }),
    ...output('J_uncertainty', '\\delta_J', 'Uncertainty of the torsion constant', J.uncertainty / J.value, 'ratio', '%', '§4.2'),
    ...output('J_order', 'p_J', 'Observed order of the torsion constant', J.order, 'number', '', '§4.2'),
    ...output('GJ', 'GJ', 'Torsional stiffness', s.GJ, 'torsionalStiffness', u.stiffness, '§4.1'),
    ...output('Gamma', '\\Gamma', 'Warping constant', gamma?.value ?? null, 'warping', u.warping, '§4.1'),
    ...output('kL', 'kL', 'Decay parameter times length', s.kL, 'number', '', '§3.6'),
    ...output('length', 'L', 'Length of the bar', s.model.length?.value ?? null, 'length', s.model.length?.unit ?? u.length, '§5.1'),
    ...output('twist_allowed', '\\varphi_{a}', 'Twist allowed', s.model.twistAllowed?.value ?? null, 'angle', s.model.twistAllowed?.unit ?? '°', '§7.8'),
    ...factorOutputs(s.model.factors),
    ...s.compared.flatMap(({ quantity, agreement }) => output(`difference:${quantity}`, '\\Delta', `Difference of the first method, ${quantity}`, agreement.difference, 'ratio', '%', '§4.5')),
  ]
}

/** What symmetry makes zero and arithmetic leaves at 1e-9 of the section is shown as zero. */
const settled = (value: number, scale: number): number => (Math.abs(value) < 1e-9 * scale ? 0 : value)

export function centres(s: Solution): Record<'centroid' | 'shearCentre', { x: number, y: number }> {
  const settle = ({ x, y }: { x: number, y: number }) => ({ x: settled(x, s.size), y: settled(y, s.size) })
  return { centroid: settle(s.torsion.properties.centroid), shearCentre: settle(s.torsion.shearCentre) }
}

function areaOutputs(s: Solution, u: ShownUnits): Output[] {
  const { A, Ixx, Iyy, Ixy, Ip } = s.torsion.properties
  const { centroid, shearCentre } = centres(s)
  return [
    ...output('A', 'A', 'Area', A, 'area', u.area, '§4.1'),
    ...output('x_C', 'x_C', 'Centroid, x', centroid.x, 'length', u.length, '§4.1'),
    ...output('y_C', 'y_C', 'Centroid, y', centroid.y, 'length', u.length, '§4.1'),
    ...output('Ixx', 'I_{xx}', 'Second moment about the centroidal x axis', Ixx, 'inertia', u.inertia, '§4.1'),
    ...output('Iyy', 'I_{yy}', 'Second moment about the centroidal y axis', Iyy, 'inertia', u.inertia, '§4.1'),
    ...output('Ixy', 'I_{xy}', 'Product moment about the centroid', settled(Ixy, Ip), 'inertia', u.inertia, '§4.1'),
    ...output('x_S', 'x_S', 'Shear centre, x', shearCentre.x, 'length', u.length, '§4.1'),
    ...output('y_S', 'y_S', 'Shear centre, y', shearCentre.y, 'length', u.length, '§4.1'),
  ]
}

function peakOutputs(s: Solution, u: ShownUnits): Output[] {
  if (!s.peaks) return []
  const { estimate, first } = s.peaks
  return [
    ...output('W_T', 'W_T', 'Torsional modulus', s.W, 'firstMoment', modulusUnit(s), '§4.1'),
    ...output('tau_rate', '\\tau_{max}/G\\theta\'', 'Peak shear over Gθ′', estimate.value, 'length', u.length, '§4.1'),
    ...output('tau_uncertainty', '\\delta_\\tau', 'Uncertainty of the peak shear', estimate.uncertainty / estimate.value, 'ratio', '%', '§4.2'),
    ...output('tau_order', 'p_\\tau', 'Observed order of the peak shear', estimate.order, 'number', '', '§4.2'),
    ...output('x_peak', 'x_\\tau', `Place of the peak shear, x (${first.edge})`, settled(first.at.x, s.size), 'length', u.length, '§4.1'),
    ...output('y_peak', 'y_\\tau', `Place of the peak shear, y (${first.edge})`, settled(first.at.y, s.size), 'length', u.length, '§4.1'),
  ]
}

type OnCase = (key: string, symbol: string, label: string, value: number | null, dimension: Dimension, unit: UnitId, method: string, more?: Extra) => Output[]

function caseOutputs(s: Solution, c: CaseSolution, u: ShownUnits): Output[] {
  const id = c.model.id
  const of = caseLabel(s.cases.length, c.model, SINGLE_CASE)
  const alone = { primary: s.cases.length === 1 }
  const method = c.model.rate ? '§6' : '§4.1'
  const on: OnCase = (key, symbol, label, value, dimension, unit, section, more = {}) => output(`${key}@${id}`, symbol, `${label}${of}`, value, dimension, unit, section, { caseId: id, ...more })
  const { G } = s.model.material
  const outside = s.torsion.shear.bounded ? null : s.torsion.shear.outside
  return [
    ...on('T', 'T', 'Torque', c.torque, 'torque', c.model.torque?.unit ?? u.torque, c.model.rate ? '§6' : '§8', alone),
    ...on('theta', '\\theta\'', 'Rate of twist', c.rate, 'rateOfTwist', u.rate, method, alone),
    ...on('theta_deg', '\\theta\'', 'Rate of twist', c.rate, 'rateOfTwist', u.rateDegrees, method),
    ...on('twist', '\\varphi', 'Twist over the length', c.twist, 'angle', 'rad', '§5.1'),
    ...on('twist_deg', '\\varphi', 'Twist over the length', c.twist, 'angle', '°', '§5.1', alone),
    ...on('tau_max', '\\tau_{max}', 'Peak shear', c.tau, 'stress', u.stress, '§4.1'),
    ...on('tau_outside', '\\tau_{out}', 'Largest shear outside the discs at sharp vertices, no peak', outside ? G * Math.abs(c.rate) * outside.estimate.value : null, 'stress', u.stress, '§4.4'),
    ...s.model.holes.flatMap((hole, k) => on(`q:${hole}`, `q_{${sub(hole)}}`, `Shear flow round hole ${hole}`, G * c.rate * (s.torsion.holePhi[k] ?? Number.NaN), 'shearFlow', flowUnit(s), '§4.1')),
    ...wagnerOutputs(c.wagnerLimit, 'limit', '', on), ...wagnerOutputs(c.wagnerUltimate, 'ultimate', '_ultimate', on),
    ...c.knockdown === 1 ? [] : on('k', 'k', 'Knock-down on strength', c.knockdown, 'number', '', '§7.2'),
  ]
}

function wagnerOutputs(w: WagnerState | null, level: LoadLevel, suffix: string, on: OnCase): Output[] {
  if (!w) return []
  return [
    ...on(`wagner${suffix}`, 'r_W', `Wagner ratio at ${level}`, w.ratio, 'number', '', '§7.7'),
    ...on(`T_wagner${suffix}`, 'T_{nl}', `Torque with the Wagner term at ${level}`, w.torque, 'torque', 'N·mm', '§7.7'),
  ]
}

/** Largest of all cases, at the level each was given. */
function envelope(s: Solution, u: ShownUnits): Output[] {
  const worst = s.cases.reduce<CaseSolution | null>((top, c) => (c.tau !== null && c.tau > (top?.tau ?? -1) ? c : top), null)
  return worst ? output('tau_max', '\\tau_{max}', `Peak shear of all cases (${worst.model.id})`, worst.tau, 'stress', u.stress, '§4.1', { primary: true }) : []
}
