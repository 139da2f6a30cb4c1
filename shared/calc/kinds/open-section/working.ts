/** The derivation with the numbers put in: from the load through J, the rate of twist and the stress to the margin. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import { thicknessAlong } from '#shared/calc/parts/wall-model'
import type { Measured } from '#shared/calc/parts/model'
import { sub, line, num, qty, res, sym } from '#shared/calc/parts/tex'
import type { Solution } from '#shared/calc/kinds/open-section/solution'
import { caseSteps, decisiveCases } from '#shared/calc/kinds/open-section/working-cases'
import { marginSteps } from '#shared/calc/kinds/open-section/working-margins'
import { profileSteps } from '#shared/calc/kinds/open-section/working-profile'
import { sectionSteps } from '#shared/calc/kinds/open-section/working-section'
import { engineUnit, type Dimension } from '#shared/units/units'

export function openSectionWorking(s: Solution): WorkingStep[] {
  return [...conversions(s), ...profileSteps(s.model.profile), ...sectionSteps(s), ...sectorial(s), ...caseSteps(s), ...marginSteps(s)].filter(step => step.lines.length > 0)
}

/** What was typed in other units, as the working uses it. */
function conversions(s: Solution): WorkingStep[] {
  const { model } = s
  const from = (symbol: string, m: Measured | null, dimension: Dimension): WorkingLine[] => {
    const unit = engineUnit(dimension)
    return m === null || m.unit === unit ? [] : [line(symbol, res(m.value, m.unit), res(m.value, unit))]
  }
  const materials = model.materials.flatMap(m => [
    ...from(sym('G', m.id), { value: m.G, unit: m.units.G, typed: '' }, 'stress'),
    ...from(sym('E', m.id), m.E === null ? null : { value: m.E, unit: m.units.E, typed: '' }, 'stress'),
    ...(['Fsu', 'Fty'] as const).flatMap(name => from(`F_{${name.slice(1)},${sub(m.id)}}`, m[name] === null ? null : { value: m[name] ?? 0, unit: m.units.strength, typed: '' }, 'stress')),
  ])
  const cases = decisiveCases(s).flatMap(c => [
    ...from(sym('T', c.model.id), c.model.torque, 'torque'),
    ...from(sym('\\theta\'', c.model.id), c.model.rate, 'rateOfTwist'),
  ])
  return [{
    heading: 'Typed values in N, mm, MPa and rad', method: '§10',
    lines: [
      ...(model.profile?.dimensions ?? []).flatMap(({ symbol, measured, angle }) => from(symbol, measured, angle ? 'angle' : 'length')),
      ...(model.profile ? [] : model.walls).flatMap(w => [...from(sym('t', w.tEnd ? `1,${w.id}` : w.id), w.t, 'length'), ...from(sym('t', `2,${w.id}`), w.tEnd, 'length')]),
      ...(model.profile ? [] : model.junctions).flatMap(j => from(sym('r', j.node), j.radius, 'length')),
      ...from('L', model.length, 'length'), ...from('\\varphi_a', model.twistAllowed, 'angle'), ...materials, ...cases,
    ],
  }]
}

/** Area, centroid, shear centre, warping constant. They are integrals along the mid-line with its bends. */
function sectorial(s: Solution): WorkingStep[] {
  const p = s.sectorial
  if (!p) return []
  const by = '\\text{along the mid-line}'
  const area = s.walls.map(w => `${num(w.developed)}\\cdot ${num(thicknessAlong(w.wall, 0.5))}`)
  const gamma = p.GammaSecondary > 0
    ? line('\\Gamma = \\Gamma_1 + \\int \\frac{t^2}{12}\\rho^2\\,\\mathrm{d}A', `${num(p.GammaPrimary)} + ${num(p.GammaSecondary)}`, res(p.Gamma, 'mm⁶'))
    : line('\\Gamma = \\int \\omega^2\\,\\mathrm{d}A', by, res(p.Gamma, 'mm⁶'))
  return [{
    heading: 'Area, centroid, shear centre and warping constant', method: '§3.1',
    lines: [
      line('A = \\sum_i L_i t_i', area.length > 12 ? by : area.join(' + '), res(p.A, 'mm²')),
      line('x_C,\\ y_C', by, `${res(p.centroid.x, 'mm')},\\ ${res(p.centroid.y, 'mm')}`),
      line('I_{xx},\\ I_{yy},\\ I_{xy}', by, `${res(p.Ixx, 'mm⁴')},\\ ${res(p.Iyy, 'mm⁴')},\\ ${res(p.Ixy, 'mm⁴')}`),
      line('x_S,\\ y_S', by, `${res(p.shearCentre.x, 'mm')},\\ ${res(p.shearCentre.y, 'mm')}`),
      gamma,
      ...decay(s),
    ],
  }]
}

function decay(s: Solution): WorkingLine[] {
  const p = s.sectorial
  if (!p || p.E === null || s.kL === null || !s.model.length) return []
  return [line('kL = L\\sqrt{\\frac{GJ}{E\\Gamma}}', `${qty(s.model.length.value, 'mm')}\\,\\sqrt{\\frac{${qty(s.GJ, 'N·mm²')}}{${qty(p.E, 'MPa')}\\cdot ${qty(p.Gamma, 'mm⁶')}}}`, num(s.kL))]
}
