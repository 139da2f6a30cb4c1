/**
 * Everything a text may be tied to, under keys that stay the same when a calculation is edited:
 * `J`, `tau:a@L04` (wall a, case L04), `MS:twist@L04`, `Fsu:QM-107`. Values are in engine units.
 */
import type { LoadLevel, Output } from '#shared/calc/types'
import type { CaseSolution, Solution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import { caseLabel, factorOutputs, marginOutputs, materialOutputs, output, type Extra } from '#shared/calc/parts/output'
import { SINGLE_CASE } from '#shared/calc/parts/parse-loading'
import { shownUnits, type ShownUnits } from '#shared/calc/parts/shown-units'
import { sub } from '#shared/calc/parts/tex'
import type { Dimension, UnitId } from '#shared/units/units'

export function openSectionOutputs(s: Solution): Output[] {
  const units = shownUnits(s.model)
  return [
    ...sectionOutputs(s, units), ...sectorialOutputs(s, units), ...wallOutputs(s, units), ...cornerOutputs(s),
    ...materialOutputs(s.model.materials), ...s.cases.flatMap(c => caseOutputs(s, c, units)), ...envelope(s, units), ...marginOutputs(s.margins, s.governing),
  ]
}

function sectionOutputs(s: Solution, u: ShownUnits): Output[] {
  return [
    ...output('J', 'J', 'Torsion constant', s.J, 'inertia', u.inertia, '§1.9, §1.10', { primary: true }),
    ...output('J_plain', 'J_0', 'Torsion constant before end and junction terms', s.Jplain, 'inertia', u.inertia, '§1.9'),
    ...output('J_bulge', '\\Delta J_b', 'Junction bulges in J', s.bulge, 'inertia', u.inertia, '§1.10'),
    ...output('J_ends', '\\Delta J_e', 'Free-end terms in J', s.ends, 'inertia', u.inertia, '§1.9'),
    ...output('GJ', 'GJ', 'Torsional stiffness', s.GJ, 'torsionalStiffness', u.stiffness, '§1.9'),
    ...output('developed', 'L_d', 'Developed mid-line length', s.developed, 'length', u.length, '§1.9'),
    ...output('length', 'L', 'Length of the bar', s.model.length?.value ?? null, 'length', s.model.length?.unit ?? u.length, '§5.1'),
    ...output('twist_allowed', '\\varphi_{a}', 'Twist allowed', s.model.twistAllowed?.value ?? null, 'angle', s.model.twistAllowed?.unit ?? '°', '§7.8'),
    ...factorOutputs(s.model.factors),
  ]
}

function sectorialOutputs(s: Solution, u: ShownUnits): Output[] {
  const p = s.sectorial
  if (!p) return []
  const m = '§3.1'
  return [
    ...output('A', 'A', 'Area', p.A, 'area', u.area, m),
    ...output('x_C', 'x_C', 'Centroid, x', p.centroid.x, 'length', u.length, m),
    ...output('y_C', 'y_C', 'Centroid, y', p.centroid.y, 'length', u.length, m),
    ...output('Ixx', 'I_{xx}', 'Second moment about the centroidal x axis', p.Ixx, 'inertia', u.inertia, m),
    ...output('Iyy', 'I_{yy}', 'Second moment about the centroidal y axis', p.Iyy, 'inertia', u.inertia, m),
    ...output('Ixy', 'I_{xy}', 'Product moment about the centroid', p.Ixy, 'inertia', u.inertia, m),
    ...output('x_S', 'x_S', 'Shear centre, x', p.shearCentre.x, 'length', u.length, m),
    ...output('y_S', 'y_S', 'Shear centre, y', p.shearCentre.y, 'length', u.length, m),
    ...output('Gamma', '\\Gamma', 'Warping constant', p.Gamma, 'warping', u.warping, m),
    ...output('omega_max', '\\omega_{max}', 'Largest sectorial coordinate', p.omegaMax, 'sectorial', u.area, m),
    ...output('kL', 'kL', 'Decay parameter times length', s.kL, 'number', '', '§3.6'),
  ]
}

function wallOutputs(s: Solution, u: ShownUnits): Output[] {
  return s.walls.flatMap(({ wall, J, share, slenderness }) => [
    ...output(`t:${wall.id}`, `t_{${sub(wall.id)}}`, `Thickness, wall ${wall.id}`, wall.t.value, 'length', wall.t.unit, '§1.9', { wall: wall.id }),
    ...output(`tEnd:${wall.id}`, `t_{2,${sub(wall.id)}}`, `Thickness at its end, wall ${wall.id}`, wall.tEnd?.value ?? null, 'length', wall.t.unit, '§1.9', { wall: wall.id }),
    ...output(`L:${wall.id}`, `L_{${sub(wall.id)}}`, `Mid-line length between nodes, wall ${wall.id}`, wall.length, 'length', u.length, '§1.9', { wall: wall.id }),
    ...output(`J:${wall.id}`, `J_{${sub(wall.id)}}`, `Part of J, wall ${wall.id}`, J, 'inertia', u.inertia, '§1.9', { wall: wall.id }),
    ...output(`share:${wall.id}`, `T_{${sub(wall.id)}}/T`, `Torque share, wall ${wall.id}`, share, 'ratio', '%', '§1.9', { wall: wall.id }),
    ...output(`slenderness:${wall.id}`, `(L/t)_{${sub(wall.id)}}`, `Slenderness, wall ${wall.id}`, slenderness, 'number', '', '§1.9', { wall: wall.id }),
  ])
}

function cornerOutputs(s: Solution): Output[] {
  return s.corners.flatMap(c => c.factor.ok ? output(`Kc:${c.node}`, `K_{c,${sub(c.node)}}`, `Corner factor, node ${c.node}`, c.factor.K, 'number', '', '§1.10') : [])
}

/** A case whose values by wall are not given keeps what a text or another calculation takes of it. */
function caseOutputs(s: Solution, c: CaseSolution, u: ShownUnits): Output[] {
  const id = c.model.id
  const of = caseLabel(s.cases.length, c.model, SINGLE_CASE)
  const extra = { caseId: id }
  const torque = c.model.torque?.unit ?? u.torque
  const on = (key: string, symbol: string, label: string, value: number | null, dimension: Dimension, unit: UnitId, method: string, more: Extra = {}) =>
    output(`${key}@${id}`, symbol, `${label}${of}`, value, dimension, unit, method, { ...extra, ...more })
  const brief = [
    ...on('T', 'T', 'Torque', c.torque, 'torque', torque, s.model.by === 'rate' ? '§6' : '§8', { primary: s.cases.length === 1 }),
    ...on('theta', '\\theta\'', 'Rate of twist', c.rate, 'rateOfTwist', u.rate, s.model.by === 'rate' ? '§6' : '§1.9', { primary: s.cases.length === 1 }),
    ...on('twist_deg', '\\varphi', 'Twist over the length', c.twist, 'angle', '°', '§5.1', { primary: s.cases.length === 1 }),
    ...on('tau_max', '\\tau_{max}', 'Largest face stress', c.tauMax, 'stress', u.stress, '§1.9'),
    ...on('tau_corner', '\\tau_{c,max}', 'Largest corner stress', c.tauCorner, 'stress', u.stress, '§1.10'),
  ]
  if (!s.detailed.has(id)) return brief
  return [
    ...brief,
    ...on('theta_deg', '\\theta\'', 'Rate of twist', c.rate, 'rateOfTwist', u.rateDegrees, s.model.by === 'rate' ? '§6' : '§1.9'),
    ...on('twist', '\\varphi', 'Twist over the length', c.twist, 'angle', 'rad', '§5.1'),
    ...s.walls.flatMap(w => [
      ...on(`T:${w.wall.id}`, `T_{${sub(w.wall.id)}}`, `Torque in wall ${w.wall.id}`, c.torque * w.share, 'torque', torque, '§1.9', { wall: w.wall.id }),
      ...on(`tau:${w.wall.id}`, `\\tau_{${sub(w.wall.id)}}`, `Face stress, wall ${w.wall.id}`, c.tau.get(w.wall.id) ?? null, 'stress', u.stress, '§1.9', { wall: w.wall.id }),
    ]),
    ...c.corner.entries().flatMap(([node, tau]) => on(`tau_corner:${node}`, `\\tau_{${sub(node)}}`, `Corner stress, node ${node}`, tau, 'stress', u.stress, '§1.10')),
    ...wagnerOutputs(c.wagnerLimit, 'limit', '', on),
    ...wagnerOutputs(c.wagnerUltimate, 'ultimate', '_ultimate', on),
    ...[...c.knockdown].filter(([, k]) => k !== 1).flatMap(([material, k]) => on(`k:${material}`, 'k', `Knock-down on strength, ${material}`, k, 'number', '', '§7.2')),
  ]
}

type OnCase = (key: string, symbol: string, label: string, value: number | null, dimension: Dimension, unit: UnitId, method: string) => Output[]

function wagnerOutputs(w: WagnerState | null, level: LoadLevel, suffix: string, on: OnCase): Output[] {
  if (!w) return []
  return [
    ...on(`wagner${suffix}`, 'r_W', `Wagner ratio at ${level}`, w.ratio, 'number', '', '§7.7'),
    ...on(`T_wagner${suffix}`, 'T_{nl}', `Torque with the Wagner term at ${level}`, w.torque, 'torque', 'N·mm', '§7.7'),
  ]
}

/** Largest of all cases, at the level each was given. */
function envelope(s: Solution, u: ShownUnits): Output[] {
  const worst = s.cases.reduce<CaseSolution | null>((top, c) => top === null || c.tauMax > top.tauMax ? c : top, null)
  if (!worst) return []
  const corner = s.cases.reduce<CaseSolution | null>((top, c) => c.tauCorner !== null && c.tauCorner > (top?.tauCorner ?? -1) ? c : top, null)
  return [
    ...output('tau_max', '\\tau_{max}', `Largest face stress of all cases (${worst.model.id})`, worst.tauMax, 'stress', u.stress, '§1.9', { wall: worst.tauMaxWall, primary: true }),
    ...output('tau_corner', '\\tau_{c,max}', `Largest corner stress of all cases (${corner?.model.id ?? ''})`, corner?.tauCorner ?? null, 'stress', u.stress, '§1.10', { primary: true }),
  ]
}
