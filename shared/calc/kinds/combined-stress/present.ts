/** Outputs, table, guards and working of combined stress. */
import { declaredGuards } from '#shared/calc/guards/declared'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards } from '#shared/calc/guards/fatigue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import type { CombinedSolution, CombinedState, Rule } from '#shared/calc/kinds/combined-stress/solve'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines } from '#shared/calc/parts/margin-working'
import { factorOutputs, marginOutputs, materialOutputs, output } from '#shared/calc/parts/output'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { knockdownOf } from '#shared/calc/parts/strength'
import { line, num, qty, res } from '#shared/calc/parts/tex'
import type { Guard, Output, ResultTable, WorkingLine, WorkingStep } from '#shared/calc/types'
import { showMargin } from '#shared/units/display'

export function combinedOutputs(s: CombinedSolution): Output[] {
  const u = shownUnits(s.model)
  return [
    ...factorOutputs(s.model.factors), ...materialOutputs(s.model.materials),
    ...s.states.flatMap(({ point, sigma, tau, equivalent, ratios }) => {
      const extra = { caseId: point.id, primary: s.states.length === 1 }
      return [
        ...output(`sigma@${point.id}`, '\\sigma', `Normal stress, point ${point.id}`, sigma, 'stress', u.stress, '§7.4', extra),
        ...output(`tau@${point.id}`, '\\tau', `Shear stress, point ${point.id}`, tau, 'stress', u.stress, '§7.4', extra),
        ...output(`sigma_eq@${point.id}`, '\\sigma_{eq}', `Equivalent stress, point ${point.id}`, equivalent, 'stress', u.stress, '§7.4', extra),
        ...output(`Rn@${point.id}`, 'R_n', `Normal ratio at ultimate, point ${point.id}`, ratios?.Rn, 'ratio', '', '§7.4', { caseId: point.id }),
        ...output(`Rs@${point.id}`, 'R_s', `Shear ratio at ultimate, point ${point.id}`, ratios?.Rs, 'ratio', '', '§7.4', { caseId: point.id }),
      ]
    }),
    ...marginOutputs(s.rows, s.governing),
  ]
}

export function combinedTable(s: CombinedSolution): ResultTable {
  const u = shownUnits(s.model)
  const least = new Map<string, number>()
  for (const { caseId, ms } of s.rows) if (ms !== null) least.set(caseId, Math.min(least.get(caseId) ?? Infinity, ms))
  const stress = (key: string, label: string) => ({ key, label, dimension: 'stress' as const, unit: u.stress })
  return {
    key: 'points', title: 'Stresses by point',
    columns: [{ key: 'point', label: 'Point', dimension: null, unit: '' }, { key: 'place', label: 'Fibre and station', dimension: null, unit: '' }, stress('sigma', 'Normal'), stress('tau', 'Shear'), stress('eq', 'Equivalent'), { key: 'ms', label: 'Least margin', dimension: 'margin', unit: '' }],
    rows: s.states.map(({ point, sigma, tau, equivalent }) => ({ id: point.id, cells: [point.id, point.place, sigma, tau, equivalent, least.get(point.id) ?? null] })),
  }
}

export function combinedGuards(s: CombinedSolution): Guard[] {
  const { model } = s
  const used = model.materials.filter(m => model.points.some(point => point.material === m))
  const worst = s.states.reduce<{ share: number, state: CombinedState } | null>((high, state) => {
    const Fsu = state.point.material.Fsu
    const share = Fsu === null ? 0 : state.tau * state.toLimit / Fsu
    return share > (high?.share ?? 0) ? { share, state } : high
  }, null)
  return inOrder([
    ...refusedGuards(model.refused), ...unusualGuards(model.unusual), ...declaredGuards(model.declarations),
    ...materialGuards({ materials: used, cases: model.points, partial: model.factors.partial, needs: model.rule.by === 'panel' || model.rule.by === 'none' ? ['Fty'] : ['Ftu', 'Fsu', 'Fty'] }),
    ...factorGuards(model.factors, model.declarations.fitting), ...yieldGuards(s.rows, ['equivalent-yield'], 'equivalent'),
    ...fatigueGuards({ repeated: model.declarations.repeated, notches: [], worst: worst ? { share: worst.share, place: worst.state.point.place || `point ${worst.state.point.id}`, caseId: worst.state.point.id } : null }),
    ...marginGuards(s.rows),
  ])
}

export function combinedWorking(s: CombinedSolution): WorkingStep[] {
  const decisive = s.states.find(({ point }) => point.id === s.governing?.caseId) ?? s.states[0]
  if (!decisive) return []
  return [
    { heading: `Stresses at one fibre, point ${decisive.point.id}`, method: '§7.4', lines: fibreLines(decisive) },
    { heading: `Interaction at ultimate, point ${decisive.point.id}`, method: '§7.4', lines: interactionLines(s, decisive) },
    ...leastOfModes(s.rows).flatMap((row): WorkingStep[] => {
      const state = s.states.find(({ point }) => point.id === row.caseId)
      if (!state || row.mode !== 'equivalent-yield') return []
      return [{ heading: `${row.modeLabel}: least margin, ${row.place}`, method: '§7.4', lines: marginLines({
        row, temperature: state.point.temperature?.value, toLevel: state.toLimit, special: s.model.factors.specialAtLimit, safety: s.model.factors.ultimate,
        strength: { name: 'Fty', materials: [state.point.material] }, symbol: '\\sigma_{eq}', factored: '\\sigma_{lim}',
      }) }]
    }),
  ].filter(step => step.lines.length > 0)
}

function fibreLines({ point, sigma, tau, equivalent }: CombinedState): WorkingLine[] {
  return [
    line('\\sigma = \\sum\\sigma_i', point.normal.length === 0 ? '0' : point.normal.map(one => num(one.sigma)).join(' + '), res(sigma, 'MPa')),
    line('\\tau = |\\tau_T| + |\\tau_\\omega| + |\\tau_V|', [point.torsion, point.warping, point.direct].map(one => num(Math.abs(one))).join(' + '), res(tau, 'MPa')),
    line('\\sigma_{eq} = \\sqrt{\\sigma^2+3\\tau^2}', `\\sqrt{${num(sigma)}^2+3\\cdot ${num(tau)}^2}`, res(equivalent, 'MPa')),
  ]
}

const REACHED: Record<Rule['by'], string> = {
  circle: 'RF = \\frac{1}{\\sqrt{R_n^2+R_s^2}}', powers: '(RF\\,R_n)^a + (RF\\,R_s)^b = 1', panel: 'RF', steady: 'R_{steady}^2 + (RF\\,R_{varying})^2 = 1', none: '',
}

function interactionLines(s: CombinedSolution, { point, sigma, tau, toUltimate, ratios, reserve, exhausted }: CombinedState): WorkingLine[] {
  if (!ratios || !reserve?.ok || reserve.rf === null) return []
  const { rule, factors } = s.model
  const factor = toUltimate * factors.special
  const k = knockdownOf(point.material, point.temperature?.value)
  const [Fn, Fs] = rule.by === 'panel' ? [rule.Fc, rule.Fs] : [k * (point.material.Ftu ?? 0), k * (point.material.Fsu ?? 0)]
  const { Rn, Rs } = ratios
  const reached = rule.by === 'panel'
    ? rule.loaded === 'compression'
      ? line('RF = \\frac{2}{R_c+\\sqrt{R_c^2+4R_s^2}}', `\\frac{2}{${num(Rn)}+\\sqrt{${num(Rn)}^2+4\\cdot ${num(Rs)}^2}}`, num(reserve.rf))
      : line('RF = \\frac{1}{\\sqrt{R_b^2+R_s^2}}', `\\frac{1}{\\sqrt{${num(Rn)}^2+${num(Rs)}^2}}`, num(reserve.rf))
    : line(exhausted ? `R_{steady} \\ge 1:\\quad ${REACHED.circle}` : REACHED[rule.by], rule.by === 'circle' || exhausted ? `\\frac{1}{\\sqrt{${num(Rn)}^2+${num(Rs)}^2}}` : '\\text{solved for the multiplier}', num(reserve.rf))
  return [
    line('R_n = \\frac{f\\,|\\sigma|}{F_n}', `\\frac{${num(factor)}\\cdot ${qty(Math.abs(sigma), 'MPa')}}{${qty(Fn, 'MPa')}}`, num(Rn)),
    line('R_s = \\frac{f\\,\\tau}{F_s}', `\\frac{${num(factor)}\\cdot ${qty(tau, 'MPa')}}{${qty(Fs, 'MPa')}}`, num(Rs)),
    reached,
    line('MS = RF - 1', `${num(reserve.rf)} - 1`, `${num(reserve.ms).replace(/^\((.*)\)$/, '$1')}\\quad\\text{shown as }${showMargin(reserve.ms).replace('\u2212', '-').replace('>', '{>}')}`),
  ]
}
