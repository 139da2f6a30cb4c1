/** Outputs and working that every section kind gives for its cases. */
import type { MarginRow, Output, WorkingLine, WorkingStep } from '#shared/calc/types'
import type { BarCase, StressPlace } from '#shared/calc/parts/bar-cases'
import type { BarModel } from '#shared/calc/parts/bar-fields'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines, type MarginSource } from '#shared/calc/parts/margin-working'
import { caseLabel, factorOutputs, marginOutputs, materialOutputs, output } from '#shared/calc/parts/output'
import { SINGLE_CASE } from '#shared/calc/parts/parse-loading'
import { degrees } from '#shared/calc/parts/say'
import type { ShownUnits } from '#shared/calc/parts/shown-units'
import { line, num, qty, res } from '#shared/calc/parts/tex'

/** What is common to the outputs of a solved bar; `method` is the section that gives its stress. */
export interface BarResult { bar: BarModel, GJ: number, cases: readonly BarCase[], places: readonly StressPlace[], margins: readonly MarginRow[], governing: MarginRow | null, method: string }

export function barOutputs({ bar, cases, margins, governing, method }: BarResult, u: ShownUnits): Output[] {
  return [
    ...output('length', 'L', 'Length of the bar', bar.length?.value, 'length', bar.length?.unit ?? u.length, '§5.1'),
    ...output('twist_allowed', '\\varphi_{a}', 'Twist allowed', bar.twistAllowed?.value, 'angle', bar.twistAllowed?.unit ?? '°', '§7.8'),
    ...factorOutputs(bar.factors), ...materialOutputs(bar.materials), ...cases.flatMap(c => caseOutputs(bar, cases.length, c, method, u)), ...peakOutput(cases, method, u), ...marginOutputs(margins, governing),
  ]
}

function caseOutputs(bar: BarModel, count: number, c: BarCase, method: string, u: ShownUnits): Output[] {
  const of = caseLabel(count, c.model, SINGLE_CASE)
  const extra = { caseId: c.model.id, primary: count === 1 }
  const [given, found] = bar.by === 'rate' ? ['§6', '§6'] : ['§8', method]
  const at = (key: string) => `${key}@${c.model.id}`
  return [
    ...output(at('T'), 'T', `Torque${of}`, c.torque, 'torque', c.model.torque?.unit ?? u.torque, given, extra),
    ...output(at('theta'), '\\theta\'', `Rate of twist${of}`, c.rate, 'rateOfTwist', u.rate, found, extra),
    ...output(at('theta_deg'), '\\theta\'', `Rate of twist${of}`, c.rate, 'rateOfTwist', u.rateDegrees, found, { caseId: c.model.id }),
    ...output(at('twist'), '\\varphi', `Twist over the length${of}`, c.twist, 'angle', 'rad', '§5.1', { caseId: c.model.id }),
    ...output(at('twist_deg'), '\\varphi', `Twist over the length${of}`, c.twist, 'angle', '°', '§5.1', extra),
    ...output(at('tau_max'), '\\tau_{max}', `Largest shear stress${of}`, c.tauMax, 'stress', u.stress, method, extra),
  ]
}

function peakOutput(cases: readonly BarCase[], method: string, u: ShownUnits): Output[] {
  const worst = cases.reduce<BarCase | null>((top, c) => (top === null || c.tauMax > top.tauMax ? c : top), null)
  return worst ? output('tau_max', '\\tau_{max}', `Largest shear stress of all cases (${worst.model.id})`, worst.tauMax, 'stress', u.stress, method, { primary: true }) : []
}

/** The case of the governing margin, those of the other modes, or the first where there are no margins. */
export function decisiveCases(cases: readonly BarCase[], margins: readonly MarginRow[], governing: MarginRow | null): BarCase[] {
  const ids = [governing?.caseId, ...leastOfModes(margins).map(row => row.caseId)]
  const found = [...new Set(ids)].flatMap(id => cases.find(c => c.model.id === id) ?? [])
  return found.length > 0 ? found : cases.slice(0, 1)
}

const named = (count: number, c: BarCase) => `${c.model.id === SINGLE_CASE && count === 1 ? '' : `, case ${c.model.id}`}${c.model.level === 'ultimate' ? ' (given at ultimate)' : ''}`

/** Rate of twist and twist of the deciding cases; `stress` gives the lines from there to the stress. */
export function caseSteps(result: BarResult, stress: (c: BarCase) => WorkingLine[]): WorkingStep[] {
  const { bar, GJ, cases, margins, governing, method } = result
  return decisiveCases(cases, margins, governing).flatMap((c) => {
    const first = bar.by === 'rate'
      ? line('T = GJ\\,\\theta\'', `${qty(GJ, 'N·mm²')}\\cdot ${qty(c.rate, 'rad/mm')}`, res(c.torque, 'N·mm'))
      : line('\\theta\' = \\frac{T}{GJ}', `\\frac{${qty(c.torque, 'N·mm')}}{${qty(GJ, 'N·mm²')}}`, res(c.rate, 'rad/mm'))
    const twist = c.twist === null || !bar.length ? [] : [line('\\varphi = \\theta\'\\,L', `${qty(c.rate, 'rad/mm')}\\cdot ${qty(bar.length.value, 'mm')}`, `${res(c.twist, 'rad')} = ${num(degrees(c.twist))}^{\\circ}`)]
    return [
      { heading: `Rate of twist${named(cases.length, c)}`, method: bar.by === 'rate' ? '§6' : method, lines: [first, ...twist] },
      { heading: `Shear stress${named(cases.length, c)}`, method, lines: stress(c) },
    ]
  })
}

/** From strength and stress to the least margin of each mode. */
export function barMarginSteps({ bar, cases, places, margins }: BarResult): WorkingStep[] {
  return leastOfModes(margins).flatMap((row): WorkingStep[] => {
    const c = cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const ultimate = row.level === 'ultimate'
    const common = { row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: bar.factors.ultimate }
    const source: MarginSource = row.mode === 'twist'
      ? { ...common, strength: null, limit: '\\varphi_a', special: 1, symbol: '|\\varphi|', factored: '\\varphi_{lim}' }
      : {
          ...common, strength: { name: ultimate ? 'Fsu' : 'Fsy', materials: places.find(place => place.place === row.place)?.materials ?? [] },
          special: ultimate ? bar.factors.special : bar.factors.specialAtLimit, symbol: '\\tau', factored: ultimate ? '\\tau_{ult}' : '\\tau_{lim}',
        }
    return [{ heading: `${row.modeLabel}: least margin${row.mode === 'twist' ? '' : `, ${row.place}`}, case ${row.caseId}`, method: row.mode === 'twist' ? '§7.8' : '§7.3', lines: marginLines(source) }]
  })
}
