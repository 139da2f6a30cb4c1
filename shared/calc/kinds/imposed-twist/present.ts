/** Outputs, guards and working of a part that follows its structure. */
import { declaredGuards } from '#shared/calc/guards/declared'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards } from '#shared/calc/guards/fatigue'
import { fired } from '#shared/calc/guards/catalogue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import type { ImposedSolution, SolvedImposed } from '#shared/calc/kinds/imposed-twist/solve'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines } from '#shared/calc/parts/margin-working'
import { factorOutputs, marginOutputs, materialOutputs, output } from '#shared/calc/parts/output'
import { figure } from '#shared/calc/parts/say'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { line, num, qty, res } from '#shared/calc/parts/tex'
import type { Guard, Output, WorkingLine, WorkingStep } from '#shared/calc/types'

/** Above this share of the structure's stiffness the part is solved with it (G-42). */
const MOST_RATIO = 0.05

export function imposedOutputs(s: ImposedSolution): Output[] {
  const { model } = s
  const u = shownUnits(model)
  const torque = model.units === 'SI' ? 'N·m' as const : 'lbf·in' as const
  return [
    ...output('GJ', 'GJ', 'Torsional stiffness of the part', s.part.GJ, 'torsionalStiffness', u.stiffness, '§6'),
    ...output('GJ_ratio', 'GJ/GJ_s', 'Stiffness over that of the structure', s.ratio, 'ratio', '%', '§6'),
    ...factorOutputs(model.factors), ...materialOutputs(model.materials),
    ...s.cases.flatMap((c) => {
      const id = c.model.id
      const extra = { caseId: id, primary: s.cases.length === 1 }
      return [
        ...output(`theta@${id}`, '\\theta\'', `Imposed rate of twist, case ${id}`, c.model.rate.value, 'rateOfTwist', c.model.rate.unit, '§6', extra),
        ...output(`T@${id}`, 'T', `Torque the part receives, case ${id}`, c.response.torque, 'torque', torque, '§6', extra),
        ...output(`tau@${id}`, '\\tau', `Shear stress, case ${id}`, c.response.tau, 'stress', u.stress, '§6', extra),
        ...(s.part.warping && c.model.gradient ? output(`B@${id}`, 'B', `Bimoment, case ${id}`, c.response.bimoment, 'bimoment', u.stiffness, '§6', { caseId: id }) : []),
        ...(c.response.sigmaWarping === 0 ? [] : output(`sigma_w@${id}`, '\\sigma_\\omega', `Warping stress, case ${id}`, c.response.sigmaWarping, 'stress', u.stress, '§6', { caseId: id })),
        ...(c.response.sigmaBending === 0 ? [] : output(`sigma_b@${id}`, '\\sigma_b', `Bending stress of the offset, case ${id}`, c.response.sigmaBending, 'stress', u.stress, '§6', { caseId: id })),
        ...(c.sigma === 0 ? [] : output(`sigma_eq@${id}`, '\\sigma_{eq}', `Equivalent stress, case ${id}`, c.equivalent, 'stress', u.stress, '§7.4', { caseId: id })),
      ]
    }),
    ...marginOutputs(s.margins, s.governing),
  ]
}

export function imposedGuards(s: ImposedSolution): Guard[] {
  const { model, cases } = s
  const worst = cases.reduce<SolvedImposed | null>((high, c) => (high === null || c.response.tau * c.toLimit > high.response.tau * high.toLimit ? c : high), null)
  const share = worst && model.material.Fsu !== null ? { share: worst.response.tau * worst.toLimit / model.material.Fsu, place: 'the part', caseId: worst.model.id } : null
  return inOrder([
    ...refusedGuards(model.refused), ...unusualGuards(model.unusual), ...declaredGuards(model.declarations),
    ...materialGuards({ materials: [model.material], cases: model.cases, partial: model.factors.partial }), ...factorGuards(model.factors, model.declarations.fitting),
    ...yieldGuards(s.margins, ['shear-yield']), ...fatigueGuards({ repeated: model.declarations.repeated, notches: model.K > 1 ? [{ place: 'the inside corner', factor: model.K }] : [], worst: share }),
    ...(s.ratio !== null && s.ratio > MOST_RATIO ? [fired('G-42', { values: { 'GJ/GJs': s.ratio }, message: `The part has ${figure(s.ratio * 100)} % of the torsional stiffness of its structure, more than ${MOST_RATIO * 100} %: it changes the twist it is given.` })] : []),
    ...(s.ratio === null ? [fired('G-42', { of: 'unknown', values: {}, title: 'Stiffness of the structure not given', message: 'The stiffness of the structure is not given, so whether the part changes the twist it receives is not known.' })] : []),
    ...marginGuards(s.margins),
  ])
}

export function imposedWorking(s: ImposedSolution): WorkingStep[] {
  const { model, part } = s
  const decisive = s.cases.find(c => c.model.id === s.governing?.caseId) ?? s.cases[0]
  if (!decisive) return []
  const { G } = model.material
  const rate = Math.abs(decisive.model.rate.value)
  const stress = model.t
    ? line(`\\tau = ${model.K > 1 ? 'K_c\\,' : ''}G\\,t\\,|\\theta'|`, `${model.K > 1 ? `${num(model.K)}\\cdot ` : ''}${qty(G, 'MPa')}\\cdot ${qty(model.t.value, 'mm')}\\cdot ${qty(rate, 'rad/mm')}`, res(decisive.response.tau, 'MPa'))
    : line('\\tau = \\frac{|T|}{W_T}', `\\frac{${qty(Math.abs(decisive.response.torque), 'N·mm')}}{${qty(model.WT?.value ?? 0, 'mm³')}}`, res(decisive.response.tau, 'MPa'))
  return [
    { heading: `Torque from the imposed rate of twist, case ${decisive.model.id}`, method: '§6', lines: [
      line('GJ', `${qty(G, 'MPa')}\\cdot ${qty(model.J.value, 'mm⁴')}`, res(part.GJ, 'N·mm²')),
      line('T = GJ\\,\\theta\'', `${qty(part.GJ, 'N·mm²')}\\cdot ${qty(decisive.model.rate.value, 'rad/mm')}`, res(decisive.response.torque, 'N·mm')), stress,
    ] },
    { heading: `Stress along the part, case ${decisive.model.id}`, method: '§6', lines: alongLines(s, decisive) },
    ...leastOfModes(s.margins).flatMap((row): WorkingStep[] => {
      const c = s.cases.find(one => one.model.id === row.caseId)
      if (!c) return []
      const ultimate = row.level === 'ultimate'
      const name = row.mode === 'equivalent-yield' ? 'Fty' as const : ultimate ? 'Fsu' as const : 'Fsy' as const
      return [{ heading: `${row.modeLabel}: least margin, case ${row.caseId}`, method: '§7.3', lines: marginLines({
        row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: model.factors.ultimate, strength: { name, materials: [model.material] },
        special: ultimate ? model.factors.special : model.factors.specialAtLimit, symbol: name === 'Fty' ? '\\sigma_{eq}' : '\\tau', factored: name === 'Fty' ? '\\sigma_{lim}' : ultimate ? '\\tau_{ult}' : '\\tau_{lim}',
      }) }]
    }),
  ].filter(step => step.lines.length > 0)
}

function alongLines({ model, part }: ImposedSolution, c: SolvedImposed): WorkingLine[] {
  const gradient = c.model.gradient?.value ?? 0
  const E = model.material.E ?? 0
  return [
    ...(part.warping && gradient !== 0 ? [
      line('B = -E\\Gamma\\,\\varphi\'\'', `-${num(E)}\\cdot ${num(model.Gamma?.value ?? 0)}\\cdot ${num(gradient)}`, res(c.response.bimoment, 'N·mm²')),
      line('\\sigma_\\omega = -E\\,\\omega\\,\\varphi\'\'', `-${num(E)}\\cdot ${num(part.warping.omega)}\\cdot ${num(gradient)}`, res(c.response.sigmaWarping, 'MPa')),
    ] : []),
    ...(c.response.sigmaBending === 0 ? [] : [line('\\sigma_b = E\\,e\\,\\varphi\'\'\\,c', `${num(E)}\\cdot ${num(model.offset?.value ?? 0)}\\cdot ${num(gradient)}\\cdot ${num(model.fibre?.value ?? 0)}`, res(c.response.sigmaBending, 'MPa'))]),
    ...(c.sigma === 0 ? [] : [line('\\sigma_{eq} = \\sqrt{\\sigma^2+3\\tau^2}', `\\sqrt{${num(c.sigma)}^2+3\\cdot ${num(c.response.tau)}^2}`, res(c.equivalent, 'MPa'))]),
  ]
}
